package clampwright.view.schedule;

import clampwright.figure.Sentences;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Side;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;

/** Which face governs, as symbol, word and colour. */
final class Governs extends HBox {
  private final Region sign = new Region();
  private final Label word = new Label();

  Governs() {
    super(6);
    setAlignment(Pos.CENTER_LEFT);
    getStyleClass().add("governs");
    sign.getStyleClass().add("sign");
    getChildren().addAll(sign, word);
  }

  void show(ElementFinding finding) {
    word.setText(text(finding));
    String side = side(finding.governing());
    if (!getStyleClass().contains(side)) {
      getStyleClass().removeAll("head", "nut", "both");
      getStyleClass().add(side);
    }
    setVisible(true);
  }

  /** What stands in the cell, such as "nut · edge". */
  static String text(ElementFinding finding) {
    if (finding.wholeWasher()) {
      return Sentences.side(finding.governing()) + " · whole";
    }
    boolean edge = finding.edgeLimited() || finding.edgeClipped();
    return Sentences.side(finding.governing()) + (edge ? " · edge" : "");
  }

  private static String side(Side side) {
    return switch (side) {
      case HEAD -> "head";
      case NUT -> "nut";
      case BOTH -> "both";
    };
  }
}

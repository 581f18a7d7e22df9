package clampwright.view.found;

import clampwright.figure.Sentences;
import clampwright.figure.Verdicts;
import clampwright.joint.Joint;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Verdict;
import clampwright.view.Hover;
import java.util.Locale;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;

/**
 * One check with its sign and margin; pressing it opens the working behind it. It may stand for
 * another check from time to time, as the line of the least margin does.
 */
final class CheckLine extends Button {
  private final String before;
  private final Label name = new Label();
  private final Label margin = new Label();
  private String description = "";

  /** The line of one check. */
  CheckLine(CheckKind kind) {
    this("", kind.name().toLowerCase(Locale.ROOT).replace('_', '-'));
  }

  /**
   * A line.
   *
   * @param before words before the check's name
   * @param id by which it is found
   */
  CheckLine(String before, String id) {
    this.before = before;
    getStyleClass().setAll("check");
    setId("check-" + id);
    name.getStyleClass().add("check-name");
    margin.getStyleClass().add("check-margin");
    margin.setId("margin-" + id);
    margin.setMinWidth(USE_PREF_SIZE);
    Region sign = new Region();
    sign.getStyleClass().add("check-sign");
    Region gap = new Region();
    HBox.setHgrow(gap, Priority.ALWAYS);
    HBox line = new HBox(8, sign, name, gap, margin);
    line.setAlignment(Pos.CENTER_LEFT);
    line.setMouseTransparent(true);
    line.prefWidthProperty().bind(widthProperty());
    setGraphic(line);
    setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
    setMaxWidth(Double.MAX_VALUE);
    Hover.tell(this, () -> description);
  }

  void show(Verdict verdict, Joint joint) {
    name.setText(before + Sentences.check(verdict.kind()));
    Verdicts.Standing standing = Verdicts.standing(verdict);
    for (Verdicts.Standing each : Verdicts.Standing.values()) {
      PseudoClass state =
          PseudoClass.getPseudoClass(each.name().toLowerCase(Locale.ROOT).replace('_', '-'));
      pseudoClassStateChanged(state, each == standing);
    }
    if (verdict instanceof Verdict.Judged judged) {
      margin.setText(Verdicts.margin(judged.margin()));
      String where = Sentences.where(judged.where(), joint);
      description = (judged.passes() ? "holds" : "fails") + (where.isEmpty() ? "" : ", " + where);
    } else if (verdict instanceof Verdict.NotApplicable not) {
      margin.setText("–");
      description = "not applicable: " + not.why().text();
    }
    setAccessibleText(name.getText() + ", margin " + margin.getText() + ", " + description);
  }
}

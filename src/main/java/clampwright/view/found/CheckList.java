package clampwright.view.found;

import clampwright.joint.Factors;
import clampwright.joint.Joint;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Verdict;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;

/** All checks with their margins. */
final class CheckList extends VBox {
  private final Map<CheckKind, CheckLine> lines = new EnumMap<>(CheckKind.class);
  private final Label factors = new Label("All factors are 1.0: none has been set.");

  /**
   * The list.
   *
   * @param open what pressing a check does
   */
  CheckList(Consumer<CheckKind> open) {
    getStyleClass().add("checks");
    for (CheckKind kind : CheckKind.values()) {
      CheckLine line = new CheckLine(kind);
      line.setOnAction(event -> open.accept(kind));
      lines.put(kind, line);
      getChildren().add(line);
    }
    factors.getStyleClass().add("hint-line");
    factors.setId("factors-hint");
    factors.setWrapText(true);
    getChildren().add(factors);
  }

  void show(List<Verdict> verdicts, Joint joint) {
    verdicts.forEach(verdict -> lines.get(verdict.kind()).show(verdict, joint));
    boolean none = joint.criteria().factors().equals(Factors.NONE);
    factors.setVisible(none);
    factors.setManaged(none);
  }
}

package clampwright.view.spread;

import clampwright.figure.Sentences;
import clampwright.figure.Straying;
import clampwright.figure.Verdicts;
import clampwright.joint.Joint;
import clampwright.mechanics.checks.Verdict;
import clampwright.mechanics.spread.Sensitivity;
import clampwright.quantity.UnitSystem;
import clampwright.view.Hover;
import java.util.Optional;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;

/** One input with the margins at both its limits; pressing it opens the working behind it. */
final class BarLine extends Button {
  private final Label name = label("spread-name", 190);
  private final Label limits = label("spread-limits", 92);
  private final Label low = label("spread-margin", 52);
  private final Label high = label("spread-margin", 52);
  private final Track track = new Track();
  private String description = "";

  BarLine() {
    getStyleClass().setAll("spread-line");
    low.setAlignment(Pos.CENTER_RIGHT);
    HBox.setHgrow(track, Priority.ALWAYS);
    HBox line = new HBox(10, name, limits, low, track, high);
    line.setAlignment(Pos.CENTER_LEFT);
    line.setMouseTransparent(true);
    line.prefWidthProperty().bind(widthProperty().subtract(12));
    setGraphic(line);
    setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
    setMaxWidth(Double.MAX_VALUE);
    Hover.tell(this, () -> description);
  }

  private static Label label(String style, double width) {
    Label label = new Label();
    label.getStyleClass().add(style);
    label.setMinWidth(width);
    label.setPrefWidth(width);
    label.setMaxWidth(width);
    return label;
  }

  void show(
      Sensitivity.Bar bar, double given, Joint joint, UnitSystem units, double from, double to) {
    name.setText(Straying.name(bar.input(), joint));
    limits.setText(Straying.limits(bar.input(), units));
    low.setText(margin(bar.low()));
    high.setText(margin(bar.high()));
    track.show(from, to, at(bar.low(), from), at(bar.high(), from), given);
    description =
        Straying.off(bar.input(), bar.input().low(), units)
            + ": "
            + margin(bar.low())
            + check(bar.low())
            + "\n"
            + Straying.off(bar.input(), bar.input().high(), units)
            + ": "
            + margin(bar.high())
            + check(bar.high());
    setAccessibleText(name.getText() + ", " + description);
  }

  private static double at(Optional<Verdict.Judged> verdict, double otherwise) {
    return verdict.map(Verdict.Judged::margin).orElse(otherwise);
  }

  private static String margin(Optional<Verdict.Judged> verdict) {
    return verdict.map(judged -> Verdicts.margin(judged.margin())).orElse("none");
  }

  private static String check(Optional<Verdict.Judged> verdict) {
    return verdict.map(judged -> ", " + Sentences.check(judged.kind())).orElse("");
  }
}

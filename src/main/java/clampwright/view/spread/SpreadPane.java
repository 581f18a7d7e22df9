package clampwright.view.spread;

import clampwright.edit.SketchModel;
import clampwright.figure.Sentences;
import clampwright.figure.Verdicts;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Verdict;
import clampwright.mechanics.spread.Margin;
import clampwright.mechanics.spread.Sensitivity;
import clampwright.view.OncePerPulse;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import javafx.geometry.Pos;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/** Which number matters: the margin with each input at its limits, and with all at random. */
public final class SpreadPane extends HBox {
  private static final String WORST = "the worst margin under load";

  private final SketchModel model;
  private final Consumer<Sensitivity.Bar> open;
  private final ComboBox<String> asked = new ComboBox<>();
  private final Label given = new Label();
  private final VBox bars = new VBox();
  private final List<BarLine> lines = new ArrayList<>();
  private final TrialPane trial;

  /**
   * The pane.
   *
   * @param open what pressing a bar does
   */
  public SpreadPane(SketchModel model, Consumer<Sensitivity.Bar> open) {
    this.model = model;
    this.open = open;
    trial = new TrialPane(model);
    getStyleClass().add("spread");
    asked.setId("spread-asked");
    asked.getItems().add(WORST);
    for (CheckKind kind : CheckKind.values()) {
      asked.getItems().add(Sentences.check(kind));
    }
    asked.getSelectionModel().select(0);
    asked.setOnAction(
        event -> {
          trial.ask(margin());
          follow();
        });
    given.getStyleClass().add("hint-line");
    given.setId("spread-given");
    HBox head = new HBox(10, new Label("How far each input moves"), asked, given);
    head.setAlignment(Pos.CENTER_LEFT);
    ScrollPane scroll = new ScrollPane(bars);
    scroll.setFitToWidth(true);
    scroll.getStyleClass().add("spread-scroll");
    VBox.setVgrow(scroll, Priority.ALWAYS);
    VBox left = new VBox(6, head, scroll);
    left.setMinWidth(0);
    HBox.setHgrow(left, Priority.ALWAYS);
    trial.setMinWidth(330);
    trial.setPrefWidth(330);
    getChildren().addAll(left, trial);
    OncePerPulse.keep(
        this,
        () -> {
          trial.reset();
          follow();
        },
        model.sketchProperty());
  }

  private Margin margin() {
    int index = asked.getSelectionModel().getSelectedIndex();
    return index <= 0 ? Margin.WORST : Margin.of(CheckKind.values()[index - 1]);
  }

  private void follow() {
    Sketch sketch = model.sketch();
    if (!(model.assessment() instanceof Solved)) {
      show(List.of());
      given.setText("No solution yet");
      return;
    }
    Sensitivity sensitivity = Sensitivity.of(sketch.joint(), margin());
    given.setText(sensitivity.given().map(this::words).orElse("this check does not apply"));
    show(sensitivity.given().isPresent() ? sensitivity.bars() : List.of());
    sensitivity.given().ifPresent(verdict -> show(sensitivity, verdict.margin(), sketch));
  }

  private String words(Verdict.Judged verdict) {
    return Verdicts.margin(verdict.margin())
        + " as given without scatter, "
        + Sentences.check(verdict.kind());
  }

  private void show(List<Sensitivity.Bar> shown) {
    while (lines.size() < shown.size()) {
      lines.add(new BarLine());
    }
    if (bars.getChildren().size() != shown.size()) {
      bars.getChildren().setAll(lines.subList(0, shown.size()));
    }
  }

  private void show(Sensitivity sensitivity, double margin, Sketch sketch) {
    double from = Math.min(0, margin);
    double to = Math.max(0, margin);
    for (Sensitivity.Bar bar : sensitivity.bars()) {
      for (Verdict.Judged verdict :
          List.of(bar.low(), bar.high()).stream().flatMap(java.util.Optional::stream).toList()) {
        from = Math.min(from, verdict.margin());
        to = Math.max(to, verdict.margin());
      }
    }
    double room = 0.05 * Math.max(1e-6, to - from);
    for (int i = 0; i < sensitivity.bars().size(); i++) {
      Sensitivity.Bar bar = sensitivity.bars().get(i);
      BarLine line = lines.get(i);
      line.setId("spread-bar-" + i);
      line.setOnAction(event -> open.accept(bar));
      line.show(bar, margin, sketch.joint(), sketch.units(), from - room, to + room);
    }
  }
}

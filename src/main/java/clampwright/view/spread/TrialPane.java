package clampwright.view.spread;

import clampwright.edit.SketchModel;
import clampwright.figure.HistogramFigure;
import clampwright.figure.Verdicts;
import clampwright.mechanics.spread.Inputs;
import clampwright.mechanics.spread.Margin;
import clampwright.mechanics.spread.Outcome;
import clampwright.view.FigurePlace;
import java.util.Locale;
import java.util.Optional;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ProgressBar;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;

/**
 * Runs many random joints, shows their margins while it runs, and says which share fails. A changed
 * sketch ends the run, for it is of another joint then.
 */
final class TrialPane extends VBox {
  private final SketchModel model;
  private final Button start = new Button();
  private final ProgressBar progress = new ProgressBar(0);
  private final FigurePlace histogram = new FigurePlace("Margins of random joints");
  private final Label answer = new Label();
  private Margin margin = Margin.WORST;
  private Optional<Trial> running = Optional.empty();

  TrialPane(SketchModel model) {
    this.model = model;
    getStyleClass().add("trial");
    start.getStyleClass().setAll("tool-button");
    start.setId("trial-start");
    start.setOnAction(event -> pressed());
    progress.setId("trial-progress");
    progress.setMaxWidth(Double.MAX_VALUE);
    HBox.setHgrow(progress, Priority.ALWAYS);
    HBox row = new HBox(10, start, progress);
    row.setAlignment(Pos.CENTER_LEFT);
    answer.getStyleClass().add("trial-answer");
    answer.setId("trial-answer");
    answer.setWrapText(true);
    answer.setMinHeight(USE_PREF_SIZE);
    histogram.setMinHeight(60);
    VBox.setVgrow(histogram, Priority.ALWAYS);
    getChildren().addAll(row, histogram, answer);
    reset();
  }

  /** Asks about another margin. */
  void ask(Margin margin) {
    this.margin = margin;
    reset();
  }

  /** Ends what runs and shows nothing, as when the sketch has changed. */
  void reset() {
    running.ifPresent(Trial::cancel);
    running = Optional.empty();
    start.setText("Run " + grouped(Trial.COUNT));
    progress.progressProperty().unbind();
    progress.setProgress(0);
    histogram.setVisible(false);
    boolean any = !Inputs.of(model.sketch().joint()).isEmpty();
    start.setDisable(!any);
    answer.setText(
        any
            ? "Random joints with all inputs off at once: normal with the limits at three"
                + " deviations, half-angle and n even between theirs."
            : "No input has a stated tolerance.");
  }

  private void pressed() {
    if (running.isPresent()) {
      running.get().cancel();
      running = Optional.empty();
      progress.progressProperty().unbind();
      start.setText("Run again");
      answer.setText("Cancelled. " + answer.getText());
      return;
    }
    Trial trial = new Trial(model.sketch().joint(), margin);
    running = Optional.of(trial);
    start.setText("Cancel");
    progress.progressProperty().bind(trial.progressProperty());
    trial.valueProperty().addListener((observable, was, is) -> show(trial, is));
    trial.setOnSucceeded(event -> ended(trial));
    trial.setOnFailed(event -> failed(trial));
    trial.start();
  }

  private void show(Trial trial, Outcome outcome) {
    if (outcome == null || !running.equals(Optional.of(trial))) {
      return;
    }
    histogram.setVisible(true);
    histogram.show((width, height) -> HistogramFigure.of(outcome, width, height));
    answer.setText(
        String.format(
            Locale.ROOT,
            "%s of %s fail (95 %% sure: %s to %s). Half of them have a margin of %s or more.",
            percent(outcome.failed()),
            grouped(outcome.count()),
            percent(outcome.failedAtLeast()),
            percent(outcome.failedAtMost()),
            Verdicts.margin(outcome.median())));
  }

  private static String grouped(int count) {
    return String.format(Locale.ROOT, "%,d", count).replace(',', '\u2009');
  }

  private static String percent(double share) {
    return String.format(Locale.ROOT, share < 0.01 ? "%.3f %%" : "%.2f %%", 100 * share);
  }

  private void ended(Trial trial) {
    if (running.equals(Optional.of(trial))) {
      show(trial, trial.getValue());
      running = Optional.empty();
      progress.progressProperty().unbind();
      progress.setProgress(1);
      start.setText("Run again");
    }
  }

  private void failed(Trial trial) {
    if (running.equals(Optional.of(trial))) {
      reset();
      answer.setText("The run ended early: " + trial.getException().getMessage());
    }
  }
}

package clampwright.view.working;

import clampwright.edit.SketchModel;
import clampwright.figure.working.Headline;
import clampwright.figure.working.Step;
import clampwright.figure.working.Working;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Verdict;
import clampwright.mechanics.spread.Sensitivity;
import clampwright.view.MathText;
import clampwright.view.OncePerPulse;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.VBox;

/**
 * The arithmetic of the selected part, or of a readout until another part is selected: formula,
 * numbers put in, result, source.
 */
public final class WorkingPane extends ScrollPane {
  private final SketchModel model;
  private final ObjectProperty<Optional<Headline>> headline =
      new SimpleObjectProperty<>(this, "headline", Optional.empty());
  private final ObjectProperty<Optional<CheckKind>> check =
      new SimpleObjectProperty<>(this, "check", Optional.empty());
  private final ObjectProperty<Optional<Sensitivity.Bar>> bar =
      new SimpleObjectProperty<>(this, "bar", Optional.empty());
  private final MathText title = new MathText("working-title");
  private final VBox body = new VBox();
  private final List<StepLine> lines = new ArrayList<>();

  public WorkingPane(SketchModel model) {
    this.model = model;
    getStyleClass().add("working");
    VBox sheet = new VBox(title, body);
    sheet.getStyleClass().add("sheet");
    title.setId("working-title");
    setContent(sheet);
    setFitToWidth(true);
    setHbarPolicy(ScrollBarPolicy.NEVER);
    setAccessibleText("Working");
    model
        .selectionProperty()
        .subscribe(
            (Part was, Part is) -> {
              ask(Optional.empty(), Optional.empty(), Optional.empty());
            });
    OncePerPulse.keep(
        this,
        this::follow,
        model.sketchProperty(),
        model.assessmentProperty(),
        model.selectionProperty(),
        model.shownCaseProperty(),
        headline,
        check,
        bar);
  }

  /** Shows the working of a readout. */
  public void show(Headline wanted) {
    ask(Optional.of(wanted), Optional.empty(), Optional.empty());
  }

  /** Shows the working of a check. */
  public void show(CheckKind wanted) {
    ask(Optional.empty(), Optional.of(wanted), Optional.empty());
  }

  /** Shows how a margin moves with an input. */
  public void show(Sensitivity.Bar wanted) {
    ask(Optional.empty(), Optional.empty(), Optional.of(wanted));
  }

  private void ask(
      Optional<Headline> headline, Optional<CheckKind> check, Optional<Sensitivity.Bar> bar) {
    this.headline.set(headline);
    this.check.set(check);
    this.bar.set(bar);
    setVvalue(0);
  }

  private void follow() {
    Working working = working();
    title.show(working.title());
    List<Step> steps = working.steps();
    while (lines.size() < steps.size()) {
      lines.add(new StepLine());
    }
    for (int i = 0; i < steps.size(); i++) {
      lines.get(i).show(steps.get(i));
    }
    if (body.getChildren().size() != steps.size()) {
      body.getChildren().setAll(lines.subList(0, steps.size()));
    }
  }

  private Working working() {
    Sketch sketch = model.sketch();
    List<Verdict> verdicts = model.verdicts();
    if (check.get().isPresent() && !verdicts.isEmpty()) {
      Verdict verdict = verdicts.get(check.get().get().ordinal());
      return Working.of(verdict, sketch.joint(), model.assessment(), sketch.units());
    }
    if (bar.get().isPresent() && !verdicts.isEmpty()) {
      return Working.of(bar.get().get(), sketch.joint(), sketch.units());
    }
    return headline
        .get()
        .map(
            is ->
                Working.of(
                    is, sketch.joint(), model.assessment(), sketch.units(), model.loadCase()))
        .orElseGet(
            () ->
                Working.of(
                    model.selection(),
                    sketch.joint(),
                    model.assessment(),
                    sketch.units(),
                    model.loadCase()));
  }
}

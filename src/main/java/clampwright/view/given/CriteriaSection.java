package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.Factors;
import clampwright.joint.Sketch;
import clampwright.view.OncePerPulse;
import clampwright.view.field.SketchNumber;
import java.util.function.BiFunction;
import java.util.function.ToDoubleFunction;
import javafx.scene.control.Label;

/** What the joint is judged by. */
final class CriteriaSection extends Section {
  private static final String NONE_SET = "All factors are 1.0: none set";

  private final SketchModel model;
  private final Label noFactors = Fields.hint("no-factors");

  CriteriaSection(SketchModel model) {
    super("Checks");
    this.model = model;
    add("Stiffness", Fields.wideChoice(model, "checks-basis", CriteriaFields.basis()));
    addFactors();
    noFactors.setText(NONE_SET);
    add(noFactors);
    fold("limits", new LimitRows(model));
    fold("tolerances", new ToleranceRows(model));
    OncePerPulse.keep(this, this::follow, model.sketchProperty());
  }

  private void follow() {
    Sketch sketch = model.sketch();
    setShown(noFactors, CriteriaFields.criteria(sketch).factors().equals(Factors.NONE));
  }

  private void addFactors() {
    factor("FF fitting", "Fitting factor", "fitting", Factors::fitting, Factors::withFitting);
    factor(
        "FS ultimate",
        "Factor against rupture",
        "ultimate",
        Factors::ultimate,
        Factors::withUltimate);
    factor("FS yield", "Factor against yield", "yield", Factors::yield, Factors::withYield);
    factor(
        "FS parting", "Factor against parting", "parting", Factors::parting, Factors::withParting);
    factor("FS slip", "Factor against slip", "slip", Factors::slip, Factors::withSlip);
  }

  private void factor(
      String label,
      String name,
      String id,
      ToDoubleFunction<Factors> read,
      BiFunction<Factors, Double, Factors> write) {
    SketchNumber number = CriteriaFields.factor(name, read, write);
    add(label, Fields.quantity(model, "factor-" + id, number));
  }
}

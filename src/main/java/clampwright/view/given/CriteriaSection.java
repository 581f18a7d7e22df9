package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.Allowables;
import clampwright.joint.Factors;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.view.OncePerPulse;
import clampwright.view.field.QuantityField;
import clampwright.view.field.SketchNumber;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import javafx.scene.control.Label;

/** What the joint is judged by. */
final class CriteriaSection extends Section {
  private static final String NONE_SET = "All factors are 1.0: none set";
  private static final String BY_CLASS = "by class";

  private final SketchModel model;
  private final Label noFactors = Fields.hint("no-factors");

  CriteriaSection(SketchModel model) {
    super("Checks");
    this.model = model;
    add("Stiffness", Fields.wideChoice(model, "checks-basis", CriteriaFields.basis()));
    addFactors();
    noFactors.setText(NONE_SET);
    add(noFactors);
    fold("limits", limits());
    fold("tolerances", tolerances());
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

  private Rows limits() {
    Rows rows = new Rows();
    rows.add(
        "P_u",
        limit(
            "ultimate",
            "Ultimate load",
            Dimension.FORCE,
            Allowables::ultimate,
            Allowables::withUltimate));
    rows.add(
        "P_y",
        limit("yield", "Yield load", Dimension.FORCE, Allowables::yield, Allowables::withYield));
    rows.add(
        "τ_u",
        limit(
            "shear", "Shear strength", Dimension.STRESS, Allowables::shear, Allowables::withShear));
    QuantityField amplitude =
        limit(
            "amplitude",
            "Endurable amplitude",
            Dimension.STRESS,
            Allowables::amplitude,
            Allowables::withAmplitude);
    amplitude.setOpen("by rule");
    rows.add("Endurable amplitude", amplitude);
    rows.add("Fatigue rule", Fields.wideChoice(model, "fatigue-rule", CriteriaFields.fatigue()));
    rows.add("Cycles", Fields.quantity(model, "cycles", CriteriaFields.cycles()));
    return rows;
  }

  private QuantityField limit(
      String id,
      String name,
      Dimension dimension,
      Function<Allowables, OptionalDouble> read,
      BiFunction<Allowables, OptionalDouble, Allowables> write) {
    SketchNumber number = CriteriaFields.limit(name, dimension, read, write);
    return Fields.optional(model, "limit-" + id, number, BY_CLASS);
  }

  private Rows tolerances() {
    Rows rows = new Rows();
    tolerance(rows, "Thickness ±", "thickness", ToleranceFields.thickness());
    tolerance(rows, "Modulus ±", "modulus", ToleranceFields.modulus());
    tolerance(rows, "Friction ±", "friction", ToleranceFields.friction());
    tolerance(rows, "n ±", "n", ToleranceFields.introduction());
    tolerance(rows, "Temperature ±", "temperature", ToleranceFields.temperature());
    tolerance(rows, "Half-angle from", "angle-low", ToleranceFields.angleLow());
    tolerance(rows, "Half-angle to", "angle-high", ToleranceFields.angleHigh());
    return rows;
  }

  private void tolerance(Rows rows, String label, String id, SketchNumber number) {
    rows.add(label, Fields.quantity(model, "tolerance-" + id, number));
  }
}

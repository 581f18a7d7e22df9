package clampwright.view.given;

import static clampwright.view.given.CriteriaFields.criteria;
import static clampwright.view.given.CriteriaFields.withCriteria;

import clampwright.edit.SketchModel;
import clampwright.joint.Tolerances;
import clampwright.quantity.Dimension;
import clampwright.view.field.SketchNumber;
import java.util.function.BiFunction;
import java.util.function.ToDoubleFunction;

/** How far inputs may stray from what is given. */
final class ToleranceRows extends Rows {
  private final SketchModel model;

  ToleranceRows(SketchModel model) {
    this.model = model;
    share("Thickness ±", "thickness", Tolerances::thickness, Tolerances::withThickness);
    share("Modulus ±", "modulus", Tolerances::modulus, Tolerances::withModulus);
    share("Friction ±", "friction", Tolerances::friction, Tolerances::withFriction);
    add("n ±", "n", introduction());
    add("Temperature ±", "temperature", temperature());
    add("Half-angle from", "angle-low", angleLow());
    add("Half-angle to", "angle-high", angleHigh());
  }

  private void share(
      String label,
      String what,
      ToDoubleFunction<Tolerances> read,
      BiFunction<Tolerances, Double, Tolerances> write) {
    add(label, what, number("Tolerance of " + what, Dimension.SHARE, read, write));
  }

  private void add(String label, String id, SketchNumber number) {
    add(label, Fields.quantity(model, "tolerance-" + id, number));
  }

  private static SketchNumber introduction() {
    return number(
        "Tolerance of n", Dimension.RATIO, Tolerances::introduction, Tolerances::withIntroduction);
  }

  private static SketchNumber temperature() {
    return number(
        "Tolerance of temperature",
        Dimension.TEMPERATURE_CHANGE,
        Tolerances::temperature,
        Tolerances::withTemperature);
  }

  private static SketchNumber angleLow() {
    return number(
        "Least half-angle",
        Dimension.ANGLE,
        it -> Math.toRadians(it.angleLow()),
        (it, radians) -> it.withAngle(AngleFields.degrees(radians), it.angleHigh()));
  }

  private static SketchNumber angleHigh() {
    return number(
        "Greatest half-angle",
        Dimension.ANGLE,
        it -> Math.toRadians(it.angleHigh()),
        (it, radians) -> it.withAngle(it.angleLow(), AngleFields.degrees(radians)));
  }

  private static SketchNumber number(
      String name,
      Dimension dimension,
      ToDoubleFunction<Tolerances> read,
      BiFunction<Tolerances, Double, Tolerances> write) {
    return SketchNumber.required(
        name,
        dimension,
        sketch -> read.applyAsDouble(criteria(sketch).tolerances()),
        (sketch, value) ->
            withCriteria(sketch, it -> it.withTolerances(write.apply(it.tolerances(), value))));
  }
}

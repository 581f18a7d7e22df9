package clampwright.view.given;

import static clampwright.view.given.CriteriaFields.criteria;
import static clampwright.view.given.CriteriaFields.withCriteria;

import clampwright.joint.Tolerances;
import clampwright.quantity.Dimension;
import clampwright.view.field.SketchNumber;
import java.util.function.BiFunction;
import java.util.function.ToDoubleFunction;

/** How far inputs may stray from what is given. */
final class ToleranceFields {
  private ToleranceFields() {}

  static SketchNumber thickness() {
    return of(
        "Tolerance of thickness",
        Dimension.SHARE,
        Tolerances::thickness,
        Tolerances::withThickness);
  }

  static SketchNumber modulus() {
    return of(
        "Tolerance of modulus", Dimension.SHARE, Tolerances::modulus, Tolerances::withModulus);
  }

  static SketchNumber friction() {
    return of(
        "Tolerance of friction", Dimension.SHARE, Tolerances::friction, Tolerances::withFriction);
  }

  static SketchNumber introduction() {
    return of(
        "Tolerance of n", Dimension.RATIO, Tolerances::introduction, Tolerances::withIntroduction);
  }

  static SketchNumber temperature() {
    return of(
        "Tolerance of temperature",
        Dimension.TEMPERATURE_CHANGE,
        Tolerances::temperature,
        Tolerances::withTemperature);
  }

  static SketchNumber angleLow() {
    return of(
        "Least half-angle",
        Dimension.ANGLE,
        tolerances -> Math.toRadians(tolerances.angleLow()),
        (tolerances, radians) ->
            tolerances.withAngle(AngleFields.degrees(radians), tolerances.angleHigh()));
  }

  static SketchNumber angleHigh() {
    return of(
        "Greatest half-angle",
        Dimension.ANGLE,
        tolerances -> Math.toRadians(tolerances.angleHigh()),
        (tolerances, radians) ->
            tolerances.withAngle(tolerances.angleLow(), AngleFields.degrees(radians)));
  }

  private static SketchNumber of(
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

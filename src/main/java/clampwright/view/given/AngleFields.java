package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.figure.Sentences;
import clampwright.joint.AngleRule;
import clampwright.joint.Method;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.quantity.Dimension;
import clampwright.view.field.Choice;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;

/** The half-angle rule and its typed angles. */
final class AngleFields {
  private AngleFields() {}

  static Method method(Sketch sketch) {
    return sketch.joint().method();
  }

  static Sketch withMethod(Sketch sketch, UnaryOperator<Method> change) {
    return sketch.withJoint(joint -> joint.withMethod(change.apply(joint.method())));
  }

  static SketchChoice<AngleRule> rule(SketchModel model) {
    return new SketchChoice<>(
        "Half-angle rule",
        sketch -> Optional.of(method(sketch).angle()),
        (sketch, rule) -> withMethod(sketch, method -> method.withAngle(rule)),
        Sentences::angleRule,
        sketch -> rules(model),
        (sketch, rule) -> "");
  }

  private static List<Choice<AngleRule>> rules(SketchModel model) {
    return List.of(
        new Choice<>("45° fixed", "", AngleRule.FIXED_45, "common practice, no source"),
        new Choice<>("30° fixed", "", AngleRule.FIXED_30, "Shigley, for softer members"),
        new Choice<>("typed", "", typed(model), "one angle, or one per clamp face"),
        new Choice<>("VDI 2230", "", AngleRule.VDI_2230, "computed from the proportions"));
  }

  /** Typed angles start with those in force. */
  private static AngleRule typed(SketchModel model) {
    AngleRule present = method(model.sketch()).angle();
    if (present instanceof AngleRule.Typed) {
      return present;
    }
    if (model.assessment() instanceof Assessment.Solved solved) {
      return new AngleRule.Typed(
          tenths(solved.zone().headHalfAngle()), tenths(solved.zone().nutHalfAngle()));
    }
    return new AngleRule.Typed(45, 45);
  }

  private static double tenths(double radians) {
    return Math.round(Math.toDegrees(radians) * 10) / 10.0;
  }

  static boolean isTyped(Sketch sketch) {
    return method(sketch).angle() instanceof AngleRule.Typed;
  }

  /** The head's half-angle; the nut's follows it while they are equal. */
  static SketchNumber head() {
    return SketchNumber.sometimes(
        "Half-angle",
        Dimension.ANGLE,
        sketch ->
            method(sketch).angle() instanceof AngleRule.Typed typed
                ? OptionalDouble.of(Math.toRadians(typed.headDegrees()))
                : OptionalDouble.empty(),
        (sketch, radians) -> {
          double degrees = degrees(radians);
          boolean equal = nutDegrees(sketch).isEmpty();
          return withAngles(sketch, degrees, equal ? degrees : nutDegrees(sketch).getAsDouble());
        });
  }

  /** The nut's half-angle; empty = as the head's. */
  static SketchNumber nut() {
    return SketchNumber.optional(
        "Nut's half-angle",
        Dimension.ANGLE,
        sketch -> {
          OptionalDouble degrees = nutDegrees(sketch);
          return degrees.isEmpty()
              ? degrees
              : OptionalDouble.of(Math.toRadians(degrees.getAsDouble()));
        },
        (sketch, radians) -> {
          double head = headDegrees(sketch);
          return withAngles(
              sketch, head, radians.isEmpty() ? head : degrees(radians.getAsDouble()));
        });
  }

  static double headDegrees(Sketch sketch) {
    return method(sketch).angle() instanceof AngleRule.Typed typed ? typed.headDegrees() : 45;
  }

  private static OptionalDouble nutDegrees(Sketch sketch) {
    return method(sketch).angle() instanceof AngleRule.Typed typed
            && typed.headDegrees() != typed.nutDegrees()
        ? OptionalDouble.of(typed.nutDegrees())
        : OptionalDouble.empty();
  }

  private static Sketch withAngles(Sketch sketch, double head, double nut) {
    return withMethod(sketch, method -> method.withAngle(new AngleRule.Typed(head, nut)));
  }

  /** Degrees without the dust of the way through radians. */
  static double degrees(double radians) {
    return Math.round(Math.toDegrees(radians) * 1e9) / 1e9;
  }
}

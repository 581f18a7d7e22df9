package clampwright.view.given;

import static clampwright.view.given.Fields.tightening;
import static clampwright.view.given.Fields.withTightening;

import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.quantity.Dimension;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.ToDoubleFunction;

/** What is given at assembly, and the numbers of each way to give it. */
final class TargetFields {
  private TargetFields() {}

  static SketchChoice<Target> kind() {
    return new SketchChoice<>(
        "Preload given as",
        sketch -> Optional.of(tightening(sketch).target()),
        TargetForms::given,
        TargetForms::word,
        sketch -> TargetForms.all(sketch.joint()),
        (sketch, target) -> "");
  }

  static boolean is(Sketch sketch, Class<? extends Target> kind) {
    return kind.isInstance(tightening(sketch).target());
  }

  static SketchNumber preload() {
    return of(
        "Preload",
        Dimension.FORCE,
        Target.Force.class,
        Target.Force::force,
        (target, value) -> new Target.Force(value));
  }

  static SketchNumber proofShare() {
    return of(
        "Share of proof",
        Dimension.SHARE,
        Target.ProofFraction.class,
        Target.ProofFraction::fraction,
        (target, value) -> new Target.ProofFraction(value));
  }

  static SketchNumber torque() {
    return new SketchNumber(
        "Torque",
        Dimension.TORQUE,
        sketch -> torque(tightening(sketch).target()),
        (sketch, value) ->
            withTightening(
                sketch,
                tightening ->
                    tightening.withTarget(withTorque(tightening.target(), value.orElseThrow()))),
        false);
  }

  private static OptionalDouble torque(Target target) {
    if (target instanceof Target.NutFactorTorque by) {
      return OptionalDouble.of(by.torque());
    }
    return target instanceof Target.FrictionTorque by
        ? OptionalDouble.of(by.torque())
        : OptionalDouble.empty();
  }

  private static Target withTorque(Target target, double torque) {
    if (target instanceof Target.NutFactorTorque by) {
      return new Target.NutFactorTorque(torque, by.nutFactor());
    }
    return target instanceof Target.FrictionTorque by
        ? new Target.FrictionTorque(torque, by.threadFriction(), by.faceFriction())
        : target;
  }

  static SketchNumber nutFactor() {
    return of(
        "Nut factor",
        Dimension.RATIO,
        Target.NutFactorTorque.class,
        Target.NutFactorTorque::nutFactor,
        (target, value) -> new Target.NutFactorTorque(target.torque(), value));
  }

  static SketchNumber threadFriction() {
    return of(
        "Friction in the thread",
        Dimension.RATIO,
        Target.FrictionTorque.class,
        Target.FrictionTorque::threadFriction,
        (target, value) ->
            new Target.FrictionTorque(target.torque(), value, target.faceFriction()));
  }

  static SketchNumber faceFriction() {
    return of(
        "Friction under the head",
        Dimension.RATIO,
        Target.FrictionTorque.class,
        Target.FrictionTorque::faceFriction,
        (target, value) ->
            new Target.FrictionTorque(target.torque(), target.threadFriction(), value));
  }

  /** A number that only one kind of target has. */
  private static <T extends Target> SketchNumber of(
      String name,
      Dimension dimension,
      Class<T> kind,
      ToDoubleFunction<T> read,
      BiFunction<T, Double, Target> write) {
    return SketchNumber.sometimes(
        name,
        dimension,
        sketch ->
            is(sketch, kind)
                ? OptionalDouble.of(read.applyAsDouble(kind.cast(tightening(sketch).target())))
                : OptionalDouble.empty(),
        (sketch, value) ->
            is(sketch, kind)
                ? withTightening(
                    sketch, it -> it.withTarget(write.apply(kind.cast(it.target()), value)))
                : sketch);
  }

  /** Friction in the thread where the target does not name it. */
  static SketchNumber torsionFriction() {
    return SketchNumber.optional(
        "Friction for torsion",
        Dimension.RATIO,
        sketch -> tightening(sketch).threadFriction(),
        (sketch, value) -> withTightening(sketch, it -> it.withThreadFriction(value)));
  }
}

package clampwright.store;

import clampwright.joint.Embedment;
import clampwright.joint.Scatter;
import clampwright.joint.Target;
import clampwright.joint.Tightening;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads how the bolt is tightened and what is lost afterwards. */
final class TighteningReader {
  private static final Tightening SOUND = Tightening.force(0);

  private TighteningReader() {}

  static Optional<Tightening> read(JsonObjectReader json) {
    Optional<Target> target =
        json.object("target", "target", json.place() + ", target", TighteningReader::target);
    Optional<Scatter> scatter =
        json.has("scatter")
            ? json.object(
                "scatter", "scatter", json.place() + ", scatter", TighteningReader::scatter)
            : Optional.of(Scatter.NONE);
    OptionalDouble friction =
        json.optional(
            "threadFriction",
            "friction in the thread",
            value -> SOUND.withThreadFriction(OptionalDouble.of(value)));
    Optional<Embedment> embedment =
        json.has("embedment")
            ? json.object(
                "embedment", "embedment", json.place() + ", embedment", TighteningReader::embedment)
            : Optional.of(Embedment.NONE);
    double relaxation = json.number("relaxation", "relaxation", 0, SOUND::withRelaxation);
    double creep = json.number("creep", "creep", 0, SOUND::withCreep);
    return json.build(
        () ->
            new Tightening(
                target.orElseThrow(),
                scatter.orElseThrow(),
                friction,
                embedment.orElseThrow(),
                relaxation,
                creep));
  }

  private static Optional<Target> target(JsonObjectReader json) {
    return switch (json.choice("given", "given", Words.TARGETS)) {
      case FORCE -> {
        double force = json.number("force", "preload", Target.Force::new);
        yield json.build(() -> new Target.Force(force));
      }
      case PROOF_FRACTION -> {
        double share = json.number("fraction", "share of proof load", Target.ProofFraction::new);
        yield json.build(() -> new Target.ProofFraction(share));
      }
      case NUT_FACTOR_TORQUE -> {
        double torque = torque(json);
        double factor =
            json.number("nutFactor", "nut factor", value -> new Target.NutFactorTorque(1, value));
        yield json.build(() -> new Target.NutFactorTorque(torque, factor));
      }
      case FRICTION_TORQUE -> {
        double torque = torque(json);
        double thread =
            json.number(
                "threadFriction",
                "friction in the thread",
                value -> new Target.FrictionTorque(1, value, 1));
        double face =
            json.number(
                "faceFriction",
                "friction under the head",
                value -> new Target.FrictionTorque(1, 1, value));
        yield json.build(() -> new Target.FrictionTorque(torque, thread, face));
      }
    };
  }

  private static double torque(JsonObjectReader json) {
    return json.number("torque", "torque", value -> new Target.NutFactorTorque(value, 1));
  }

  private static Optional<Scatter> scatter(JsonObjectReader json) {
    if (json.has("tighteningFactor")) {
      double factor =
          json.number("tighteningFactor", "tightening factor", Scatter.TighteningFactor::new);
      return json.build(() -> new Scatter.TighteningFactor(factor));
    }
    double share = json.number("plusMinus", "scatter", Scatter.PlusMinus::new);
    return json.build(() -> new Scatter.PlusMinus(share));
  }

  private static Optional<Embedment> embedment(JsonObjectReader json) {
    if (json.has("roughness")) {
      Embedment.Roughness roughness = json.choice("roughness", "roughness", Words.ROUGHNESSES);
      boolean sheared = json.flag("sheared", "sheared", false);
      return json.build(() -> new Embedment.FromRoughness(roughness, sheared));
    }
    double amount = json.number("amount", "embedment", Embedment.Typed::new);
    return json.build(() -> new Embedment.Typed(amount));
  }
}

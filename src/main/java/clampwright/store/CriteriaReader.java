package clampwright.store;

import clampwright.joint.Allowables;
import clampwright.joint.Criteria;
import clampwright.joint.Factors;
import clampwright.joint.Tolerances;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads what the joint is judged by; what is missing is as usual. */
final class CriteriaReader {
  private static final Criteria USUAL = Criteria.USUAL;

  private CriteriaReader() {}

  static Optional<Criteria> read(JsonObjectReader json) {
    Criteria.Basis basis = json.choice("basis", "basis", Words.BASES, USUAL.basis());
    Optional<Factors> factors =
        json.has("factors")
            ? json.object("factors", "factors", "factors", CriteriaReader::factors)
            : Optional.of(USUAL.factors());
    Optional<Allowables> allowables =
        json.has("allowables")
            ? json.object("allowables", "allowables", "allowables", CriteriaReader::allowables)
            : Optional.of(USUAL.allowables());
    Criteria.Fatigue fatigue = json.choice("fatigue", "fatigue", Words.FATIGUES, USUAL.fatigue());
    double cycles = json.number("cycles", "number of cycles", USUAL.cycles(), USUAL::withCycles);
    Optional<Tolerances> tolerances =
        json.has("tolerances")
            ? json.object("tolerances", "tolerances", "tolerances", CriteriaReader::tolerances)
            : Optional.of(USUAL.tolerances());
    return json.build(
        () ->
            new Criteria(
                basis,
                factors.orElseThrow(),
                allowables.orElseThrow(),
                fatigue,
                cycles,
                tolerances.orElseThrow()));
  }

  private static Optional<Factors> factors(JsonObjectReader json) {
    Factors none = Factors.NONE;
    double fitting = json.number("fitting", "fitting factor", 1, none::withFitting);
    double ultimate = json.number("ultimate", "factor against rupture", 1, none::withUltimate);
    double yield = json.number("yield", "factor against yield", 1, none::withYield);
    double parting = json.number("parting", "factor against parting", 1, none::withParting);
    double slip = json.number("slip", "factor against slip", 1, none::withSlip);
    return json.build(() -> new Factors(fitting, ultimate, yield, parting, slip));
  }

  private static Optional<Allowables> allowables(JsonObjectReader json) {
    Allowables usual = Allowables.OF_STRENGTH_CLASS;
    OptionalDouble ultimate =
        json.optional("ultimate", "ultimate load", v -> usual.withUltimate(OptionalDouble.of(v)));
    OptionalDouble yield =
        json.optional("yield", "yield load", v -> usual.withYield(OptionalDouble.of(v)));
    OptionalDouble shear =
        json.optional("shear", "shear strength", v -> usual.withShear(OptionalDouble.of(v)));
    OptionalDouble amplitude =
        json.optional(
            "amplitude", "endurable amplitude", v -> usual.withAmplitude(OptionalDouble.of(v)));
    return json.build(() -> new Allowables(ultimate, yield, shear, amplitude));
  }

  private static Optional<Tolerances> tolerances(JsonObjectReader json) {
    Tolerances usual = Tolerances.USUAL;
    double thickness = json.number("thickness", "tolerance of thickness", 0, usual::withThickness);
    double modulus = json.number("modulus", "tolerance of modulus", 0, usual::withModulus);
    double friction = json.number("friction", "tolerance of friction", 0, usual::withFriction);
    double introduction =
        json.number(
            "introduction",
            "tolerance of the load-introduction factor",
            0,
            usual::withIntroduction);
    double temperature =
        json.number("temperature", "tolerance of temperature", 0, usual::withTemperature);
    double low =
        json.number("angleLow", "least half-angle", usual.angleLow(), v -> usual.withAngle(v, 60));
    double high =
        json.number(
            "angleHigh", "greatest half-angle", usual.angleHigh(), v -> usual.withAngle(5, v));
    return json.build(
        () -> new Tolerances(thickness, modulus, friction, introduction, temperature, low, high));
  }
}

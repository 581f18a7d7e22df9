package clampwright.joint;

import java.util.Optional;
import java.util.OptionalDouble;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;

/** Random tightenings, loads, temperatures and criteria, of every kind that can be written. */
public final class Services {
  private Services() {}

  private static Arbitrary<Double> between(double low, double high) {
    return Arbitraries.doubles().between(low, high).ofScale(9);
  }

  private static Arbitrary<OptionalDouble> optional(Arbitrary<Double> values) {
    return values
        .optional()
        .map(value -> value.map(OptionalDouble::of).orElse(OptionalDouble.empty()));
  }

  static Arbitrary<Tightening> tightenings() {
    Arbitrary<Target> targets =
        Arbitraries.oneOf(
            between(0, 1e6).map(Target.Force::new),
            between(0, 1).map(Target.ProofFraction::new),
            Combinators.combine(between(0, 1e7), between(0.01, 1)).as(Target.NutFactorTorque::new),
            Combinators.combine(between(0, 1e7), between(0.01, 1), between(0.01, 1))
                .as(Target.FrictionTorque::new));
    Arbitrary<Scatter> scatters =
        Arbitraries.oneOf(
            between(0, 0.99).map(Scatter.PlusMinus::new),
            between(1, 4).map(Scatter.TighteningFactor::new));
    Arbitrary<Embedment> embedments =
        Arbitraries.oneOf(
            between(0, 0.1).map(Embedment.Typed::new),
            Combinators.combine(
                    Arbitraries.of(Embedment.Roughness.class), Arbitraries.of(true, false))
                .as(Embedment.FromRoughness::new));
    return Combinators.combine(
            targets, scatters, optional(between(0.01, 1)), embedments, between(0, 1), between(0, 1))
        .as(Tightening::new);
  }

  static Arbitrary<Service> services() {
    Arbitrary<String> names = Arbitraries.strings().ofMaxLength(12);
    Arbitrary<TemperatureCase> states =
        Combinators.combine(names, between(-273, 900), between(-273, 900)).as(TemperatureCase::new);
    return Combinators.combine(
            between(-273, 900),
            states.list().ofMaxSize(3),
            loads(names).list().ofMinSize(1).ofMaxSize(4))
        .as(Service::new);
  }

  /** Planes only where any stack of a part has them: at its first. */
  private static Arbitrary<LoadCase> loads(Arbitrary<String> names) {
    Arbitrary<Introduction> introductions = between(0, 1).map(Introduction.Factor::new);
    Arbitrary<Optional<String>> temperatures = names.optional();
    return Combinators.combine(
            names,
            between(-1e6, 1e6),
            between(0, 1e6),
            between(0, 1e6),
            introductions,
            between(0, 1),
            Arbitraries.integers().between(1, 4),
            temperatures)
        .as(
            (name, min, range, shear, introduction, friction, faces, temperature) ->
                new LoadCase(
                    name, min, min + range, shear, introduction, friction, faces, temperature));
  }

  static Arbitrary<Criteria> criteria() {
    Arbitrary<Double> factor = between(0.5, 4);
    Arbitrary<Factors> factors =
        Combinators.combine(factor, factor, factor, factor, factor).as(Factors::new);
    Arbitrary<OptionalDouble> limit = optional(between(1, 1e6));
    Arbitrary<Allowables> allowables =
        Combinators.combine(limit, limit, limit, limit).as(Allowables::new);
    Arbitrary<Tolerances> tolerances =
        Combinators.combine(
                between(0, 0.9),
                between(0, 0.9),
                between(0, 0.9),
                between(0, 1),
                between(0, 100),
                between(5, 30),
                between(30, 60))
            .as(Tolerances::new);
    return Combinators.combine(
            Arbitraries.of(Criteria.Basis.class),
            factors,
            allowables,
            Arbitraries.of(Criteria.Fatigue.class),
            between(1e4, 1e9),
            tolerances)
        .as(Criteria::new);
  }
}

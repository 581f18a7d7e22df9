package clampwright.joint;

import java.util.Objects;

/**
 * What the joint is judged by.
 *
 * @param basis which of the stiffness methods the checks take
 * @param factors on the loads
 * @param allowables typed limits of the bolt
 * @param fatigue rule for the endurable amplitude
 * @param cycles number of load cycles N [–], 10⁴ or more
 * @param tolerances of the inputs, for the question which number matters
 */
public record Criteria(
    Basis basis,
    Factors factors,
    Allowables allowables,
    Fatigue fatigue,
    double cycles,
    Tolerances tolerances) {

  /** Which stiffness methods the checks take. */
  public enum Basis {
    /** Of all that apply, for each check the one that leaves the least margin. */
    LEAST_FAVOURABLE,
    /** The one that the headline readouts follow. */
    CHOSEN
  }

  /** Rules for the endurable stress amplitude; never mixed, they differ by a factor of 2.5 to 3. */
  public enum Fatigue {
    /** VDI 2230-1, thread rolled before heat treatment. */
    VDI_ROLLED_BEFORE,
    /** VDI 2230-1, thread rolled after heat treatment. */
    VDI_ROLLED_AFTER,
    /** Goodman line with the endurance strengths of Shigley table 8-17. */
    GOODMAN
  }

  /** Endless life. */
  public static final double USUAL_CYCLES = 2e6;

  public static final Criteria USUAL =
      new Criteria(
          Basis.LEAST_FAVOURABLE,
          Factors.NONE,
          Allowables.OF_STRENGTH_CLASS,
          Fatigue.VDI_ROLLED_BEFORE,
          USUAL_CYCLES,
          Tolerances.USUAL);

  public Criteria {
    Objects.requireNonNull(basis, "basis");
    Objects.requireNonNull(factors, "factors");
    Objects.requireNonNull(allowables, "allowables");
    Objects.requireNonNull(fatigue, "fatigue");
    Check.finite("number of cycles", "", cycles);
    if (cycles < 1e4) {
      throw Check.refused("number of cycles", "", cycles, "must be 10 000 or more");
    }
    Objects.requireNonNull(tolerances, "tolerances");
  }

  public Criteria withBasis(Basis basis) {
    return new Criteria(basis, factors, allowables, fatigue, cycles, tolerances);
  }

  public Criteria withFactors(Factors factors) {
    return new Criteria(basis, factors, allowables, fatigue, cycles, tolerances);
  }

  public Criteria withAllowables(Allowables allowables) {
    return new Criteria(basis, factors, allowables, fatigue, cycles, tolerances);
  }

  public Criteria withFatigue(Fatigue fatigue) {
    return new Criteria(basis, factors, allowables, fatigue, cycles, tolerances);
  }

  public Criteria withCycles(double cycles) {
    return new Criteria(basis, factors, allowables, fatigue, cycles, tolerances);
  }

  public Criteria withTolerances(Tolerances tolerances) {
    return new Criteria(basis, factors, allowables, fatigue, cycles, tolerances);
  }
}

package clampwright.mechanics.checks;

import clampwright.joint.Criteria;
import clampwright.joint.Joint;
import clampwright.joint.Strength;
import java.util.OptionalDouble;

/** Stress amplitudes that a bolt endures [MPa]. */
public final class Endurance {
  private static final double KSI = 4.4482216152605 * 1000 / (25.4 * 25.4);
  private static final double INCH = 25.4;

  private Endurance() {}

  /** σ_ASV = 0.85·(150/d + 45), rolled before heat treatment (VDI 2230-1, from memory) [MPa]. */
  public static double rolledBefore(double diameter) {
    return 0.85 * (150 / diameter + 45);
  }

  /**
   * Rise for a limited number of cycles, ∛(2·10⁶/N) for 10⁴ ≤ N below 2·10⁶, else 1 (VDI 2230-1,
   * from memory) [–].
   */
  public static double cyclesRise(double cycles) {
    return cycles < 2e6 ? Math.cbrt(2e6 / cycles) : 1;
  }

  /**
   * Fully corrected endurance strength of rolled threads in axial load (Shigley table 8-17) [MPa];
   * empty for a class that is not in the table.
   */
  public static OptionalDouble shigley(Strength strength, double diameter) {
    return switch (strength.grade()) {
      case "8.8" -> OptionalDouble.of(129);
      case "9.8" -> OptionalDouble.of(140);
      case "10.9" -> OptionalDouble.of(162);
      case "12.9" -> OptionalDouble.of(190);
      case "5" -> OptionalDouble.of((diameter <= INCH ? 18.6 : 16.3) * KSI);
      case "8" -> OptionalDouble.of(23.2 * KSI);
      default -> OptionalDouble.empty();
    };
  }

  /**
   * Goodman line from the stress at the least load, S_a = S_e·(S_ut − σ_i)/(S_ut + S_e) (Shigley
   * eq. 8-38) [MPa].
   *
   * @param endurance S_e
   * @param tensile S_ut
   * @param least σ_i, stress at the least load with the greatest preload
   */
  public static double goodman(double endurance, double tensile, double least) {
    return endurance * (tensile - least) / (tensile + endurance);
  }

  /**
   * The endurable amplitude by the rule of the joint [MPa]; NaN where the table has none.
   *
   * @param least bolt load at the least outside load, with the greatest preload [N]
   * @param mean mean bolt load with the greatest preload [N]
   */
  static double amplitude(Joint joint, BoltLimits limits, double least, double mean) {
    Criteria criteria = joint.criteria();
    OptionalDouble typed = criteria.allowables().amplitude();
    if (typed.isPresent()) {
      return typed.getAsDouble();
    }
    double d = joint.fastener().thread().diameter();
    Strength strength = joint.fastener().strength();
    double rise = cyclesRise(criteria.cycles());
    return switch (criteria.fatigue()) {
      case VDI_ROLLED_BEFORE -> rolledBefore(d) * rise;
      case VDI_ROLLED_AFTER ->
          (2 - mean / (limits.yield() * limits.area())) * rolledBefore(d) * rise;
      case GOODMAN -> {
        OptionalDouble endurance = shigley(strength, d);
        yield endurance.isPresent()
            ? goodman(endurance.getAsDouble(), strength.tensile(), least / limits.area())
            : Double.NaN;
      }
    };
  }
}

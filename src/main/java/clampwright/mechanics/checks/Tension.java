package clampwright.mechanics.checks;

import clampwright.mechanics.LoadSharing;

/** Formulas of the checks under an outside load, in doubles only. */
final class Tension {
  private static final double ENOUGH = 1e-12;

  private Tension() {}

  /**
   * The outside load L* that brings the bolt to a limit (NASA-STD-5020B, from memory): the limit
   * itself if the joint parts first, F_p/(1 − Φ) ≤ P; else (P − F_p)/Φ, at most P [N]. Negative
   * where the preload alone is beyond the limit.
   */
  static double loadAtLimit(double limit, double preload, double loadFactor) {
    boolean partsFirst = preload / (1 - loadFactor) <= limit;
    return partsFirst ? limit : Math.min(limit, (limit - preload) / loadFactor);
  }

  /** Bolt tension at an outside load that may part the joint, by the same rule [N]. */
  static double boltTension(double limit, double preload, double loadFactor, double load) {
    boolean partsFirst = preload / (1 - loadFactor) <= limit;
    return partsFirst ? load : preload + loadFactor * load;
  }

  /**
   * Left side of the interaction of shear and tension at m times the load, (m·V/V_u)^a +
   * (T(m)/P_u)^b.
   */
  static double interaction(
      double m,
      double shear,
      double shearLimit,
      double shearPower,
      double axial,
      double limit,
      double tensionPower,
      double preload,
      double loadFactor) {
    double tension = Math.max(0, boltTension(limit, preload, loadFactor, m * axial));
    return Math.pow(m * shear / shearLimit, shearPower) + Math.pow(tension / limit, tensionPower);
  }

  /**
   * The m at which the interaction reaches 1, by bisection; 0 where the preload alone reaches it.
   */
  static double interactionMultiple(
      double shear,
      double shearLimit,
      double shearPower,
      double axial,
      double limit,
      double tensionPower,
      double preload,
      double loadFactor) {
    double low = 0;
    double high = shearLimit / shear;
    if (interaction(
            0, shear, shearLimit, shearPower, axial, limit, tensionPower, preload, loadFactor)
        >= 1) {
      return 0;
    }
    while (high - low > ENOUGH * high) {
      double middle = (low + high) / 2;
      if (middle <= low || middle >= high) {
        break;
      }
      double sum =
          interaction(
              middle,
              shear,
              shearLimit,
              shearPower,
              axial,
              limit,
              tensionPower,
              preload,
              loadFactor);
      if (sum < 1) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return low;
  }

  /**
   * Stress amplitude of the bolt between two loads, the greater of that with the least and that
   * with the greatest preload, which covers parting [N, half the range of bolt load].
   */
  static double amplitude(
      double preloadMin, double preloadMax, double loadFactor, double axialMin, double axialMax) {
    return Math.max(
            range(preloadMin, loadFactor, axialMin, axialMax),
            range(preloadMax, loadFactor, axialMin, axialMax))
        / 2;
  }

  private static double range(double preload, double loadFactor, double axialMin, double axialMax) {
    return LoadSharing.boltLoad(preload, loadFactor, axialMax)
        - LoadSharing.boltLoad(preload, loadFactor, axialMin);
  }
}

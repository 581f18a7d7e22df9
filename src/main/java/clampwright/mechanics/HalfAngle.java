package clampwright.mechanics;

import clampwright.joint.AngleRule;
import clampwright.joint.Joint;

/** The half-angles of the cones by rule. */
final class HalfAngle {
  static final double LOWEST = Math.toRadians(5);
  static final double HIGHEST = Math.toRadians(60);

  private HalfAngle() {}

  /**
   * tan φ of VDI 2230-1 (from memory): through-bolt 0.362 + 0.032 ln(β/2) + 0.153 ln y; tapped
   * 0.348 + 0.013 ln β + 0.193 ln y.
   *
   * @param beta l_K/d_w, above 0
   * @param y D_A'/d_w, above 0
   */
  static double vdiTan(boolean tapped, double beta, double y) {
    return tapped
        ? 0.348 + 0.013 * Math.log(beta) + 0.193 * Math.log(y)
        : 0.362 + 0.032 * Math.log(beta / 2) + 0.153 * Math.log(y);
  }

  /** Half-angle of the head's cone for a rule that needs no computing [rad]. */
  static double head(AngleRule rule) {
    if (rule instanceof AngleRule.Typed typed) {
      return Math.toRadians(typed.headDegrees());
    }
    return Math.toRadians(rule instanceof AngleRule.Fixed30 ? 30 : 45);
  }

  /** Half-angle of the nut's cone for a rule that needs no computing [rad]. */
  static double nut(AngleRule rule) {
    return rule instanceof AngleRule.Typed typed ? Math.toRadians(typed.nutDegrees()) : head(rule);
  }

  /** Whether an angle lies within 5° … 60°, with room for rounding. */
  static boolean inRange(double angle) {
    return angle >= LOWEST - 1e-12 && angle <= HIGHEST + 1e-12;
  }

  /** Whether the joint's rule is the computed one. */
  static boolean isComputed(Joint joint) {
    return joint.method().angle() instanceof AngleRule.Vdi2230;
  }
}

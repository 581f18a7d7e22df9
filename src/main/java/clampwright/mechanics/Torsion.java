package clampwright.mechanics;

import clampwright.joint.ScrewThread;

/** Stresses in the bolt under preload and the torque of its thread. */
public final class Torsion {
  private Torsion() {}

  /** Diameter that the stresses are taken on, d_s = (d2 + d3)/2 [mm]. */
  static double stressDiameter(ScrewThread thread) {
    return (thread.pitchDiameter() + thread.minorDiameter()) / 2;
  }

  /**
   * Shear stress per newton of preload with the section plastic, T/(π d_s³/12) (VDI 2230-1)
   * [1/mm²].
   */
  static double plasticPerForce(ScrewThread thread, double threadFriction) {
    double d = stressDiameter(thread);
    return Torque.threadArm(thread, threadFriction) / (Math.PI * d * d * d / 12);
  }

  /** Shear stress per newton with the section elastic, T/(π d_s³/16) [1/mm²]. */
  static double elasticPerForce(ScrewThread thread, double threadFriction) {
    double d = stressDiameter(thread);
    return Torque.threadArm(thread, threadFriction) / (Math.PI * d * d * d / 16);
  }

  /** von Mises equivalent √(σ² + 3 τ²) [MPa]. */
  public static double equivalent(double tension, double shear) {
    return Math.sqrt(tension * tension + 3 * shear * shear);
  }

  /**
   * Preload at which tightening uses a share ν of the yield strength (VDI 2230-1) [N].
   *
   * @param share ν [–]
   * @param yield R_p0.2 [MPa]
   */
  public static double assemblyPreload(
      ScrewThread thread, double threadFriction, double share, double yield) {
    double perForce = equivalent(1 / thread.stressArea(), plasticPerForce(thread, threadFriction));
    return share * yield / perForce;
  }
}

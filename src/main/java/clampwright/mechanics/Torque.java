package clampwright.mechanics;

import clampwright.joint.ScrewThread;

/**
 * Torque and preload (ISO 16047 / VDI 2230-1): T = F·(P/2π + μ_thread·d2/(2 cos 30°) +
 * μ_face·D_b/2), or with a nut factor T = F·K·d.
 */
public final class Torque {
  private static final double COS_FLANK = Math.cos(Math.toRadians(30));

  private Torque() {}

  /** Torque in the thread per newton of preload, P/2π + μ·d2/(2 cos 30°) [N·mm/N]. */
  public static double threadArm(ScrewThread thread, double threadFriction) {
    return thread.pitch() / (2 * Math.PI)
        + threadFriction * thread.pitchDiameter() / (2 * COS_FLANK);
  }

  /**
   * Torque at the wrench per newton of preload [N·mm/N].
   *
   * @param bearingDiameter mean diameter D_b of the turned face [mm]
   */
  public static double wrenchArm(
      ScrewThread thread, double threadFriction, double faceFriction, double bearingDiameter) {
    return threadArm(thread, threadFriction) + faceFriction * bearingDiameter / 2;
  }

  /** The nut factor that stands for the same torque, arm/d [–]. */
  public static double nutFactor(ScrewThread thread, double wrenchArm) {
    return wrenchArm / thread.diameter();
  }
}

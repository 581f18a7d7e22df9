package clampwright.mechanics;

import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.ScrewThread;
import clampwright.joint.Target;
import java.util.OptionalDouble;

/**
 * What a tightening target comes to as a force, and what any force would be as another target: F =
 * T/(K·d), or T = F·(P/2π + μ_thread·d2/(2 cos 30°) + μ_face·D_b/2) (ISO 16047, VDI 2230-1).
 */
public final class AssemblyPreload {
  private AssemblyPreload() {}

  /** The preload aimed at [N]; empty for a share of a proof load that is not known. */
  public static OptionalDouble of(Joint joint, Target target) {
    Fastener fastener = joint.fastener();
    if (target instanceof Target.Force given) {
      return OptionalDouble.of(given.force());
    }
    if (target instanceof Target.ProofFraction share) {
      OptionalDouble proof = proofLoad(fastener);
      return proof.isPresent()
          ? OptionalDouble.of(share.fraction() * proof.getAsDouble())
          : OptionalDouble.empty();
    }
    if (target instanceof Target.NutFactorTorque torque) {
      return OptionalDouble.of(
          torque.torque() / (torque.nutFactor() * fastener.thread().diameter()));
    }
    Target.FrictionTorque torque = (Target.FrictionTorque) target;
    return OptionalDouble.of(torque.torque() / wrenchArm(joint, torque));
  }

  /** Proof strength times stress area [N]; empty where the class has no proof strength. */
  public static OptionalDouble proofLoad(Fastener fastener) {
    OptionalDouble proof = fastener.strength().proof();
    return proof.isPresent()
        ? OptionalDouble.of(proof.getAsDouble() * fastener.thread().stressArea())
        : OptionalDouble.empty();
  }

  /** Torque at the wrench per newton of preload [N·mm/N]. */
  public static double wrenchArm(Joint joint, Target.FrictionTorque torque) {
    return wrenchArm(joint, torque.threadFriction(), torque.faceFriction());
  }

  /** The same for friction coefficients. */
  public static double wrenchArm(Joint joint, double threadFriction, double faceFriction) {
    ScrewThread thread = joint.fastener().thread();
    return Torque.wrenchArm(thread, threadFriction, faceFriction, bearingDiameter(joint));
  }

  /**
   * Mean diameter of the face under the head, which is the one turned, D_b = (d_w + d_h)/2 [mm];
   * d_h is the hole next to it, or the thread's diameter while nothing lies there.
   */
  public static double bearingDiameter(Joint joint) {
    double face = joint.fastener().head().bearingDiameter();
    double hole =
        joint.elements().isEmpty()
            ? joint.fastener().thread().diameter()
            : Slice.holeInForce(joint, 0);
    return (face + Math.min(hole, face)) / 2;
  }
}

package clampwright.view.given;

import clampwright.joint.Joint;
import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.joint.Tightening;
import clampwright.mechanics.AssemblyPreload;
import clampwright.mechanics.Torque;
import clampwright.view.field.Choice;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The same preload given in other ways. */
final class TargetForms {
  /** Nut factor to start with (common practice, no source). */
  static final double USUAL_NUT_FACTOR = 0.2;

  /** Friction to start with, in the thread and under the head (common practice, no source). */
  static final double USUAL_FRICTION = 0.12;

  private TargetForms() {}

  static String word(Target target) {
    if (target instanceof Target.Force) {
      return "force";
    }
    if (target instanceof Target.ProofFraction) {
      return "share of proof";
    }
    return target instanceof Target.NutFactorTorque ? "torque, K" : "torque, µ";
  }

  /** Every way to give the present preload; no share of a proof load that is unknown or less. */
  static List<Choice<Target>> all(Joint joint) {
    List<Choice<Target>> forms = new ArrayList<>();
    forms.add(choice(new Target.Force(preload(joint)), "the preload itself"));
    proofShare(joint)
        .ifPresent(share -> forms.add(choice(share, "of proof strength times stress area")));
    forms.add(choice(nutFactorTorque(joint), "F = T/(K·d)"));
    forms.add(choice(frictionTorque(joint), "friction in thread and under head (ISO 16047)"));
    return forms;
  }

  private static Choice<Target> choice(Target target, String origin) {
    return new Choice<>(word(target), "", target, origin);
  }

  /** The preload aimed at [N]; 0 while it is a share of an unknown proof load. */
  static double preload(Joint joint) {
    return AssemblyPreload.of(joint, joint.tightening().target()).orElse(0);
  }

  /** The preload over the proof load [–]; empty where the strength class has none. */
  static OptionalDouble shareOfProof(Joint joint) {
    OptionalDouble proof = AssemblyPreload.proofLoad(joint.fastener());
    return proof.isPresent()
        ? OptionalDouble.of(preload(joint) / proof.getAsDouble())
        : OptionalDouble.empty();
  }

  private static Optional<Target> proofShare(Joint joint) {
    if (joint.tightening().target() instanceof Target.ProofFraction present) {
      return shareOfProof(joint).isPresent() ? Optional.of(present) : Optional.empty();
    }
    OptionalDouble share = shareOfProof(joint);
    return share.isPresent() && share.getAsDouble() <= 1
        ? Optional.of(new Target.ProofFraction(share.getAsDouble()))
        : Optional.empty();
  }

  /** The nut factor in force, or the one to start with [–]. */
  static double nutFactor(Joint joint) {
    Target target = joint.tightening().target();
    if (target instanceof Target.NutFactorTorque torque) {
      return torque.nutFactor();
    }
    return target instanceof Target.FrictionTorque torque
        ? Torque.nutFactor(joint.fastener().thread(), AssemblyPreload.wrenchArm(joint, torque))
        : USUAL_NUT_FACTOR;
  }

  /** Torque that gives the preload by the nut factor [N·mm]. */
  static double torque(Joint joint) {
    return preload(joint) * nutFactor(joint) * joint.fastener().thread().diameter();
  }

  private static Target nutFactorTorque(Joint joint) {
    return joint.tightening().target() instanceof Target.NutFactorTorque present
        ? present
        : new Target.NutFactorTorque(torque(joint), nutFactor(joint));
  }

  private static Target frictionTorque(Joint joint) {
    Tightening tightening = joint.tightening();
    if (tightening.target() instanceof Target.FrictionTorque present) {
      return present;
    }
    double thread = tightening.threadFriction().orElse(USUAL_FRICTION);
    double arm = AssemblyPreload.wrenchArm(joint, thread, USUAL_FRICTION);
    return new Target.FrictionTorque(preload(joint) * arm, thread, USUAL_FRICTION);
  }

  /** Friction in the thread that the target named stays known when it no longer does. */
  static Sketch given(Sketch sketch, Target target) {
    return Fields.withTightening(
        sketch,
        tightening ->
            tightening.withThreadFriction(tightening.frictionInThread()).withTarget(target));
  }
}

package clampwright.mechanics.spread;

import clampwright.joint.AngleRule;
import clampwright.joint.Introduction;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Target;
import clampwright.joint.Tolerances;
import clampwright.mechanics.spread.Input.Kind;
import java.util.ArrayList;
import java.util.List;

/** The inputs of a joint that have a stated tolerance. */
public final class Inputs {
  private Inputs() {}

  /** All of them; empty where none is stated. */
  public static List<Input> of(Joint joint) {
    Tolerances tolerances = joint.criteria().tolerances();
    List<Input> inputs = new ArrayList<>();
    add(inputs, Kind.PRELOAD, -1, joint.tightening().scatter().share());
    addFriction(inputs, joint, tolerances.friction());
    for (int i = 0; i < joint.elements().size(); i++) {
      add(inputs, Kind.THICKNESS, i, tolerances.thickness());
      add(inputs, Kind.MODULUS, i, tolerances.modulus());
    }
    add(inputs, Kind.MODULUS, -1, tolerances.modulus());
    addIntroduction(inputs, joint, tolerances.introduction());
    if (!joint.service().temperatures().isEmpty()) {
      add(inputs, Kind.MEMBERS_TEMPERATURE, -1, tolerances.temperature());
      add(inputs, Kind.BOLT_TEMPERATURE, -1, tolerances.temperature());
    }
    addAngle(inputs, joint, tolerances);
    return inputs;
  }

  private static void add(List<Input> inputs, Kind kind, int index, double either) {
    if (either > 0) {
      inputs.add(new Input(kind, index, -either, either));
    }
  }

  private static void addFriction(List<Input> inputs, Joint joint, double share) {
    boolean torque = joint.tightening().target() instanceof Target.FrictionTorque;
    boolean factor = joint.tightening().target() instanceof Target.NutFactorTorque;
    if (joint.tightening().frictionInThread().isPresent()) {
      add(inputs, Kind.THREAD_FRICTION, -1, share);
    }
    if (torque || factor) {
      add(inputs, Kind.FACE_FRICTION, -1, share);
    }
    if (joint.service().loads().stream().anyMatch(load -> load.shear() > 0)) {
      add(inputs, Kind.SLIP_FRICTION, -1, share);
    }
  }

  /** n cannot leave 0 … 1. */
  private static void addIntroduction(List<Input> inputs, Joint joint, double either) {
    List<LoadCase> loads = joint.service().loads();
    for (int i = 0; either > 0 && i < loads.size(); i++) {
      if (loads.get(i).introduction() instanceof Introduction.Factor typed) {
        double low = Math.max(-either, -typed.factor());
        double high = Math.min(either, 1 - typed.factor());
        inputs.add(new Input(Kind.INTRODUCTION, i, low, high));
      }
    }
  }

  /** A computed angle follows the joint and has no tolerance of its own. */
  private static void addAngle(List<Input> inputs, Joint joint, Tolerances tolerances) {
    double given = degrees(joint.method().angle());
    boolean stated = tolerances.angleHigh() > tolerances.angleLow();
    if (stated && given > 0) {
      inputs.add(
          new Input(
              Kind.ANGLE,
              -1,
              Math.min(0, tolerances.angleLow() - given),
              Math.max(0, tolerances.angleHigh() - given)));
    }
  }

  /** The half-angle that is given [°]; 0 where it is computed or differs from side to side. */
  static double degrees(AngleRule rule) {
    if (rule instanceof AngleRule.Typed typed) {
      return typed.headDegrees() == typed.nutDegrees() ? typed.headDegrees() : 0;
    }
    if (rule instanceof AngleRule.Vdi2230) {
      return 0;
    }
    return rule instanceof AngleRule.Fixed30 ? 30 : 45;
  }
}

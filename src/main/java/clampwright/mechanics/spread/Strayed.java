package clampwright.mechanics.spread;

import clampwright.joint.AngleRule;
import clampwright.joint.Element;
import clampwright.joint.Introduction;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Material;
import clampwright.joint.Scatter;
import clampwright.joint.Service;
import clampwright.joint.Target;
import clampwright.joint.TemperatureCase;
import clampwright.joint.Tightening;
import clampwright.mechanics.AssemblyPreload;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A joint whose inputs have strayed. The preload has a value of its own then and no scatter any
 * more.
 */
final class Strayed {
  private static final double ABSOLUTE_ZERO = -273.15;

  private final Joint joint;
  private final double[] thickness;
  private final double[] modulus;
  private final double[] introduction;
  private double preload;
  private double boltModulus;
  private double threadFriction;
  private double faceFriction;
  private double slipFriction;
  private double members;
  private double bolt;
  private double angle;

  private Strayed(Joint joint) {
    this.joint = joint;
    thickness = new double[joint.elements().size()];
    modulus = new double[joint.elements().size()];
    introduction = new double[joint.service().loads().size()];
  }

  /**
   * The joint with its inputs off by so much.
   *
   * @param off how far each input is off, in their order
   */
  static Joint of(Joint joint, List<Input> inputs, double[] off) {
    Strayed strayed = new Strayed(joint);
    for (int i = 0; i < off.length; i++) {
      strayed.take(inputs.get(i), off[i]);
    }
    return strayed.joint();
  }

  private void take(Input input, double off) {
    switch (input.kind()) {
      case PRELOAD -> preload = off;
      case THICKNESS -> thickness[input.index()] = off;
      case MODULUS -> {
        if (input.index() < 0) {
          boltModulus = off;
        } else {
          modulus[input.index()] = off;
        }
      }
      case THREAD_FRICTION -> threadFriction = off;
      case FACE_FRICTION -> faceFriction = off;
      case SLIP_FRICTION -> slipFriction = off;
      case INTRODUCTION -> introduction[input.index()] = off;
      case MEMBERS_TEMPERATURE -> members = off;
      case BOLT_TEMPERATURE -> bolt = off;
      case ANGLE -> angle = off;
    }
  }

  private Joint joint() {
    Joint changed = joint.withElements(elements());
    changed =
        changed.withFastener(
            joint.fastener().withMaterial(stiffened(joint.fastener().material(), boltModulus)));
    if (angle != 0) {
      double degrees = Inputs.degrees(joint.method().angle()) + angle;
      changed = changed.withMethod(joint.method().withAngle(new AngleRule.Typed(degrees, degrees)));
    }
    changed = changed.withService(service());
    return changed.withTightening(tightening(changed));
  }

  private List<Element> elements() {
    List<Element> elements = new ArrayList<>(joint.elements().size());
    for (int i = 0; i < joint.elements().size(); i++) {
      Element element = joint.elements().get(i);
      Element thicker =
          thickness[i] == 0
              ? element
              : element.withThickness(element.thickness() * (1 + thickness[i]));
      elements.add(
          modulus[i] == 0
              ? thicker
              : thicker.withMaterial(stiffened(element.material(), modulus[i])));
    }
    return elements;
  }

  private static Material stiffened(Material material, double share) {
    return share == 0
        ? material
        : new Material(
            material.name(),
            material.family(),
            material.modulus() * (1 + share),
            material.poisson(),
            material.expansion(),
            material.tensile(),
            material.pressureLimit());
  }

  private Service service() {
    Service service = joint.service();
    List<LoadCase> loads = new ArrayList<>(service.loads().size());
    for (int i = 0; i < service.loads().size(); i++) {
      LoadCase load = service.loads().get(i);
      LoadCase rubbed =
          slipFriction == 0 ? load : load.withFriction(load.friction() * (1 + slipFriction));
      loads.add(entered(rubbed, introduction[i]));
    }
    Service loaded = service.withLoads(loads);
    return members == 0 && bolt == 0 ? loaded : loaded.withTemperatures(temperatures());
  }

  private static LoadCase entered(LoadCase load, double off) {
    if (off != 0 && load.introduction() instanceof Introduction.Factor typed) {
      double factor = Math.max(0, Math.min(1, typed.factor() + off));
      return load.withIntroduction(new Introduction.Factor(factor));
    }
    return load;
  }

  private List<TemperatureCase> temperatures() {
    return joint.service().temperatures().stream()
        .map(
            state ->
                new TemperatureCase(
                    state.name(),
                    Math.max(ABSOLUTE_ZERO, state.members() + members),
                    Math.max(ABSOLUTE_ZERO, state.bolt() + bolt)))
        .toList();
  }

  private Tightening tightening(Joint changed) {
    Tightening tightening = joint.tightening();
    Target target = rubbed(tightening.target());
    OptionalDouble force = AssemblyPreload.of(changed, target);
    Target reached =
        force.isPresent() ? new Target.Force(force.getAsDouble() * (1 + preload)) : target;
    OptionalDouble friction = tightening.frictionInThread();
    return tightening
        .withTarget(reached)
        .withScatter(Scatter.NONE)
        .withThreadFriction(
            friction.isPresent()
                ? OptionalDouble.of(friction.getAsDouble() * (1 + threadFriction))
                : friction);
  }

  private Target rubbed(Target target) {
    if (target instanceof Target.FrictionTorque torque) {
      return new Target.FrictionTorque(
          torque.torque(),
          torque.threadFriction() * (1 + threadFriction),
          torque.faceFriction() * (1 + faceFriction));
    }
    if (target instanceof Target.NutFactorTorque torque) {
      return new Target.NutFactorTorque(torque.torque(), torque.nutFactor() * (1 + faceFriction));
    }
    return target;
  }
}

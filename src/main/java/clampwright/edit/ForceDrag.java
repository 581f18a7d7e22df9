package clampwright.edit;

import clampwright.joint.Fastener;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.mechanics.AssemblyPreload;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An arrow of a force: drawn out it grows, by what breaks the bolt over ten bolt diameters.
 *
 * @param start sketch taken hold of
 * @param grab where it was taken hold of
 * @param part LOAD or PRELOAD
 * @param loadCase index of the load case, for the load
 * @param outwards −1 where outwards is towards the head, +1 where it is towards the nut
 * @param force at the start [N]
 */
record ForceDrag(Sketch start, Grab grab, Part part, int loadCase, int outwards, double force)
    implements Drag {
  private static final double DIAMETERS = 10;
  private static final double METRIC_STEP = 100;
  private static final double INCH_STEP = 25 * 4.4482216152605;

  static Drag load(Sketch sketch, int loadCase, boolean atHead, Grab grab) {
    double force = sketch.joint().service().loads().get(loadCase).axialMax();
    return new ForceDrag(sketch, grab, Part.LOAD, loadCase, atHead ? -1 : 1, force);
  }

  /** Empty where the preload is a share of a proof load that is not known. */
  static Optional<Drag> preload(Sketch sketch, Grab grab) {
    OptionalDouble force = AssemblyPreload.of(sketch.joint(), sketch.joint().tightening().target());
    return force.isPresent()
        ? Optional.of(new ForceDrag(sketch, grab, Part.PRELOAD, -1, -1, force.getAsDouble()))
        : Optional.empty();
  }

  @Override
  public Dragged at(double fromAxis, double z, Snap snap) {
    if (grab.isAt(fromAxis, z)) {
      return set(force);
    }
    Fastener fastener = start.joint().fastener();
    double breaks = fastener.strength().tensile() * fastener.thread().stressArea();
    double perLength = breaks / (DIAMETERS * fastener.thread().diameter());
    double wanted = force + outwards * (z - grab.z()) * perLength;
    double step = start.units() == UnitSystem.METRIC ? METRIC_STEP : INCH_STEP;
    double stepped = snap.isFree() ? wanted : Math.rint(wanted / step) * step;
    return set(part.equals(Part.PRELOAD) ? Math.max(0, stepped) : stepped);
  }

  @Override
  public Dragged set(double value) {
    String text = Quantities.text(Dimension.FORCE, start.units(), value);
    boolean preload = part.equals(Part.PRELOAD);
    return new Dragged(
        preload ? preloaded(value) : loaded(value),
        part,
        preload ? "preload" : "axial load",
        Dimension.FORCE,
        value,
        text,
        preload ? "Preload" : "Axial load");
  }

  private Sketch loaded(double value) {
    return start.withJoint(
        joint ->
            joint.withService(
                joint.service().withLoad(loadCase, load -> load.withGreatest(value))));
  }

  /** The target keeps its kind: a torque becomes the torque that reaches the force. */
  private Sketch preloaded(double value) {
    Target target = start.joint().tightening().target();
    double times = force > 0 ? value / force : 0;
    Target reached;
    if (target instanceof Target.NutFactorTorque torque && force > 0) {
      reached = new Target.NutFactorTorque(torque.torque() * times, torque.nutFactor());
    } else if (target instanceof Target.FrictionTorque torque && force > 0) {
      reached =
          new Target.FrictionTorque(
              torque.torque() * times, torque.threadFriction(), torque.faceFriction());
    } else if (target instanceof Target.ProofFraction share && force > 0) {
      reached = new Target.ProofFraction(Math.min(1, share.fraction() * times));
    } else {
      reached = new Target.Force(value);
    }
    return start.withJoint(joint -> joint.withTightening(joint.tightening().withTarget(reached)));
  }

  @Override
  public Optional<String> problem(double value) {
    return part.equals(Part.PRELOAD) && value < 0
        ? Optional.of("The preload must be 0 or more.")
        : Optional.empty();
  }

  @Override
  public Dimension dimension() {
    return Dimension.FORCE;
  }
}

package clampwright.edit;

import clampwright.joint.AngleRule;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Zone;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.Optional;

/**
 * The flank of a cone that swings about where it starts. Both cones swing together unless one is
 * moved alone.
 *
 * @param start sketch taken hold of
 * @param part whose flank it is
 * @param grab where it was taken hold of
 * @param pivot where the flank starts
 * @param zone of the sketch taken hold of
 * @param oneAlone whether the other cone stays
 */
record FlankDrag(Sketch start, Part part, Grab grab, Pivot pivot, Zone zone, boolean oneAlone)
    implements Drag {
  private static final double LOWEST = 5;
  private static final double HIGHEST = 60;

  static Optional<Drag> of(Sketch sketch, Part part, Grab grab) {
    if (Assessment.of(sketch.joint()) instanceof Assessment.Solved solved) {
      Zone zone = solved.zone();
      Pivot pivot = Pivot.of(zone, part.equals(Part.HEAD_CONE), grab.z());
      return Optional.of(new FlankDrag(sketch, part, grab, pivot, zone, false));
    }
    return Optional.empty();
  }

  private double degreesAtStart() {
    double angle = part.equals(Part.HEAD_CONE) ? zone.headHalfAngle() : zone.nutHalfAngle();
    return Math.toDegrees(angle);
  }

  @Override
  public Dragged at(double fromAxis, double z, Snap snap) {
    if (grab.isAt(fromAxis, z)) {
      return dragged(start, degreesAtStart());
    }
    double swung = pivot.degrees(fromAxis, z) - pivot.degrees(grab.fromAxis(), grab.z());
    double degrees = snap.degrees(degreesAtStart() + swung);
    return changed(Math.max(LOWEST, Math.min(HIGHEST, degrees)));
  }

  /** Sets the half-angle [rad]. */
  @Override
  public Dragged set(double value) {
    return changed(tidy(value));
  }

  /** Degrees as they were typed, before they became radians. */
  private static double tidy(double radians) {
    return Math.rint(Math.toDegrees(radians) * 1e9) / 1e9;
  }

  private Dragged changed(double degrees) {
    return dragged(
        start.withJoint(joint -> joint.withMethod(joint.method().withAngle(rule(degrees)))),
        degrees);
  }

  private AngleRule rule(double degrees) {
    boolean head = part.equals(Part.HEAD_CONE);
    double headDegrees = oneAlone && !head ? tidy(zone.headHalfAngle()) : degrees;
    double nutDegrees = oneAlone && head ? tidy(zone.nutHalfAngle()) : degrees;
    if (headDegrees == 45 && nutDegrees == 45) {
      return AngleRule.FIXED_45;
    }
    return headDegrees == 30 && nutDegrees == 30
        ? AngleRule.FIXED_30
        : new AngleRule.Typed(headDegrees, nutDegrees);
  }

  private Dragged dragged(Sketch sketch, double degrees) {
    String whose = part.equals(Part.HEAD_CONE) ? "head's" : "nut's";
    return new Dragged(
        sketch,
        part,
        oneAlone ? whose + " half-angle" : "half-angle",
        Dimension.ANGLE,
        Math.toRadians(degrees),
        Quantities.trimmedText(Dimension.ANGLE, start.units(), Math.toRadians(degrees)),
        oneAlone ? "Change half-angle of the " + whose + " cone" : "Change half-angle");
  }

  @Override
  public Optional<String> problem(double value) {
    double degrees = tidy(value);
    return degrees >= LOWEST && degrees <= HIGHEST
        ? Optional.empty()
        : Optional.of("The half-angle must lie between 5° and 60°.");
  }

  @Override
  public Dimension dimension() {
    return Dimension.ANGLE;
  }

  @Override
  public Drag alone(boolean alone) {
    return new FlankDrag(start, part, grab, pivot, zone, alone);
  }
}

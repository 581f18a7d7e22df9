package clampwright.mechanics.checks;

import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.StrippingAreas;
import java.util.OptionalDouble;

/**
 * Loads at which the engaged threads strip: area at the limits of size times 0.6·R_m (shear over
 * tensile strength, common practice, no source). A nut is taken as strong as its bolt (ISO 898-2
 * pairs them so); a tapped layer needs its own tensile strength.
 *
 * @param engagement in force, less 0.8 P of chamfer [mm]
 * @param areas of both threads [mm²]
 * @param external load that strips the bolt's thread [N]
 * @param internal load that strips the nut's or the tapped thread [N]; infinite where its strength
 *     is not known
 */
public record Stripping(double engagement, StrippingAreas areas, double external, double internal) {
  /** Shear over tensile strength. */
  public static final double SHEAR_RATIO = 0.6;

  private static final double CHAMFER = 0.8;

  /** The stripping loads of a joint. */
  public static Stripping of(Joint joint, Solved solved) {
    Fastener fastener = joint.fastener();
    double pitch = fastener.thread().pitch();
    double engagement = Math.max(0, solved.bolt().engagement() - CHAMFER * pitch);
    StrippingAreas areas = StrippingAreas.of(fastener.thread(), engagement);
    double bolt = fastener.strength().tensile();
    OptionalDouble nut = internalStrength(joint);
    return new Stripping(
        engagement,
        areas,
        areas.external() * SHEAR_RATIO * bolt,
        nut.isPresent()
            ? areas.internal() * SHEAR_RATIO * nut.getAsDouble()
            : Double.POSITIVE_INFINITY);
  }

  /** Tensile strength of the nut or the tapped layer [MPa]; empty where not given. */
  static OptionalDouble internalStrength(Joint joint) {
    int last = joint.elements().size() - 1;
    return joint.fastener().isTapped()
        ? joint.elements().get(last).material().tensile()
        : OptionalDouble.of(joint.fastener().strength().tensile());
  }

  /** The smaller of the two [N]. */
  public double load() {
    return Math.min(external, internal);
  }

  /** The check: both threads must outlast the bolt's stress area. */
  Verdict verdict(Joint joint) {
    if (engagement <= 0) {
      return new Verdict.NotApplicable(
          CheckKind.THREAD_STRIPPING, Part.ANCHOR, Verdict.Why.NO_ENGAGEMENT);
    }
    if (Double.isInfinite(internal)) {
      return new Verdict.NotApplicable(
          CheckKind.THREAD_STRIPPING, Part.ANCHOR, Verdict.Why.NO_TAPPED_STRENGTH);
    }
    double demand = joint.fastener().strength().tensile() * BoltLimits.area(joint.fastener());
    return new Verdict.Judged(
        CheckKind.THREAD_STRIPPING,
        Part.ANCHOR,
        Worst.NOWHERE,
        demand,
        load(),
        1,
        load() / demand - 1);
  }
}

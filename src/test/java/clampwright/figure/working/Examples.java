package clampwright.figure.working;

import clampwright.joint.Anchor;
import clampwright.joint.AngleRule;
import clampwright.joint.Criteria;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Material;
import clampwright.joint.Method;
import clampwright.joint.Outline;
import clampwright.joint.ScrewThread;
import clampwright.joint.Service;
import clampwright.joint.Strength;
import clampwright.joint.Tightening;
import clampwright.joint.WasherRule;
import java.util.List;
import java.util.OptionalDouble;

/** Joints whose numbers are known from elsewhere. */
final class Examples {
  private static final double INCH = 25.4;
  private static final double MPSI = 1e6 * 4.4482216152605 / (INCH * INCH);
  private static final OptionalDouble NONE = OptionalDouble.empty();

  private Examples() {}

  static Material material(Material.Family family, double modulus) {
    return new Material(family.name(), family, modulus, NONE, NONE);
  }

  static Element layer(
      String name, double thickness, double hole, Outline outline, double modulus) {
    Material steel = material(Material.Family.STEEL, modulus);
    return new Element(name, Element.Kind.LAYER, thickness, hole, outline, steel);
  }

  static Element washer(String name, double thickness, double hole, double diameter) {
    Material steel = material(Material.Family.STEEL, 206_000);
    Outline round = new Outline.Round(diameter);
    return new Element(name, Element.Kind.WASHER, thickness, hole, round, steel);
  }

  static Fastener bolt(ScrewThread thread, double face, double modulus) {
    double d = thread.diameter();
    return new Fastener(
        thread,
        new Head(Head.Style.HEXAGON, "own size", face, 0.6 * d, 1.6 * d, 1.6 * d),
        new Anchor.Nut("own size", face, 0.8 * d, 1.6 * d),
        NONE,
        NONE,
        NONE,
        0,
        new Strength("ISO 898-1", "8.8", NONE, OptionalDouble.of(640), 800),
        material(Material.Family.STEEL, modulus));
  }

  static Fastener m10() {
    return bolt(new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5), 16, 206_000);
  }

  static Joint joint(Fastener fastener, AngleRule angle, Element... elements) {
    return new Joint(
        fastener,
        List.of(elements),
        WasherRule.AUTOMATIC,
        WasherRule.AUTOMATIC,
        Method.USUAL.withAngle(angle),
        Tightening.force(20_000),
        Service.of(LoadCase.steady("Working load", 5_000, 1)),
        Criteria.USUAL);
  }

  /**
   * Shigley ex. 8-2: washer and plates under a 1/2-20 bolt, 30°, shank 0.25 in; the lower plate of
   * this modulus [Mpsi].
   */
  static Joint shigley(double lowerModulus) {
    ScrewThread thread =
        new ScrewThread("1/2-20 UNF", ScrewThread.Form.UNIFIED, 0.5 * INCH, INCH / 20);
    Fastener bolt =
        bolt(thread, 0.75 * INCH, 30 * MPSI).withShankLength(OptionalDouble.of(0.25 * INCH));
    double hole = 0.5 * INCH;
    return joint(
            bolt,
            AngleRule.FIXED_30,
            layer("Ring", 0.095 * INCH, hole, Outline.WIDE, 30 * MPSI),
            layer("Plate", 0.5 * INCH, hole, Outline.WIDE, 30 * MPSI),
            layer("Base", 0.75 * INCH, hole, Outline.WIDE, lowerModulus * MPSI))
        .withMethod(Method.USUAL.withAngle(AngleRule.FIXED_30).withEndsCounted(false));
  }

  /** A flange cut by both edges on a wide plate. */
  static Joint strip() {
    return joint(
        m10(),
        AngleRule.FIXED_45,
        layer("Flange", 14, 11, new Outline.Strip(9, 12), 71_000),
        layer("Plate", 10, 11, Outline.WIDE, 206_000));
  }
}

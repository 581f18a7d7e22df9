package clampwright.mechanics;

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
import clampwright.joint.StiffnessMethod;
import clampwright.joint.Strength;
import clampwright.joint.Tightening;
import clampwright.joint.WasherRule;
import java.util.List;
import java.util.OptionalDouble;

/** Joints for tests, in whatever consistent units the source of the check uses. */
public final class Stacks {
  private Stacks() {}

  public static final Strength CLASS_88 =
      new Strength("ISO 898-1", "8.8", OptionalDouble.of(580), OptionalDouble.of(640), 800);

  public static Material steel(double modulus) {
    return material(Material.Family.STEEL, modulus);
  }

  public static Material material(Material.Family family, double modulus) {
    return new Material(
        family + " " + modulus, family, modulus, OptionalDouble.empty(), OptionalDouble.empty());
  }

  public static Element layer(double thickness, double hole, double modulus) {
    return layer(thickness, hole, modulus, Outline.WIDE);
  }

  public static Element layer(double thickness, double hole, double modulus, Outline outline) {
    return new Element("layer", Element.Kind.LAYER, thickness, hole, outline, steel(modulus));
  }

  public static Element washer(double thickness, double hole, double diameter, double modulus) {
    return new Element(
        "washer",
        Element.Kind.WASHER,
        thickness,
        hole,
        new Outline.Round(diameter),
        steel(modulus));
  }

  public static Fastener bolt(ScrewThread thread, double headFace, double nutFace, double modulus) {
    double d = thread.diameter();
    return new Fastener(
        thread,
        new Head(Head.Style.HEXAGON, "own size", headFace, 0.6 * d, 1.6 * d, 1.6 * d),
        new Anchor.Nut("own size", nutFace, 0.8 * d, 1.6 * d),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0,
        CLASS_88,
        steel(modulus));
  }

  public static Fastener tapped(Fastener fastener) {
    return fastener.withAnchor(new Anchor.Tapped());
  }

  public static Joint joint(Fastener fastener, AngleRule angle, Element... elements) {
    return new Joint(
        fastener,
        List.of(elements),
        WasherRule.AUTOMATIC,
        WasherRule.AUTOMATIC,
        Method.USUAL.withAngle(angle),
        Tightening.force(30_000),
        Service.of(LoadCase.steady("Working load", 10_000, 1)),
        Criteria.USUAL);
  }

  public static Assessment.Solved solved(Joint joint) {
    Assessment assessment = Assessment.of(joint);
    if (assessment instanceof Assessment.Solved solved) {
      return solved;
    }
    throw new AssertionError("not solved: " + assessment);
  }

  public static List<Reason> reasons(Joint joint) {
    Assessment assessment = Assessment.of(joint);
    if (assessment instanceof Assessment.Unsolved unsolved) {
      return unsolved.reasons();
    }
    throw new AssertionError("solved: " + assessment);
  }

  public static double stiffness(Joint joint, StiffnessMethod method) {
    MemberStiffness.Result result = solved(joint).members().get(method);
    if (result instanceof MemberStiffness.Value value) {
      return value.stiffness();
    }
    throw new AssertionError(method + ": " + result);
  }
}

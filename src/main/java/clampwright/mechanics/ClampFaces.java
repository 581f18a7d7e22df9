package clampwright.mechanics;

import clampwright.joint.Anchor;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.WasherRule;
import clampwright.mechanics.Zone.WasherDecision;
import clampwright.mechanics.Zone.WasherDecision.Taken;
import java.util.List;

/**
 * Where the two cones start: the bearing faces of head and nut, or of a whole washer, or the
 * virtual face in a tapped layer.
 *
 * @param headDiameter [mm]
 * @param nutDiameter [mm]; in a tapped joint that of the head's side (Shigley)
 * @param headWasher what became of a washer under the head
 * @param nutWasher what became of a washer under the nut
 */
record ClampFaces(
    double headDiameter, double nutDiameter, WasherDecision headWasher, WasherDecision nutWasher) {

  /** The faces that a solved joint's zone lies between. */
  static ClampFaces of(Zone zone) {
    return new ClampFaces(
        zone.headFaceDiameter(), zone.nutFaceDiameter(), zone.headWasher(), zone.nutWasher());
  }

  /** The faces of head and nut themselves, as if there were no washers. */
  static ClampFaces bare(Joint joint) {
    double head = joint.fastener().head().bearingDiameter();
    return new ClampFaces(head, nutBearing(joint), WasherDecision.NONE, WasherDecision.NONE);
  }

  /** The faces under the washer rule at these half-angles. The stack must not be empty. */
  static ClampFaces of(Joint joint, double headTan, double nutTan) {
    List<Element> elements = joint.elements();
    Element first = elements.get(0);
    Element last = elements.get(elements.size() - 1);
    double headBearing = joint.fastener().head().bearingDiameter();
    WasherDecision head = decision(joint.headWasherRule(), first, headBearing, headTan);
    double headDiameter = diameter(head, first, headBearing);
    if (joint.fastener().isTapped()) {
      return new ClampFaces(headDiameter, headDiameter, head, WasherDecision.NONE);
    }
    // A lone washer touches both; it can be the clamp face of one side only.
    boolean taken = elements.size() == 1 && head.taken() != Taken.NO_WASHER;
    double nutBearing = nutBearing(joint);
    WasherDecision nut =
        taken ? WasherDecision.NONE : decision(joint.nutWasherRule(), last, nutBearing, nutTan);
    return new ClampFaces(headDiameter, diameter(nut, last, nutBearing), head, nut);
  }

  private static double nutBearing(Joint joint) {
    return joint.fastener().anchor() instanceof Anchor.Nut nut
        ? nut.bearingDiameter()
        : joint.fastener().head().bearingDiameter();
  }

  /**
   * Whole washer when the overhang u = (OD − d_w)/2 is at most t·tan α, else from the head's edge
   * (common practice, no source: a thick washer that hardly overhangs acts whole, a thin wide one
   * does not). A washer without a round edge never acts whole.
   */
  private static WasherDecision decision(
      WasherRule rule, Element element, double bearing, double tan) {
    if (!element.isWasher()) {
      return WasherDecision.NONE;
    }
    boolean automatic = rule == WasherRule.AUTOMATIC;
    double limit = element.thickness() * tan;
    if (!(element.outline() instanceof Outline.Round round)) {
      return new WasherDecision(
          Taken.FROM_THE_HEADS_EDGE, automatic, Double.POSITIVE_INFINITY, limit);
    }
    double overhang = (round.diameter() - bearing) / 2;
    boolean whole = automatic ? overhang <= limit * (1 + 1e-9) : rule == WasherRule.WHOLE_WASHER;
    return new WasherDecision(
        whole ? Taken.WHOLE_WASHER : Taken.FROM_THE_HEADS_EDGE, automatic, overhang, limit);
  }

  private static double diameter(WasherDecision decision, Element element, double bearing) {
    return decision.taken() == Taken.WHOLE_WASHER
            && element.outline() instanceof Outline.Round round
        ? round.diameter()
        : bearing;
  }

  boolean headWhole() {
    return headWasher.taken() == Taken.WHOLE_WASHER;
  }

  boolean nutWhole() {
    return nutWasher.taken() == Taken.WHOLE_WASHER;
  }

  /** The slices between the faces; a whole washer lies outside. */
  List<Slice> between(List<Slice> slices) {
    int from = headWhole() ? 1 : 0;
    int to = nutWhole() ? slices.size() - 1 : slices.size();
    return slices.subList(from, Math.max(from, to));
  }
}

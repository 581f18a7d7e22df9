package clampwright.mechanics;

import clampwright.joint.Anchor;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.mechanics.Reason.Cause;
import java.util.ArrayList;
import java.util.List;

/** What makes a joint impossible before any cone is drawn. */
final class Obstacles {
  private static final double ROUNDING = 1e-9;

  private Obstacles() {}

  static List<Reason> of(Joint joint) {
    if (joint.elements().isEmpty()) {
      return List.of(Reason.of(Part.JOINT, Cause.EMPTY_STACK));
    }
    List<Reason> reasons = new ArrayList<>();
    for (int i = 0; i < joint.elements().size(); i++) {
      addOutline(reasons, joint, i);
      addPassage(reasons, joint, i);
    }
    addBearing(reasons, joint);
    addBolt(reasons, joint);
    return reasons;
  }

  private static void addOutline(List<Reason> reasons, Joint joint, int i) {
    Outline outline = joint.elements().get(i).outline();
    double hole = Slice.holeInForce(joint, i);
    if (outline instanceof Outline.Round round && round.diameter() <= hole) {
      reasons.add(Reason.of(Part.element(i), Cause.OUTLINE_INSIDE_HOLE, round.diameter(), hole));
    }
    if (outline instanceof Outline.Strip strip) {
      double nearest = Math.min(strip.left(), strip.right());
      if (nearest <= hole / 2) {
        reasons.add(Reason.of(Part.element(i), Cause.EDGE_INSIDE_HOLE, nearest, hole / 2));
      }
    }
  }

  private static void addPassage(List<Reason> reasons, Joint joint, int i) {
    double bolt = joint.fastener().thread().diameter();
    double hole = Slice.holeInForce(joint, i);
    if (hole < bolt * (1 - ROUNDING)) {
      reasons.add(Reason.of(Part.element(i), Cause.HOLE_NARROWER_THAN_BOLT, bolt, hole));
    }
  }

  /** The bearing faces of head and nut on what they touch. */
  private static void addBearing(List<Reason> reasons, Joint joint) {
    addFace(reasons, joint, 0, joint.fastener().head().bearingDiameter());
    int last = joint.elements().size() - 1;
    if (joint.fastener().anchor() instanceof Anchor.Nut nut) {
      addFace(reasons, joint, last, nut.bearingDiameter());
    }
  }

  private static void addFace(List<Reason> reasons, Joint joint, int i, double face) {
    double hole = Slice.holeInForce(joint, i);
    if (face <= hole) {
      reasons.add(Reason.of(Part.element(i), Cause.FACE_INSIDE_HOLE, face, hole));
    }
  }

  private static void addBolt(List<Reason> reasons, Joint joint) {
    Fastener fastener = joint.fastener();
    List<Element> elements = joint.elements();
    boolean tapped = fastener.isTapped();
    if (tapped && elements.get(elements.size() - 1).isWasher()) {
      reasons.add(Reason.of(Part.element(elements.size() - 1), Cause.TAPPED_WASHER));
    }
    double length = BoltLength.of(joint).length();
    double reach = tapped ? BoltLength.aboveTappedLayer(joint) : joint.stackThickness();
    if (length <= reach) {
      reasons.add(Reason.of(Part.SHANK, Cause.BOLT_TOO_SHORT, length, reach));
    }
    double core = Math.min(fastener.thread().minorDiameter(), fastener.plainDiameter());
    if (fastener.bore() >= core) {
      reasons.add(Reason.of(Part.SHANK, Cause.BORE_TOO_WIDE, fastener.bore(), core));
    }
  }
}

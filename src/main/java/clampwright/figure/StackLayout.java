package clampwright.figure;

import clampwright.joint.Anchor;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Zone;

/**
 * How far the parts of a joint reach on the drawing [mm of the joint].
 *
 * @param joint what is drawn
 * @param from z of each element's upper face
 * @param reach at which wide parts are broken off and cones end
 * @param length of the bolt
 * @param shankLength of its plain part
 */
record StackLayout(Joint joint, double[] from, double reach, double length, double shankLength) {

  /** How much farther than the zone asks for an edge may lie and still be drawn in place. */
  private static final double FARTHEST = 1.5;

  static StackLayout of(Joint joint, Assessment assessment) {
    double[] from = new double[joint.elements().size() + 1];
    for (int i = 0; i < joint.elements().size(); i++) {
      from[i + 1] = from[i] + joint.elements().get(i).thickness();
    }
    double stack = from[from.length - 1];
    double d = joint.fastener().thread().diameter();
    double length = joint.fastener().length().orElse(stack + nutHeight(joint) + 0.3 * d);
    double shank = joint.fastener().shankLength().orElse(Math.max(0, length - 2.2 * d));
    if (assessment instanceof Assessment.Solved solved) {
      length = solved.bolt().length();
      shank = solved.bolt().shankLength();
    }
    return new StackLayout(joint, from, reach(joint, assessment), length, shank);
  }

  static double nutHeight(Joint joint) {
    return joint.fastener().anchor() instanceof Anchor.Nut nut
        ? nut.height()
        : joint.fastener().thread().diameter();
  }

  /**
   * As far as the zone asks for, with some room; parts that reach much farther are broken off, so
   * that one distant edge does not make the rest small.
   */
  private static double reach(Joint joint, Assessment assessment) {
    double needed = 1.9 * joint.fastener().head().rim() / 2;
    if (assessment instanceof Assessment.Solved solved) {
      for (Zone.Piece piece : solved.zone().pieces()) {
        needed = Math.max(needed, 1.25 * Math.max(piece.fromRadius(), piece.toRadius()));
      }
    }
    double reach = needed;
    for (Element element : joint.elements()) {
      for (double edge :
          new double[] {element.outline().leftReach(), element.outline().rightReach()}) {
        if (edge <= FARTHEST * needed) {
          reach = Math.max(reach, edge);
        }
      }
    }
    return reach;
  }

  /** Whether an edge so far from the axis is drawn where it is; else the part is broken off. */
  boolean isDrawn(double edge) {
    return edge <= reach;
  }

  double to(int i) {
    return from[i + 1];
  }

  double from(int i) {
    return from[i];
  }

  double stack() {
    return from[from.length - 1];
  }

  /** Highest point, the top of the head; negative [mm from under the head]. */
  double top() {
    return -joint.fastener().head().height();
  }

  /** Half the width of what stands below the stack: the nut, or a tapped bolt's shank [mm]. */
  double nutReach() {
    return joint.fastener().anchor() instanceof Anchor.Nut nut
        ? 0.58 * nut.width()
        : joint.fastener().thread().diameter() / 2;
  }

  /** Lowest point of bolt, nut and stack [mm]. */
  double bottom() {
    double nut = joint.fastener().isTapped() ? 0 : nutHeight(joint);
    return Math.max(stack() + nut, length);
  }

  /** Half the hole as drawn: in a tapped layer the thread [mm]. */
  double holeRadius(int i) {
    return joint.isTappedLayer(i)
        ? joint.fastener().thread().diameter() / 2
        : joint.elements().get(i).hole() / 2;
  }
}

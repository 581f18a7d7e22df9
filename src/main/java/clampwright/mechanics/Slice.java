package clampwright.mechanics;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import java.util.ArrayList;
import java.util.List;

/**
 * An element as it is clamped: at its place under the head, and in a tapped last layer only down to
 * the virtual face and with the thread as its hole.
 *
 * @param element index in the stack
 * @param from z of the face towards the head [mm]
 * @param to z of the face towards the nut [mm]
 * @param hole diameter in force [mm]
 * @param outline its edge
 * @param modulus [MPa]
 */
record Slice(int element, double from, double to, double hole, Outline outline, double modulus) {

  double thickness() {
    return to - from;
  }

  double middle() {
    return (from + to) / 2;
  }

  /** Radius of the round edge [mm]; infinite where there is none. */
  double edgeRadius() {
    return outline instanceof Outline.Round round ? round.diameter() / 2 : Double.POSITIVE_INFINITY;
  }

  /** The whole stack as it is clamped. */
  static List<Slice> of(Joint joint) {
    List<Slice> slices = new ArrayList<>(joint.elements().size());
    double z = 0;
    for (int i = 0; i < joint.elements().size(); i++) {
      Element element = joint.elements().get(i);
      boolean tapped = joint.isTappedLayer(i);
      double thickness = tapped ? virtualDepth(joint) : element.thickness();
      double hole = holeInForce(joint, i);
      slices.add(
          new Slice(i, z, z + thickness, hole, element.outline(), element.material().modulus()));
      z += thickness;
    }
    return slices;
  }

  /** The hole of an element [mm]: the thread's diameter in a tapped last layer. */
  static double holeInForce(Joint joint, int index) {
    return joint.isTappedLayer(index)
        ? joint.fastener().thread().diameter()
        : joint.elements().get(index).hole();
  }

  /**
   * How deep the virtual lower face lies inside the tapped layer, min(t/2, d/2) [mm] (Shigley's
   * effective grip).
   */
  static double virtualDepth(Joint joint) {
    double thickness = joint.elements().get(joint.elements().size() - 1).thickness();
    return Math.min(thickness, joint.fastener().thread().diameter()) / 2;
  }
}

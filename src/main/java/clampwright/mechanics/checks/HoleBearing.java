package clampwright.mechanics.checks;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.Part;

/**
 * Shear load that a layer's hole bears before it is pressed out or torn to the edge (EN 1993-1-8
 * table 3.4, from memory, without γ_M2): k₁·α_b·f_u·d·t with α_b = min(e/(3 d₀), f_ub/f_u, 1) and
 * k₁ = min(2.8·e/d₀ − 1.7, 2.5), e the nearest edge in whichever direction.
 */
final class HoleBearing {
  private HoleBearing() {}

  /** Adds every layer whose tensile strength is given. */
  static void add(Worst worst, Joint joint, double shear, Verdict.Where where) {
    for (int i = 0; i < joint.elements().size(); i++) {
      Element element = joint.elements().get(i);
      if (!element.isWasher() && element.material().tensile().isPresent()) {
        double capacity = capacity(joint, element);
        worst.add(Part.element(i), capacity / shear - 1, shear, capacity, where);
      }
    }
  }

  /** Load that the hole of a layer bears [N], 0 where the edge is too near for the rule. */
  static double capacity(Joint joint, Element element) {
    double d = joint.fastener().plainDiameter();
    double hole = element.hole();
    double tensile = element.material().tensile().orElseThrow();
    double edge = nearestEdge(element.outline());
    double bolt = joint.fastener().strength().tensile();
    double alpha = Math.min(1, Math.min(edge / (3 * hole), bolt / tensile));
    double k = Math.max(0, Math.min(2.8 * edge / hole - 1.7, 2.5));
    return k * alpha * tensile * d * element.thickness();
  }

  private static double nearestEdge(Outline outline) {
    return Math.min(outline.leftReach(), outline.rightReach());
  }
}

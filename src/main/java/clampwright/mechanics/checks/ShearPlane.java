package clampwright.mechanics.checks;

import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.mechanics.Assessment.Solved;
import java.util.List;

/**
 * What the bolt bears across its axis: the shank where it passes every inner interface between
 * layers, else the core of the thread. The last 2.5 P of the shank count as thread (run-out, ISO
 * 3508, from memory).
 *
 * @param shank whether the shank lies in every shear plane
 * @param area that is sheared in one plane [mm²]
 * @param strength τ_u [MPa]
 */
public record ShearPlane(boolean shank, double area, double strength) {
  private static final double RUN_OUT = 2.5;

  /** Powers of shear and tension in their interaction (NASA-STD-5020B, from memory). */
  double shearPower() {
    return shank ? 2.5 : 1.2;
  }

  double tensionPower() {
    return shank ? 1.5 : 2;
  }

  /** Shear load of one plane, V_u [N]. */
  public double load() {
    return area * strength;
  }

  /** The shear planes of a joint. */
  public static ShearPlane of(Joint joint, Solved solved) {
    Fastener fastener = joint.fastener();
    double plain = solved.bolt().shankLength() - RUN_OUT * fastener.thread().pitch();
    boolean shank = plain > lowestPlane(joint);
    double bore = Math.PI / 4 * fastener.bore() * fastener.bore();
    double d = fastener.plainDiameter();
    double area = (shank ? Math.PI / 4 * d * d : fastener.thread().minorArea()) - bore;
    double strength =
        joint
            .criteria()
            .allowables()
            .shear()
            .orElse(Stripping.SHEAR_RATIO * fastener.strength().tensile());
    return new ShearPlane(shank, area, strength);
  }

  /**
   * z of the interface between layers that lies nearest to the nut [mm]; infinite where there is
   * none, so that the thread counts.
   */
  private static double lowestPlane(Joint joint) {
    List<Element> elements = joint.elements();
    double z = 0;
    double lowest = Double.POSITIVE_INFINITY;
    for (int i = 0; i + 1 < elements.size(); i++) {
      z += elements.get(i).thickness();
      if (!elements.get(i).isWasher() && !elements.get(i + 1).isWasher()) {
        lowest = z;
      }
    }
    return lowest;
  }
}

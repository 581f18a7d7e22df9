package clampwright.mechanics;

import clampwright.joint.Joint;
import java.util.ArrayList;
import java.util.List;

/**
 * An element as VDI 2230-1 has it give way: full frusta at the angle of that guideline; in a tapped
 * joint one cone from the head over the parts above the tapped layer.
 *
 * @param element index in the stack
 * @param stiffness [N/mm]
 */
public record VdiSpring(int element, double stiffness) {

  /**
   * The springs in series, head side first, whole washers among them. Only where VDI 2230 applies
   * to the joint, see {@link MemberStiffness}.
   *
   * @param zone of the solved joint
   */
  public static List<VdiSpring> of(Joint joint, Zone zone) {
    ClampFaces faces = ClampFaces.of(zone);
    List<Slice> slices = Slice.of(joint);
    List<Slice> clamped = VdiProportions.vdiSlices(joint, faces, slices);
    PressureZone vdi = zone(VdiProportions.of(joint, faces, slices), faces, clamped);
    List<VdiSpring> springs = new ArrayList<>();
    if (faces.headWhole()) {
      springs.add(washer(slices.get(0)));
    }
    for (int i = 0; i < clamped.size(); i++) {
      springs.add(new VdiSpring(clamped.get(i).element(), 1 / vdi.give(i)));
    }
    if (faces.nutWhole()) {
      springs.add(washer(slices.get(slices.size() - 1)));
    }
    return springs;
  }

  private static VdiSpring washer(Slice slice) {
    return new VdiSpring(slice.element(), 1 / Findings.washerGive(slice));
  }

  /** The zone at the VDI angle: two cones, or one in a tapped joint. */
  static PressureZone zone(VdiProportions proportions, ClampFaces faces, List<Slice> clamped) {
    double nutRadius = proportions.tapped() ? Double.POSITIVE_INFINITY : faces.nutDiameter() / 2;
    double tan = Math.tan(proportions.halfAngle());
    return PressureZone.of(clamped, faces.headDiameter() / 2, nutRadius, tan, tan);
  }
}

package clampwright.mechanics;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import java.util.ArrayList;
import java.util.List;

/** What each element comes to, by the mid-plane rule and by the exact integral. */
final class Findings {
  /** Two cones this near to each other govern alike. */
  private static final double EQUAL = 1e-9;

  private Findings() {}

  static List<ElementFinding> of(
      Joint joint, List<Slice> slices, ClampFaces faces, PressureZone zone) {
    List<ElementFinding> findings = new ArrayList<>(slices.size());
    int last = slices.size() - 1;
    double headFace = zone.slices().get(0).from();
    double nutFace = zone.slices().get(zone.slices().size() - 1).to();
    for (int i = 0; i <= last; i++) {
      boolean headWasher = i == 0 && faces.headWhole();
      if (headWasher || i == last && faces.nutWhole()) {
        Side side = headWasher ? Side.HEAD : Side.NUT;
        findings.add(wholeWasher(joint.elements().get(i), slices.get(i), side, headFace, nutFace));
      } else {
        findings.add(layer(i - (faces.headWhole() ? 1 : 0), zone, headFace, nutFace));
      }
    }
    return findings;
  }

  /** Give of a whole washer, t/(E·π/4·(OD² − ID²)) [mm/N]. */
  static double washerGive(Slice slice) {
    return slice.thickness() / (slice.modulus() * ZoneArea.at(slice.edgeRadius(), slice));
  }

  private static ElementFinding wholeWasher(
      Element washer, Slice slice, Side side, double headFace, double nutFace) {
    double diameter = 2 * slice.edgeRadius();
    double stiffness = 1 / washerGive(slice);
    return new ElementFinding(
        slice.from(),
        slice.to(),
        Math.abs(slice.middle() - headFace),
        Math.abs(nutFace - slice.middle()),
        diameter,
        diameter,
        washer.hole(),
        true,
        side,
        false,
        false,
        diameter,
        ZoneArea.at(slice.edgeRadius(), slice),
        stiffness,
        stiffness);
  }

  private static ElementFinding layer(int i, PressureZone zone, double headFace, double nutFace) {
    Slice slice = zone.slices().get(i);
    double middle = slice.middle();
    double head = zone.headRadiusAt(i, middle);
    double nut = zone.nutRadiusAt(i, middle);
    Side side = governing(head, nut);
    double radius = Math.min(head, nut);
    double area = ZoneArea.at(radius, slice);
    double headFree = zone.headRadius() + (middle - headFace) * zone.headTan();
    double nutFree = zone.nutRadius() + (nutFace - middle) * zone.nutTan();
    boolean limited =
        side != Side.NUT && below(head, headFree) || side != Side.HEAD && below(nut, nutFree);
    return new ElementFinding(
        slice.from(),
        slice.to(),
        middle - headFace,
        nutFace - middle,
        2 * head,
        2 * nut,
        slice.hole(),
        false,
        side,
        limited,
        clipped(slice, radius),
        Math.sqrt(4 * area / Math.PI + slice.hole() * slice.hole()),
        area,
        slice.modulus() * area / slice.thickness(),
        1 / zone.give(i));
  }

  private static Side governing(double head, double nut) {
    if (Math.abs(head - nut) <= EQUAL * Math.max(head, nut)) {
      return Side.BOTH;
    }
    return head < nut ? Side.HEAD : Side.NUT;
  }

  private static boolean below(double radius, double free) {
    return radius < free * (1 - EQUAL);
  }

  private static boolean clipped(Slice slice, double radius) {
    return slice.outline() instanceof Outline.Strip strip
        && radius > Math.min(strip.left(), strip.right());
  }
}

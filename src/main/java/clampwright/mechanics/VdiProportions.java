package clampwright.mechanics;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The proportions that the VDI 2230-1 angle follows from.
 *
 * @param tapped w = 2
 * @param clampLength l_K: between the clamp faces, in a tapped joint down to the tapped layer [mm]
 * @param faceDiameter d_w, mean of both faces [mm]
 * @param bodyDiameter D_A' [mm]; empty where every layer is wide and none was given
 */
public record VdiProportions(
    boolean tapped, double clampLength, double faceDiameter, OptionalDouble bodyDiameter) {

  /** The proportions of a solved joint. */
  public static VdiProportions of(Joint joint, Zone zone) {
    return of(joint, ClampFaces.of(zone), Slice.of(joint));
  }

  static VdiProportions of(Joint joint, ClampFaces faces, List<Slice> slices) {
    return new VdiProportions(
        joint.fastener().isTapped(),
        clampLength(vdiSlices(joint, faces, slices)),
        (faces.headDiameter() + faces.nutDiameter()) / 2,
        bodyDiameter(joint));
  }

  /** What VDI 2230 takes as clamped: between the faces, without a tapped layer. */
  static List<Slice> vdiSlices(Joint joint, ClampFaces faces, List<Slice> slices) {
    List<Slice> between = faces.between(slices);
    return joint.fastener().isTapped()
        ? between.subList(0, Math.max(0, between.size() - 1))
        : between;
  }

  private static double clampLength(List<Slice> slices) {
    return slices.isEmpty() ? 0 : slices.get(slices.size() - 1).to() - slices.get(0).from();
  }

  /** Smallest outline among the layers, washers excluded; else what the user gave. */
  private static OptionalDouble bodyDiameter(Joint joint) {
    double smallest = Double.POSITIVE_INFINITY;
    for (Element element : joint.elements()) {
      if (!element.isWasher()) {
        Outline outline = element.outline();
        smallest = Math.min(smallest, outline.leftReach() + outline.rightReach());
      }
    }
    return Double.isInfinite(smallest)
        ? joint.method().bodyDiameter()
        : OptionalDouble.of(smallest);
  }

  /** β = l_K/d_w. */
  public double beta() {
    return clampLength / faceDiameter;
  }

  /** y = D_A'/d_w; NaN is never returned: ask only where there is a body diameter. */
  public double y() {
    return bodyDiameter.orElseThrow() / faceDiameter;
  }

  /** φ [rad]; only where there is a body diameter and a clamp length. */
  public double halfAngle() {
    return Math.atan(HalfAngle.vdiTan(tapped, beta(), y()));
  }
}

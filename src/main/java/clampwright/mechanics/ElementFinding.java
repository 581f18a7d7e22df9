package clampwright.mechanics;

/**
 * What one element of the stack comes to by the mid-plane rule, and its exact give.
 *
 * @param from where its clamped part begins [mm from under the head]
 * @param to where its clamped part ends [mm]; inside a tapped last layer at the virtual face
 * @param depthFromHead from the head's clamp face to its mid-plane [mm]
 * @param depthFromNut from the nut's clamp face to its mid-plane [mm]
 * @param headDiameter of the head's cone at the mid-plane [mm]
 * @param nutDiameter of the nut's cone at the mid-plane [mm]
 * @param hole hole diameter in force [mm]
 * @param wholeWasher whether it is itself the clamp face; then both cones are its outside diameter
 * @param governing the side with the smaller cone
 * @param edgeLimited whether the governing cone is held by a round edge here or before
 * @param edgeClipped whether a straight edge cuts the governing disc
 * @param effectiveDiameter √(4A/π + d_h²) [mm]
 * @param area of the zone at the mid-plane [mm²]
 * @param stiffness by the mid-plane rule, E·A/t [N/mm]
 * @param frustaStiffness by the exact integral at the same angle [N/mm]
 */
public record ElementFinding(
    double from,
    double to,
    double depthFromHead,
    double depthFromNut,
    double headDiameter,
    double nutDiameter,
    double hole,
    boolean wholeWasher,
    Side governing,
    boolean edgeLimited,
    boolean edgeClipped,
    double effectiveDiameter,
    double area,
    double stiffness,
    double frustaStiffness) {

  /** Thickness of the clamped part [mm]. */
  public double clampedThickness() {
    return to - from;
  }

  /** Position of the mid-plane [mm from under the head]. */
  public double middle() {
    return (from + to) / 2;
  }
}

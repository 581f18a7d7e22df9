package clampwright.mechanics;

import java.util.List;

/**
 * The pressure zone between the two clamp faces.
 *
 * @param headFaceDiameter diameter the head's cone starts with [mm]
 * @param nutFaceDiameter diameter the nut's cone starts with [mm]
 * @param headFacePosition z of the head's clamp face [mm from under the head]
 * @param nutFacePosition z of the nut's clamp face [mm]
 * @param headHalfAngle [rad]
 * @param nutHalfAngle [rad]
 * @param headWasher what became of a washer under the head
 * @param nutWasher what became of a washer under the nut
 * @param headCone the head's cone piece by piece, head side first
 * @param nutCone the nut's cone piece by piece, also head side first
 * @param pieces the zone itself, head side first
 */
public record Zone(
    double headFaceDiameter,
    double nutFaceDiameter,
    double headFacePosition,
    double nutFacePosition,
    double headHalfAngle,
    double nutHalfAngle,
    WasherDecision headWasher,
    WasherDecision nutWasher,
    List<Piece> headCone,
    List<Piece> nutCone,
    List<Piece> pieces) {

  /**
   * A stretch within one element over which the radius changes linearly.
   *
   * @param element index in the stack
   * @param from z where it begins [mm]
   * @param to z where it ends [mm]
   * @param fromRadius [mm]
   * @param toRadius [mm]
   * @param side the cone it belongs to; BOTH where an edge holds both alike
   */
  public record Piece(
      int element, double from, double to, double fromRadius, double toRadius, Side side) {}

  /**
   * What became of the washer that touches a clamp face, and the numbers that decided it.
   *
   * @param taken the outcome
   * @param automatic whether the tool decided
   * @param overhang u = (OD − d_w)/2 [mm]
   * @param limit t·tan α [mm]
   */
  public record WasherDecision(Taken taken, boolean automatic, double overhang, double limit) {

    /** The outcomes. */
    public enum Taken {
      NO_WASHER,
      WHOLE_WASHER,
      FROM_THE_HEADS_EDGE
    }

    static final WasherDecision NONE = new WasherDecision(Taken.NO_WASHER, false, 0, 0);
  }

  public Zone {
    headCone = List.copyOf(headCone);
    nutCone = List.copyOf(nutCone);
    pieces = List.copyOf(pieces);
  }

  /** Distance between the clamp faces [mm]. */
  public double length() {
    return nutFacePosition - headFacePosition;
  }
}

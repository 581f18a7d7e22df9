package clampwright.edit;

import clampwright.mechanics.Zone;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * Where a straight flank starts: at the clamp face, or behind a narrow part at that part's edge.
 *
 * @param radius there [mm]
 * @param z there [mm]
 * @param direction in which the cone opens along the axis: 1 = from the head, −1 = from the nut
 */
record Pivot(double radius, double z, int direction) {
  private static final double SAME = 1e-6;

  /** The pivot of the flank that passes a position; of the clamp face where none is straight. */
  static Pivot of(Zone zone, boolean head, double z) {
    List<Zone.Piece> outwards = new ArrayList<>(head ? zone.headCone() : zone.nutCone());
    if (!head) {
      Collections.reverse(outwards);
    }
    int direction = head ? 1 : -1;
    Pivot pivot =
        head
            ? new Pivot(zone.headFaceDiameter() / 2, zone.headFacePosition(), direction)
            : new Pivot(zone.nutFaceDiameter() / 2, zone.nutFacePosition(), direction);
    Pivot flank = pivot;
    double end = pivot.radius();
    for (Zone.Piece piece : outwards) {
      double near = head ? piece.from() : piece.to();
      double far = head ? piece.to() : piece.from();
      double nearRadius = head ? piece.fromRadius() : piece.toRadius();
      double farRadius = head ? piece.toRadius() : piece.fromRadius();
      boolean opens = farRadius > nearRadius + SAME;
      if (!opens || Math.abs(nearRadius - end) > SAME) {
        flank = opens ? new Pivot(nearRadius, near, direction) : null;
      } else if (flank == null) {
        flank = new Pivot(nearRadius, near, direction);
      }
      end = farRadius;
      if (direction * (far - z) >= 0) {
        break;
      }
    }
    return flank == null ? pivot : flank;
  }

  /** The half-angle of a flank through a position, 0 … 90 [°]. */
  double degrees(double fromAxis, double z) {
    double along = Math.max(SAME, direction * (z - this.z));
    double across = Math.max(0, Math.abs(fromAxis) - radius);
    return Math.toDegrees(Math.atan2(across, along));
  }
}

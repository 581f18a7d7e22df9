package clampwright.mechanics;

import clampwright.joint.Outline;
import clampwright.mechanics.Zone.Piece;

/** The give (compliance) of one piece of the pressure zone, ∫ dz / (E·A(z)) [mm/N]. */
final class Give {
  private Give() {}

  static double of(Piece piece, Slice slice) {
    if (piece.to() <= piece.from()) {
      return 0;
    }
    return slice.outline() instanceof Outline.Strip strip
        ? clipped(piece, slice, strip)
        : frustum(piece, slice);
  }

  /**
   * Exact give of a frustum R1 → R2 around a hole of radius r: {@code ln[(R2−r)(R1+r) /
   * ((R2+r)(R1−r))] / (2π r E tan α)} (Shigley eq. 8-19), written as L·(artanh q / q) / (π E (R1 R2
   * − r²)) with q = r(R2 − R1)/(R1 R2 − r²), which is the same and passes into the cylinder L/(E·A)
   * without loss of digits as R2 → R1.
   */
  static double frustum(Piece piece, Slice slice) {
    double r = slice.hole() / 2;
    double product = piece.fromRadius() * piece.toRadius() - r * r;
    double q = r * (piece.toRadius() - piece.fromRadius()) / product;
    double length = piece.to() - piece.from();
    return length * artanhOverArgument(q) / (Math.PI * slice.modulus() * product);
  }

  /** artanh(q)/q for |q| below 1; 1 at q = 0. */
  private static double artanhOverArgument(double q) {
    double square = q * q;
    if (square < 1e-6) {
      return 1 + square / 3 + square * square / 5;
    }
    return 0.5 * Math.log((1 + q) / (1 - q)) / q;
  }

  /** A piece in a strip, split where the disc reaches either straight edge. */
  private static double clipped(Piece piece, Slice slice, Outline.Strip strip) {
    double near = Math.min(strip.left(), strip.right());
    double far = Math.max(strip.left(), strip.right());
    double low = Math.min(piece.fromRadius(), piece.toRadius());
    double high = Math.max(piece.fromRadius(), piece.toRadius());
    double length = piece.to() - piece.from();
    if (high == low) {
      return length / (slice.modulus() * ZoneArea.at(high, slice));
    }
    double perRadius = length / (high - low);
    double sum = 0;
    double start = low;
    for (double end : new double[] {near, far, high}) {
      double stop = Math.min(Math.max(end, start), high);
      if (stop > start) {
        sum += stretch(start, stop, perRadius, slice);
      }
      start = stop;
    }
    return sum;
  }

  /**
   * Gauss–Legendre over a stretch of growing radius. Just past an edge the area falls behind the
   * full disc with the 3/2th power; the substitution R = start + width·s² makes that smooth.
   */
  private static double stretch(double start, double stop, double perRadius, Slice slice) {
    double width = stop - start;
    double sum = GaussLegendre.onUnit(s -> 2 * s / ZoneArea.at(start + width * s * s, slice));
    return sum * width * perRadius / slice.modulus();
  }
}

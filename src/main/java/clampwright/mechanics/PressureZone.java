package clampwright.mechanics;

import clampwright.mechanics.Zone.Piece;
import java.util.ArrayList;
import java.util.List;

/**
 * The sequential cones over the slices between two clamp faces.
 *
 * <p>Inside a round part a cone is held to its edge; after a narrow part it starts again from that
 * edge. So within slice i a cone is min(entry_i + distance·tan α, edge_i), and the next entry is
 * what it has reached. Strips do not hold a cone; they clip its area.
 *
 * @param slices between the faces, head side first
 * @param headRadius the head's cone starts with [mm]
 * @param nutRadius the nut's cone starts with [mm]; infinite for a joint with one cone only
 * @param headTan tan α of the head's cone
 * @param nutTan tan α of the nut's cone
 * @param headEntry radius at which the head's cone enters each slice, before its edge holds it
 * @param nutEntry the same for the nut's cone, entering from below
 */
record PressureZone(
    List<Slice> slices,
    double headRadius,
    double nutRadius,
    double headTan,
    double nutTan,
    double[] headEntry,
    double[] nutEntry) {

  static PressureZone of(
      List<Slice> slices, double headRadius, double nutRadius, double headTan, double nutTan) {
    int count = slices.size();
    double[] headEntry = new double[count];
    double[] nutEntry = new double[count];
    double reached = headRadius;
    for (int i = 0; i < count; i++) {
      headEntry[i] = reached;
      reached = advanced(slices.get(i), reached, headTan);
    }
    reached = nutRadius;
    for (int i = count - 1; i >= 0; i--) {
      nutEntry[i] = reached;
      reached = advanced(slices.get(i), reached, nutTan);
    }
    return new PressureZone(slices, headRadius, nutRadius, headTan, nutTan, headEntry, nutEntry);
  }

  private static double advanced(Slice slice, double entry, double tan) {
    return Math.min(entry + slice.thickness() * tan, slice.edgeRadius());
  }

  /** Radius of the head's cone in slice i at z [mm]. */
  double headRadiusAt(int i, double z) {
    Slice slice = slices.get(i);
    return Math.min(headEntry[i] + (z - slice.from()) * headTan, slice.edgeRadius());
  }

  /** Radius of the nut's cone in slice i at z [mm]. */
  double nutRadiusAt(int i, double z) {
    Slice slice = slices.get(i);
    return Math.min(nutEntry[i] + (slice.to() - z) * nutTan, slice.edgeRadius());
  }

  /** Radius of the zone in slice i at z [mm]. */
  double radiusAt(int i, double z) {
    return Math.min(headRadiusAt(i, z), nutRadiusAt(i, z));
  }

  /**
   * Smallest radius of the zone in slice i [mm]: the cones are monotone, so at one of its faces.
   */
  double smallestRadius(int i) {
    return Math.min(radiusAt(i, slices.get(i).from()), radiusAt(i, slices.get(i).to()));
  }

  /** Give of slice i by the exact integral [mm/N]. */
  double give(int i) {
    double sum = 0;
    for (Piece piece : pieces(i)) {
      sum += Give.of(piece, slices.get(i));
    }
    return sum;
  }

  /** Give of all slices by the exact integral [mm/N]. */
  double give() {
    double sum = 0;
    for (int i = 0; i < slices.size(); i++) {
      sum += give(i);
    }
    return sum;
  }

  /** The zone in slice i: the head's flank, the stretch an edge holds, the nut's flank. */
  List<Piece> pieces(int i) {
    Slice slice = slices.get(i);
    double headHeld = headHeldFrom(i);
    double nutHeld = nutHeldUntil(i);
    List<Piece> pieces = new ArrayList<>(3);
    if (headHeld < nutHeld) {
      add(pieces, i, slice.from(), headHeld, Side.HEAD);
      add(pieces, i, headHeld, nutHeld, Side.BOTH);
      add(pieces, i, nutHeld, slice.to(), Side.NUT);
    } else {
      double crossing = crossing(i);
      add(pieces, i, slice.from(), crossing, Side.HEAD);
      add(pieces, i, crossing, slice.to(), Side.NUT);
    }
    return pieces;
  }

  /** The head's cone in slice i, free flank first, then held by the edge. */
  List<Piece> headCone(int i) {
    Slice slice = slices.get(i);
    double held = headHeldFrom(i);
    List<Piece> pieces = new ArrayList<>(2);
    addCone(pieces, i, slice.from(), held, Side.HEAD);
    addCone(pieces, i, held, slice.to(), Side.HEAD);
    return pieces;
  }

  /** The nut's cone in slice i, held by the edge first, then its free flank. */
  List<Piece> nutCone(int i) {
    Slice slice = slices.get(i);
    double held = nutHeldUntil(i);
    List<Piece> pieces = new ArrayList<>(2);
    addCone(pieces, i, slice.from(), held, Side.NUT);
    addCone(pieces, i, held, slice.to(), Side.NUT);
    return pieces;
  }

  /** z from which the edge of slice i holds the head's cone; its lower face if it never does. */
  private double headHeldFrom(int i) {
    Slice slice = slices.get(i);
    double room = slice.edgeRadius() - headEntry[i];
    return room <= 0 ? slice.from() : Math.min(slice.from() + room / headTan, slice.to());
  }

  /** z until which the edge of slice i holds the nut's cone; its upper face if it never does. */
  private double nutHeldUntil(int i) {
    Slice slice = slices.get(i);
    if (Double.isInfinite(slice.edgeRadius())) {
      return slice.from();
    }
    double room = slice.edgeRadius() - nutEntry[i];
    return room <= 0 ? slice.to() : Math.max(slice.to() - room / nutTan, slice.from());
  }

  /** z at which the two free flanks meet, kept within slice i. */
  private double crossing(int i) {
    Slice slice = slices.get(i);
    if (headTan + nutTan == 0) {
      return headEntry[i] <= nutEntry[i] ? slice.to() : slice.from();
    }
    double z =
        (nutEntry[i] - headEntry[i] + slice.from() * headTan + slice.to() * nutTan)
            / (headTan + nutTan);
    return Math.min(Math.max(z, slice.from()), slice.to());
  }

  private void add(List<Piece> pieces, int i, double from, double to, Side side) {
    if (to > from) {
      int element = slices.get(i).element();
      pieces.add(new Piece(element, from, to, radiusAt(i, from), radiusAt(i, to), side));
    }
  }

  private void addCone(List<Piece> pieces, int i, double from, double to, Side side) {
    if (to > from) {
      int element = slices.get(i).element();
      boolean head = side == Side.HEAD;
      double start = head ? headRadiusAt(i, from) : nutRadiusAt(i, from);
      double end = head ? headRadiusAt(i, to) : nutRadiusAt(i, to);
      pieces.add(new Piece(element, from, to, start, end, side));
    }
  }
}

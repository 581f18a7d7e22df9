package clampwright.figure;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Hatching cut to a polygon. */
final class HatchLines {
  private HatchLines() {}

  /**
   * Parallel strokes at 45° inside a polygon, start and end in turn.
   *
   * @param rising whether the strokes rise to the right
   * @param spacing between strokes [sheet mm]
   */
  static List<Point> within(List<Point> polygon, boolean rising, double spacing) {
    double slope = rising ? 1 : -1;
    double low = Double.POSITIVE_INFINITY;
    double high = Double.NEGATIVE_INFINITY;
    for (Point point : polygon) {
      double across = point.y() + slope * point.x();
      low = Math.min(low, across);
      high = Math.max(high, across);
    }
    double step = spacing * Math.sqrt(2);
    List<Point> strokes = new ArrayList<>();
    for (double across = Math.ceil(low / step) * step; across < high; across += step) {
      addCut(strokes, polygon, slope, across);
    }
    return strokes;
  }

  /** The stretches of the line y + slope·x = across that lie inside the polygon (even-odd). */
  private static void addCut(
      List<Point> strokes, List<Point> polygon, double slope, double across) {
    double[] crossings = new double[polygon.size()];
    int count = 0;
    for (int i = 0; i < polygon.size(); i++) {
      Point a = polygon.get(i);
      Point b = polygon.get((i + 1) % polygon.size());
      double fromA = a.y() + slope * a.x() - across;
      double fromB = b.y() + slope * b.x() - across;
      if (fromA < 0 != fromB < 0) {
        crossings[count++] = a.x() + (b.x() - a.x()) * fromA / (fromA - fromB);
      }
    }
    Arrays.sort(crossings, 0, count);
    for (int i = 0; i + 1 < count; i += 2) {
      strokes.add(new Point(crossings[i], across - slope * crossings[i]));
      strokes.add(new Point(crossings[i + 1], across - slope * crossings[i + 1]));
    }
  }
}

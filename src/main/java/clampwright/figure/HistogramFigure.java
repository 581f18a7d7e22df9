package clampwright.figure;

import clampwright.joint.Part;
import clampwright.mechanics.spread.Outcome;
import clampwright.quantity.Dimension;
import clampwright.quantity.UnitSystem;
import java.util.List;

/**
 * Margins of a Monte-Carlo run as a histogram; what fails is filled another way than what holds.
 */
public final class HistogramFigure {
  private static final double SIDE = 4;
  private static final double TOP = 3;
  private static final double BOTTOM = 7;

  private HistogramFigure() {}

  /**
   * Draws a histogram.
   *
   * @param width of the sheet [mm]
   * @param height of the sheet [mm]
   */
  public static Figure of(Outcome outcome, double width, double height) {
    Drawing drawing = new Drawing(new Sheet(width, height, 1, 0, 0));
    Outcome.Histogram histogram = outcome.histogram();
    Axis axis =
        Axis.holding(Dimension.RATIO, UnitSystem.METRIC, histogram.from(), histogram.to(), 6);
    int most = 1;
    for (int count : histogram.counts()) {
      most = Math.max(most, count);
    }
    double base = height - BOTTOM;
    int bins = histogram.counts().length;
    double step = (histogram.to() - histogram.from()) / bins;
    for (int i = 0; i < bins; i++) {
      double from = histogram.from() + i * step;
      double tall = (base - TOP) * histogram.counts()[i] / most;
      boolean fails = from + step / 2 < 0;
      Role role = fails ? Role.BIN_FAILS : Role.BIN_HOLDS;
      if (tall > 0) {
        drawing.area(
            Tag.of(role, Part.JOINT),
            box(x(axis, width, from), base - tall, x(axis, width, from + step) - 0.15, base));
      }
    }
    Tag line = Tag.of(Role.SCALE, Part.JOINT);
    drawing.line(line, new Point(SIDE, base), new Point(width - SIDE, base));
    for (double tick : axis.ticks()) {
      double x = x(axis, width, tick);
      drawing.line(line, new Point(x, base), new Point(x, base + 1));
      drawing.text(
          Tag.of(Role.SCALE_TEXT, Part.JOINT),
          x,
          base + 4.4,
          axis.label(tick),
          Mark.Anchor.MIDDLE,
          2.7);
    }
    if (axis.from() < 0 && axis.to() > 0) {
      double zero = x(axis, width, 0);
      drawing.line(Tag.of(Role.RUNG, Part.JOINT), new Point(zero, TOP - 1), new Point(zero, base));
    }
    return new Figure("Margins of random joints", width, height, drawing.marks());
  }

  private static double x(Axis axis, double width, double value) {
    return SIDE + axis.share(value) * (width - 2 * SIDE);
  }

  private static List<Point> box(double left, double top, double right, double bottom) {
    return List.of(
        new Point(left, top),
        new Point(right, top),
        new Point(right, bottom),
        new Point(left, bottom));
  }
}

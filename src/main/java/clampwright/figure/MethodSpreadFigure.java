package clampwright.figure;

import clampwright.joint.Part;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** The load factor by every method as labelled dots on one axis. */
public final class MethodSpreadFigure {
  private static final double MARGIN = 8;
  private static final double LABEL_WIDTH = 13;

  private MethodSpreadFigure() {}

  /** A dot to place. */
  private record Dot(StiffnessMethod method, double loadFactor) {}

  /**
   * Draws the methods that apply; the chosen one filled.
   *
   * @param introduction load-introduction factor n of the load case shown [–]
   */
  public static Figure of(
      MemberStiffness members,
      StiffnessMethod chosen,
      double introduction,
      double width,
      double height) {
    List<Dot> dots = new ArrayList<>();
    for (StiffnessMethod method : StiffnessMethod.values()) {
      if (members.get(method) instanceof MemberStiffness.Value value) {
        dots.add(new Dot(method, value.loadFactor(introduction)));
      }
    }
    dots.sort(Comparator.comparingDouble(Dot::loadFactor));
    double low = dots.get(0).loadFactor;
    double high = dots.get(dots.size() - 1).loadFactor;
    double step = step(Math.max(high - low, 0.02));
    double from = Math.floor(low / step) * step;
    double to = Math.max(Math.ceil(high / step) * step, from + step);
    Drawing drawing = new Drawing(new Sheet(width, height, 1, 0, 0));
    double axis = height - 6.5;
    double perUnit = (width - 2 * MARGIN) / (to - from);
    drawing.line(
        Tag.of(Role.SCALE, Part.JOINT), new Point(MARGIN, axis), new Point(width - MARGIN, axis));
    for (int i = 0; i <= Math.round((to - from) / step); i++) {
      tick(drawing, MARGIN + i * step * perUnit, axis, from + i * step);
    }
    double[] rowEnd = {-100, -100, -100, -100};
    for (Dot dot : dots) {
      double x = MARGIN + (dot.loadFactor - from) * perUnit;
      int row = 0;
      while (row < rowEnd.length - 1 && x - LABEL_WIDTH / 2 < rowEnd[row]) {
        row++;
      }
      rowEnd[row] = x + LABEL_WIDTH / 2;
      dot(drawing, dot, dot.method == chosen, x, axis, row);
    }
    return new Figure("Load factor by method", width, height, drawing.marks());
  }

  private static void dot(
      Drawing drawing, Dot dot, boolean chosen, double x, double axis, int row) {
    Tag tag = Tag.of(chosen ? Role.POINT_CHOSEN : Role.POINT, Part.JOINT);
    drawing.disc(tag, new Point(x, axis), chosen ? 1.6 : 1.1, chosen);
    double half = LABEL_WIDTH / 2;
    double labelX = Math.max(half, Math.min(drawing.sheet().width() - half, x));
    drawing.text(
        Tag.of(chosen ? Role.NAME : Role.SCALE_TEXT, Part.JOINT),
        labelX,
        axis - 2.8 - 3.1 * row,
        Sentences.shortMethod(dot.method),
        Mark.Anchor.MIDDLE,
        2.7,
        chosen ? Mark.Weight.BOLD : Mark.Weight.REGULAR);
  }

  private static void tick(Drawing drawing, double x, double axis, double value) {
    drawing.line(Tag.of(Role.SCALE, Part.JOINT), new Point(x, axis), new Point(x, axis + 1));
    drawing.text(
        Tag.of(Role.SCALE_TEXT, Part.JOINT),
        x,
        axis + 4.2,
        String.format(Locale.ROOT, "%.2f", value),
        Mark.Anchor.MIDDLE,
        2.7);
  }

  /** A step of 1, 2 or 5 in some decade that parts the span into two to five. */
  private static double step(double span) {
    double step = 0.01;
    double[] factors = {2, 2.5, 2};
    for (int i = 0; span / step > 4; i++) {
      step *= factors[i % 3];
    }
    return step;
  }
}

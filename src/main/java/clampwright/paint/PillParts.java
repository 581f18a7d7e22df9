package clampwright.paint;

import clampwright.figure.Mark;
import clampwright.figure.Point;
import java.util.ArrayList;
import java.util.List;

/**
 * What a pill is made of besides its box, in sheet millimetres.
 *
 * @param symbol polygon of its symbol; empty for none
 * @param letter bold text behind it, anchored at its start
 * @param text at the right end, anchored at its end
 */
public record PillParts(List<Point> symbol, Mark.Text letter, Mark.Text text) {

  /** The parts of a pill. */
  public static PillParts of(Mark.Pill pill) {
    double height = pill.height();
    double middle = pill.y() + height / 2;
    double base = middle + 0.36 * pill.size();
    Mark.Text letter =
        new Mark.Text(
            pill.tag(),
            new Point(pill.x() + 1.05 * height, base),
            pill.letter(),
            Mark.Anchor.START,
            pill.size(),
            Mark.Weight.BOLD);
    Mark.Text text =
        new Mark.Text(
            pill.tag(),
            new Point(pill.x() + pill.width() - 0.45 * height, base),
            pill.text(),
            Mark.Anchor.END,
            pill.size(),
            Mark.Weight.REGULAR);
    return new PillParts(symbol(pill, middle), letter, text);
  }

  private static List<Point> symbol(Mark.Pill pill, double middle) {
    double[][] shape =
        switch (pill.symbol()) {
          case TRIANGLE_DOWN -> new double[][] {{-1, -0.9}, {1, -0.9}, {0, 1}};
          case TRIANGLE_UP -> new double[][] {{-1, 0.9}, {1, 0.9}, {0, -1}};
          case DIAMOND -> new double[][] {{-1, 0}, {0, -1}, {1, 0}, {0, 1}};
          case NONE -> new double[0][];
        };
    double x = pill.x() + 0.62 * pill.height();
    double half = 0.24 * pill.height();
    List<Point> points = new ArrayList<>();
    for (double[] corner : shape) {
      points.add(new Point(x + half * corner[0], middle + half * corner[1]));
    }
    return points;
  }
}

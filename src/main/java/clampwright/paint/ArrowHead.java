package clampwright.paint;

import clampwright.figure.Mark;
import clampwright.figure.Point;
import java.util.ArrayList;
import java.util.List;

/** The filled heads of an arrow, in sheet millimetres. */
public final class ArrowHead {
  private ArrowHead() {}

  /** The triangles of an arrow's heads; none where it has no length. */
  public static List<List<Point>> of(Mark.Arrow arrow, double lineWidth) {
    double length =
        Math.hypot(arrow.to().x() - arrow.from().x(), arrow.to().y() - arrow.from().y());
    List<List<Point>> heads = new ArrayList<>();
    if (length == 0) {
      return heads;
    }
    double size = Math.min(2.2 + 2 * lineWidth, 0.45 * length);
    if (arrow.headAtFrom()) {
      heads.add(triangle(arrow.to(), arrow.from(), size / length));
    }
    if (arrow.headAtTo()) {
      heads.add(triangle(arrow.from(), arrow.to(), size / length));
    }
    return heads;
  }

  private static List<Point> triangle(Point from, Point tip, double share) {
    double x = (tip.x() - from.x()) * share;
    double y = (tip.y() - from.y()) * share;
    return List.of(
        tip,
        new Point(tip.x() - x - 0.22 * y, tip.y() - y + 0.22 * x),
        new Point(tip.x() - x + 0.22 * y, tip.y() - y - 0.22 * x));
  }
}

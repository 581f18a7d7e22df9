package clampwright.figure;

import java.util.List;

/** Where marks lie, for tests. */
final class Geometry {
  private Geometry() {}

  /** Points that a mark reaches to; of a text both ends of its base line. */
  static List<Point> points(Mark mark) {
    if (mark instanceof Mark.Path path) {
      return path.points();
    }
    if (mark instanceof Mark.Area area) {
      return area.points();
    }
    if (mark instanceof Mark.Arrow arrow) {
      return List.of(arrow.from(), arrow.to());
    }
    if (mark instanceof Mark.Disc disc) {
      return List.of(disc.centre());
    }
    if (mark instanceof Mark.Text text) {
      double[] box = box(text);
      return List.of(new Point(box[0], text.at().y()), new Point(box[2], text.at().y()));
    }
    if (mark instanceof Mark.Pill pill) {
      return List.of(
          new Point(pill.x(), pill.y()),
          new Point(pill.x() + pill.width(), pill.y() + pill.height()));
    }
    return ((Mark.Hatch) mark).strokes();
  }

  /** The box of a text or a pill. */
  static double[] boxOf(Mark mark) {
    if (mark instanceof Mark.Pill pill) {
      return new double[] {pill.x(), pill.y(), pill.x() + pill.width(), pill.y() + pill.height()};
    }
    return box((Mark.Text) mark);
  }

  /** Left, top, right, bottom; letters reach about 0.73 above and 0.2 below the base line. */
  static double[] box(Mark.Text text) {
    double width = TextWidth.of(text.text(), text.size(), text.weight());
    double left =
        switch (text.anchor()) {
          case START -> text.at().x();
          case MIDDLE -> text.at().x() - width / 2;
          case END -> text.at().x() - width;
        };
    double base = text.at().y();
    return new double[] {left, base - 0.73 * text.size(), left + width, base + 0.2 * text.size()};
  }
}

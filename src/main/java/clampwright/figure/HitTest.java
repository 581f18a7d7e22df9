package clampwright.figure;

import java.util.List;
import java.util.Optional;

/** Finds what lies under a point of a figure, by the marks that were painted. */
public final class HitTest {
  private HitTest() {}

  /**
   * The topmost thing within reach. Grips and edges win over bodies; of edges the nearest wins.
   *
   * @param reach how near counts as on it [sheet mm]
   * @return empty on bare paper
   */
  public static Optional<Tag> at(Figure figure, Point point, double reach) {
    Tag nearest = null;
    double best = reach;
    Tag body = null;
    for (Mark mark : figure.marks()) {
      if (isDraggable(mark)) {
        double distance = distance(mark, point);
        if (distance <= best) {
          best = distance;
          nearest = mark.tag();
        }
      }
      if (isBody(mark, point)) {
        body = mark.tag();
      }
    }
    return Optional.ofNullable(nearest != null ? nearest : body);
  }

  private static boolean isDraggable(Mark mark) {
    boolean line =
        mark instanceof Mark.Path || mark instanceof Mark.Disc || mark instanceof Mark.Arrow;
    return line && mark.tag().feature().isPresent() && mark.role() != Role.HOT;
  }

  private static boolean isBody(Mark mark, Point point) {
    if (mark instanceof Mark.Area area) {
      return inside(area.points(), point);
    }
    if (mark instanceof Mark.Pill pill) {
      return point.x() >= pill.x()
          && point.x() <= pill.x() + pill.width()
          && point.y() >= pill.y()
          && point.y() <= pill.y() + pill.height();
    }
    return false;
  }

  private static double distance(Mark mark, Point point) {
    if (mark instanceof Mark.Disc disc) {
      double away = Math.hypot(disc.centre().x() - point.x(), disc.centre().y() - point.y());
      return Math.max(0, away - disc.radius());
    }
    if (mark instanceof Mark.Arrow arrow) {
      return toSegment(point, arrow.from(), arrow.to());
    }
    List<Point> points = ((Mark.Path) mark).points();
    double best = Double.POSITIVE_INFINITY;
    for (int i = 0; i + 1 < points.size(); i++) {
      best = Math.min(best, toSegment(point, points.get(i), points.get(i + 1)));
    }
    return best;
  }

  static double toSegment(Point p, Point a, Point b) {
    double dx = b.x() - a.x();
    double dy = b.y() - a.y();
    double square = dx * dx + dy * dy;
    double along = square == 0 ? 0 : ((p.x() - a.x()) * dx + (p.y() - a.y()) * dy) / square;
    double t = Math.max(0, Math.min(1, along));
    return Math.hypot(p.x() - a.x() - t * dx, p.y() - a.y() - t * dy);
  }

  static boolean inside(List<Point> polygon, Point p) {
    boolean inside = false;
    for (int i = 0, j = polygon.size() - 1; i < polygon.size(); j = i++) {
      Point a = polygon.get(i);
      Point b = polygon.get(j);
      if (a.y() > p.y() != b.y() > p.y()
          && p.x() < (b.x() - a.x()) * (p.y() - a.y()) / (b.y() - a.y()) + a.x()) {
        inside = !inside;
      }
    }
    return inside;
  }
}

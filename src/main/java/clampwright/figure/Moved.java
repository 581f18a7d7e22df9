package clampwright.figure;

import java.util.List;

/**
 * Marks elsewhere on a larger sheet, larger or smaller. Line widths are the palette's and stay.
 *
 * @param dx to the right [sheet mm], after the scaling
 * @param dy downwards [sheet mm], after the scaling
 * @param scale above 0
 */
record Moved(double dx, double dy, double scale) {

  /** A figure's marks, moved. */
  List<Mark> of(Figure figure) {
    return figure.marks().stream().map(this::of).toList();
  }

  private Mark of(Mark mark) {
    if (mark instanceof Mark.Path path) {
      return new Mark.Path(path.tag(), of(path.points()), path.closed());
    }
    if (mark instanceof Mark.Area area) {
      return new Mark.Area(area.tag(), of(area.points()));
    }
    if (mark instanceof Mark.Hatch hatch) {
      return new Mark.Hatch(hatch.tag(), of(hatch.polygon()), of(hatch.strokes()));
    }
    if (mark instanceof Mark.Text text) {
      return new Mark.Text(
          text.tag(),
          of(text.at()),
          text.text(),
          text.anchor(),
          scale * text.size(),
          text.weight());
    }
    if (mark instanceof Mark.Disc disc) {
      return new Mark.Disc(disc.tag(), of(disc.centre()), scale * disc.radius(), disc.filled());
    }
    if (mark instanceof Mark.Arrow arrow) {
      return new Mark.Arrow(
          arrow.tag(), of(arrow.from()), of(arrow.to()), arrow.headAtFrom(), arrow.headAtTo());
    }
    Mark.Pill pill = (Mark.Pill) mark;
    Point corner = of(new Point(pill.x(), pill.y()));
    return new Mark.Pill(
        pill.tag(),
        corner.x(),
        corner.y(),
        scale * pill.width(),
        scale * pill.height(),
        pill.symbol(),
        pill.letter(),
        pill.text(),
        scale * pill.size());
  }

  private List<Point> of(List<Point> points) {
    return points.stream().map(this::of).toList();
  }

  private Point of(Point point) {
    return new Point(dx + scale * point.x(), dy + scale * point.y());
  }
}

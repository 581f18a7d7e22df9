package clampwright.paint.print;

import clampwright.figure.Figure;
import clampwright.figure.Mark;
import clampwright.figure.Point;
import clampwright.figure.Role;
import clampwright.figure.TextWidth;
import clampwright.paint.ArrowHead;
import clampwright.paint.Look;
import clampwright.paint.Palette;
import clampwright.paint.PillParts;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import java.util.List;

/**
 * Paints a figure with Java2D; the graphics are scaled so that its unit is the sheet millimetre.
 */
final class GraphicsPainter {
  private final Graphics2D graphics;
  private final Palette palette;

  GraphicsPainter(Graphics2D graphics, Palette palette) {
    this.graphics = graphics;
    this.palette = palette;
  }

  void paint(Figure figure) {
    graphics.setColor(colour(palette.paper()));
    graphics.fill(new Rectangle2D.Double(0, 0, figure.width(), figure.height()));
    for (Mark mark : figure.marks()) {
      paint(mark, palette.of(mark.role()));
    }
  }

  private void paint(Mark mark, Look look) {
    if (mark instanceof Mark.Path path) {
      stroke(shape(path.points(), path.closed()), look);
    } else if (mark instanceof Mark.Area area) {
      fill(area.points(), look.fill());
    } else if (mark instanceof Mark.Hatch hatch) {
      hatch(hatch, look);
    } else if (mark instanceof Mark.Text text) {
      text(text, look.stroke());
    } else if (mark instanceof Mark.Disc disc) {
      disc(disc, look);
    } else if (mark instanceof Mark.Pill pill) {
      pill(pill, look);
    } else if (mark instanceof Mark.Arrow arrow) {
      stroke(shape(List.of(arrow.from(), arrow.to()), false), look);
      ArrowHead.of(arrow, look.width()).forEach(head -> fill(head, look.fill()));
    }
  }

  private static Path2D shape(List<Point> points, boolean closed) {
    Path2D path = new Path2D.Double();
    for (int i = 0; i < points.size(); i++) {
      if (i == 0) {
        path.moveTo(points.get(i).x(), points.get(i).y());
      } else {
        path.lineTo(points.get(i).x(), points.get(i).y());
      }
    }
    if (closed) {
      path.closePath();
    }
    return path;
  }

  private void stroke(java.awt.Shape shape, Look look) {
    if (look.stroke() >>> 24 != 0 && look.width() > 0) {
      graphics.setColor(colour(look.stroke()));
      graphics.setStroke(pen(look));
      graphics.draw(shape);
    }
  }

  private static BasicStroke pen(Look look) {
    float width = (float) look.width();
    if (look.dash().length == 0) {
      return new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER);
    }
    float[] dash = new float[look.dash().length];
    for (int i = 0; i < dash.length; i++) {
      dash[i] = (float) look.dash()[i];
    }
    return new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 10, dash, 0);
  }

  private void fill(List<Point> points, int colour) {
    if (colour >>> 24 != 0 && !points.isEmpty()) {
      graphics.setColor(colour(colour));
      graphics.fill(shape(points, true));
    }
  }

  private void hatch(Mark.Hatch hatch, Look look) {
    Path2D path = new Path2D.Double();
    List<Point> strokes = hatch.strokes();
    for (int i = 0; i + 1 < strokes.size(); i += 2) {
      path.moveTo(strokes.get(i).x(), strokes.get(i).y());
      path.lineTo(strokes.get(i + 1).x(), strokes.get(i + 1).y());
    }
    stroke(path, look);
  }

  private void text(Mark.Text text, int colour) {
    if (text.text().isEmpty()) {
      return;
    }
    double width = TextWidth.of(text.text(), text.size(), text.weight());
    double x =
        switch (text.anchor()) {
          case START -> text.at().x();
          case MIDDLE -> text.at().x() - width / 2;
          case END -> text.at().x() - width;
        };
    graphics.setColor(colour(colour));
    graphics.setFont(PrintFonts.of(text.weight(), text.size()));
    graphics.drawString(text.text(), (float) x, (float) text.at().y());
  }

  private void disc(Mark.Disc disc, Look look) {
    double r = disc.radius();
    Ellipse2D circle =
        new Ellipse2D.Double(disc.centre().x() - r, disc.centre().y() - r, 2 * r, 2 * r);
    int colour = disc.filled() ? look.stroke() : look.fill();
    if (colour >>> 24 != 0) {
      graphics.setColor(colour(colour));
      graphics.fill(circle);
    }
    stroke(circle, look);
  }

  private void pill(Mark.Pill pill, Look look) {
    RoundRectangle2D box =
        new RoundRectangle2D.Double(
            pill.x(), pill.y(), pill.width(), pill.height(), pill.height(), pill.height());
    graphics.setColor(colour(look.fill()));
    graphics.fill(box);
    stroke(box, look);
    PillParts parts = PillParts.of(pill);
    fill(parts.symbol(), look.stroke());
    text(parts.letter(), look.stroke());
    text(parts.text(), palette.of(Role.NAME).stroke());
  }

  private static Color colour(int argb) {
    return new Color(argb, true);
  }
}

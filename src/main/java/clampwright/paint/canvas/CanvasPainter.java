package clampwright.paint.canvas;

import clampwright.figure.Figure;
import clampwright.figure.Mark;
import clampwright.figure.Point;
import clampwright.paint.Look;
import clampwright.paint.Palette;
import java.util.List;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.text.TextAlignment;

/** Paints a figure on a canvas; lines along the axes are snapped to the pixels of the screen. */
final class CanvasPainter {
  private final GraphicsContext context;
  private final Palette palette;
  private final double perMm;
  private final double outputScale;

  /**
   * A painter.
   *
   * @param perMm pixels of the region per sheet millimetre
   * @param outputScale pixels of the screen per pixel of the region
   */
  CanvasPainter(GraphicsContext context, Palette palette, double perMm, double outputScale) {
    this.context = context;
    this.palette = palette;
    this.perMm = perMm;
    this.outputScale = outputScale;
  }

  void paintPaper(Figure figure) {
    context.setFill(colour(palette.paper()));
    context.fillRect(0, 0, figure.width() * perMm, figure.height() * perMm);
  }

  void paint(Figure figure) {
    context.setTextBaseline(VPos.BASELINE);
    for (Mark mark : figure.marks()) {
      paint(mark, palette.of(mark.role()));
    }
  }

  private void paint(Mark mark, Look look) {
    if (mark instanceof Mark.Path path) {
      stroke(path, look);
    } else if (mark instanceof Mark.Area area) {
      trace(area.points(), 0);
      context.closePath();
      context.setFill(colour(look.fill()));
      context.fill();
    } else if (mark instanceof Mark.Hatch hatch) {
      hatch(hatch, look);
    } else if (mark instanceof Mark.Text text) {
      text(text, look);
    } else if (mark instanceof Mark.Disc disc) {
      disc(disc, look);
    } else if (mark instanceof Mark.Pill pill) {
      pill(pill, look);
    } else if (mark instanceof Mark.Arrow arrow) {
      arrow(arrow, look);
    }
  }

  private void stroke(Mark.Path path, Look look) {
    pen(look);
    trace(path.points(), pixels(look.width()));
    if (path.closed()) {
      context.closePath();
    }
    context.stroke();
    context.setLineDashes();
  }

  private void pen(Look look) {
    context.setStroke(colour(look.stroke()));
    context.setLineWidth(pixels(look.width()));
    context.setLineCap(StrokeLineCap.BUTT);
    if (look.dash().length > 0) {
      double[] dash = look.dash().clone();
      for (int i = 0; i < dash.length; i++) {
        dash[i] *= perMm;
      }
      context.setLineDashes(dash);
    }
  }

  /** Width of a line in the region, at least one pixel of the screen and whole ones [px]. */
  private double pixels(double width) {
    return Math.max(1, Math.round(width * perMm * outputScale)) / outputScale;
  }

  /** A line of odd width is sharp in the middle of a pixel, one of even width between two. */
  private double snapped(double value, double width) {
    double device = value * perMm * outputScale;
    boolean odd = Math.round(width * outputScale) % 2 == 1;
    return (odd ? Math.floor(device) + 0.5 : Math.round(device)) / outputScale;
  }

  private void trace(List<Point> points, double width) {
    context.beginPath();
    for (int i = 0; i < points.size(); i++) {
      Point point = points.get(i);
      double x = snapped(point.x(), width);
      double y = snapped(point.y(), width);
      if (i == 0) {
        context.moveTo(x, y);
      } else {
        context.lineTo(x, y);
      }
    }
  }

  private void hatch(Mark.Hatch hatch, Look look) {
    pen(look);
    context.beginPath();
    List<Point> strokes = hatch.strokes();
    for (int i = 0; i + 1 < strokes.size(); i += 2) {
      context.moveTo(strokes.get(i).x() * perMm, strokes.get(i).y() * perMm);
      context.lineTo(strokes.get(i + 1).x() * perMm, strokes.get(i + 1).y() * perMm);
    }
    context.stroke();
  }

  private void text(Mark.Text text, Look look) {
    write(
        text.text(),
        text.at().x() * perMm,
        text.at().y() * perMm,
        text.anchor(),
        text.size(),
        text.weight(),
        look.stroke());
  }

  private void write(
      String text,
      double x,
      double y,
      Mark.Anchor anchor,
      double size,
      Mark.Weight weight,
      int colour) {
    context.setFont(Fonts.of(weight, size * perMm));
    context.setTextAlign(
        switch (anchor) {
          case START -> TextAlignment.LEFT;
          case MIDDLE -> TextAlignment.CENTER;
          case END -> TextAlignment.RIGHT;
        });
    context.setFill(colour(colour));
    context.fillText(text, x, y);
  }

  private void disc(Mark.Disc disc, Look look) {
    double radius = disc.radius() * perMm;
    double x = disc.centre().x() * perMm - radius;
    double y = disc.centre().y() * perMm - radius;
    context.setFill(colour(disc.filled() ? look.stroke() : look.fill()));
    context.fillOval(x, y, 2 * radius, 2 * radius);
    pen(look);
    context.strokeOval(x, y, 2 * radius, 2 * radius);
  }

  private void pill(Mark.Pill pill, Look look) {
    double line = pixels(look.width());
    double x = snapped(pill.x(), line);
    double y = snapped(pill.y(), line);
    double height = snapped(pill.y() + pill.height(), line) - y;
    double width = snapped(pill.x() + pill.width(), line) - x;
    context.setFill(colour(look.fill()));
    context.fillRoundRect(x, y, width, height, height, height);
    pen(look);
    context.strokeRoundRect(x, y, width, height, height, height);
    double middle = y + height / 2;
    double base = middle + 0.36 * pill.size() * perMm;
    symbol(pill.symbol(), x + 0.62 * height, middle, 0.2 * height, look.stroke());
    write(
        pill.letter(),
        x + 1.05 * height,
        base,
        Mark.Anchor.START,
        pill.size(),
        Mark.Weight.BOLD,
        look.stroke());
    int ink = palette.of(clampwright.figure.Role.NAME).stroke();
    write(
        pill.text(),
        x + width - 0.45 * height,
        base,
        Mark.Anchor.END,
        pill.size(),
        Mark.Weight.REGULAR,
        ink);
  }

  private void symbol(Mark.Symbol symbol, double x, double y, double half, int colour) {
    double[][] shape =
        switch (symbol) {
          case TRIANGLE_DOWN -> new double[][] {{-1, 1, 0}, {-0.9, -0.9, 1}};
          case TRIANGLE_UP -> new double[][] {{-1, 1, 0}, {0.9, 0.9, -1}};
          case DIAMOND -> new double[][] {{-1, 0, 1, 0}, {0, -1, 0, 1}};
          case NONE -> new double[2][0];
        };
    for (int i = 0; i < shape[0].length; i++) {
      shape[0][i] = x + 1.2 * half * shape[0][i];
      shape[1][i] = y + 1.2 * half * shape[1][i];
    }
    context.setFill(colour(colour));
    context.fillPolygon(shape[0], shape[1], shape[0].length);
  }

  private void arrow(Mark.Arrow arrow, Look look) {
    pen(look);
    trace(List.of(arrow.from(), arrow.to()), pixels(look.width()));
    context.stroke();
    double length =
        Math.hypot(arrow.to().x() - arrow.from().x(), arrow.to().y() - arrow.from().y());
    double head = Math.min(2.2 + 2 * look.width(), 0.45 * length);
    if (arrow.headAtFrom()) {
      arrowHead(arrow.to(), arrow.from(), head, look);
    }
    if (arrow.headAtTo()) {
      arrowHead(arrow.from(), arrow.to(), head, look);
    }
  }

  private void arrowHead(Point from, Point tip, double size, Look look) {
    double length = Math.hypot(tip.x() - from.x(), tip.y() - from.y());
    if (length == 0) {
      return;
    }
    double width = pixels(look.width());
    double ux = (tip.x() - from.x()) / length;
    double uy = (tip.y() - from.y()) / length;
    double x = ux == 0 ? snapped(tip.x(), width) : tip.x() * perMm;
    double y = uy == 0 ? snapped(tip.y(), width) : tip.y() * perMm;
    double back = size * perMm;
    double half = 0.22 * back;
    context.setFill(colour(look.fill()));
    context.fillPolygon(
        new double[] {x, x - back * ux - half * uy, x - back * ux + half * uy},
        new double[] {y, y - back * uy + half * ux, y - back * uy - half * ux},
        3);
  }

  private static Color colour(int argb) {
    return Color.rgb(argb >> 16 & 0xFF, argb >> 8 & 0xFF, argb & 0xFF, (argb >>> 24) / 255.0);
  }
}

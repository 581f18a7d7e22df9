package clampwright.view.section;

import clampwright.edit.Snap;
import clampwright.figure.Point;
import clampwright.figure.SectionFigure;
import clampwright.figure.Sheet;
import clampwright.joint.Sketch;
import clampwright.paint.canvas.FigureCanvas;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

/**
 * Where the sheet lies in the pane. It keeps the whole joint in sight until the reader has zoomed
 * or moved it, and again once asked to.
 */
final class Viewport {
  private static final double SAME = 0.01;
  private static final double SMALLEST = 0.02;
  private static final double LARGEST = 200;

  /** The sheet is laid out anew only when the joint outgrows it or has become small on it. */
  private static final double OUTGROWN = 0.97;

  private static final double SMALL = 1.4;

  private final ReadOnlyObjectWrapper<Sheet> sheet =
      new ReadOnlyObjectWrapper<>(this, "sheet", new Sheet(100, 100, 1, 50, 30));
  private boolean fitted = true;
  private boolean anew;

  ReadOnlyObjectProperty<Sheet> sheetProperty() {
    return sheet.getReadOnlyProperty();
  }

  Sheet sheet() {
    return sheet.get();
  }

  /** Whether the pane has another size than the sheet [px]. */
  boolean isOtherSize(double width, double height) {
    double wide = sheet().width() * FigureCanvas.PIXELS_PER_MM;
    double high = sheet().height() * FigureCanvas.PIXELS_PER_MM;
    return Math.abs(wide - width) > SAME || Math.abs(high - height) > SAME;
  }

  /** With the next change, brings the joint into sight whatever its size, and keeps it there. */
  void beginAnew() {
    fitted = true;
    anew = true;
  }

  /** Lays the sheet out for a pane of this size [px]. */
  void resize(Sketch sketch, double width, double height) {
    double wide = Math.max(1, width) / FigureCanvas.PIXELS_PER_MM;
    double high = Math.max(1, height) / FigureCanvas.PIXELS_PER_MM;
    Sheet old = sheet();
    if (fitted) {
      sheet.set(SectionFigure.fitted(sketch, wide, high));
    } else {
      double dx = (wide - old.width()) / 2;
      double dy = (high - old.height()) / 2;
      sheet.set(new Sheet(wide, high, old.scale(), old.axisX() + dx, old.headY() + dy));
    }
  }

  /** Brings the whole joint into sight. */
  void fit(Sketch sketch) {
    fitted = true;
    sheet.set(SectionFigure.fitted(sketch, sheet().width(), sheet().height()));
  }

  /** After a change: keeps the joint in sight if it is to be kept there. */
  void follow(Sketch sketch) {
    if (fitted) {
      Sheet fitting = SectionFigure.fitted(sketch, sheet().width(), sheet().height());
      double ratio = fitting.scale() / sheet().scale();
      if (anew || ratio < OUTGROWN || ratio > SMALL) {
        sheet.set(fitting);
      }
      anew = false;
    }
  }

  /** Zooms about a point of the pane that stays where it is [px]. */
  void zoom(double factor, double x, double y) {
    double scale = Math.max(SMALLEST, Math.min(LARGEST, sheet().scale() * factor));
    Sheet zoomed = sheet().zoomed(scale / sheet().scale(), point(x, y));
    fitted = false;
    sheet.set(zoomed);
  }

  /** Moves a sheet by a distance on the pane [px]. */
  void pan(Sheet from, double dx, double dy) {
    fitted = false;
    sheet.set(from.panned(dx / FigureCanvas.PIXELS_PER_MM, dy / FigureCanvas.PIXELS_PER_MM));
  }

  /** The point of the sheet under a point of the pane [px]. */
  Point point(double x, double y) {
    return new Point(x / FigureCanvas.PIXELS_PER_MM, y / FigureCanvas.PIXELS_PER_MM);
  }

  /** Signed distance from the axis under a point of the pane [mm of the joint]. */
  double fromAxis(Pointer pointer) {
    return sheet().fromAxis(pointer.x() / FigureCanvas.PIXELS_PER_MM);
  }

  /** Position under the head under a point of the pane [mm of the joint]. */
  double z(Pointer pointer) {
    return sheet().z(pointer.y() / FigureCanvas.PIXELS_PER_MM);
  }

  /** The steps that a drag goes by at this scale. */
  Snap snap(Sketch sketch, boolean free) {
    return free ? Snap.FREE : Snap.of(sketch.units(), sheet().scale());
  }
}

package clampwright.paint.canvas;

import clampwright.figure.Figure;
import javafx.scene.layout.Region;

/**
 * Shows a figure, painted anew at most once per pulse and sharp at the window's output scale. A
 * figure as large as the region fills it: sheet millimetres are those of a 96 dpi screen.
 */
public final class FigureCanvas extends Region {
  /** Pixels of the region per sheet millimetre. */
  public static final double PIXELS_PER_MM = 96 / 25.4;

  /** Shows another figure from the next pulse on; the same figure again costs nothing. */
  public void setFigure(Figure figure) {
    throw new UnsupportedOperationException("comes with the paint commit");
  }
}

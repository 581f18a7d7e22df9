package clampwright.paint.canvas;

import clampwright.figure.Figure;
import clampwright.paint.Palette;
import javafx.beans.InvalidationListener;
import javafx.beans.WeakInvalidationListener;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.canvas.Canvas;
import javafx.scene.layout.Region;
import javafx.stage.Window;

/**
 * Shows a figure, painted anew at most once per pulse and sharp at the window's output scale. A
 * figure as large as the region fills it: sheet millimetres are those of a 96 dpi screen.
 */
public final class FigureCanvas extends Region {
  /** Pixels of the region per sheet millimetre. */
  public static final double PIXELS_PER_MM = 96 / 25.4;

  private final Canvas canvas = new Canvas();
  private final InvalidationListener look = palette -> requestLayout();
  // The palette outlives every canvas and must not keep one alive.
  private final WeakInvalidationListener repaint = new WeakInvalidationListener(look);
  private Figure figure;
  private boolean onPaper = true;
  private static final ObjectProperty<Palette> PALETTE = new SimpleObjectProperty<>(Palette.LIGHT);

  /** An empty canvas. */
  public FigureCanvas() {
    getChildren().add(canvas);
    canvas.setMouseTransparent(true);
    sceneProperty()
        .flatMap(scene -> scene.windowProperty())
        .flatMap(Window::outputScaleXProperty)
        .addListener(scale -> requestLayout());
    PALETTE.addListener(repaint);
  }

  /** Shows another figure from the next pulse on; the same figure again costs nothing. */
  public void setFigure(Figure figure) {
    if (figure != this.figure) {
      this.figure = figure;
      requestLayout();
    }
  }

  /** The palette of every canvas in the program. */
  public static ObjectProperty<Palette> paletteProperty() {
    return PALETTE;
  }

  /** Whether the figure lies on the palette's paper; else on whatever is behind the canvas. */
  public void setOnPaper(boolean onPaper) {
    this.onPaper = onPaper;
    requestLayout();
  }

  @Override
  protected void layoutChildren() {
    canvas.setWidth(Math.ceil(getWidth()));
    canvas.setHeight(Math.ceil(getHeight()));
    if (figure == null) {
      return;
    }
    double scale =
        getScene() == null || getScene().getWindow() == null
            ? 1
            : getScene().getWindow().getOutputScaleX();
    CanvasPainter painter =
        new CanvasPainter(canvas.getGraphicsContext2D(), PALETTE.get(), PIXELS_PER_MM, scale);
    canvas.getGraphicsContext2D().clearRect(0, 0, canvas.getWidth(), canvas.getHeight());
    if (onPaper) {
      painter.paintPaper(figure);
    }
    painter.paint(figure);
  }
}

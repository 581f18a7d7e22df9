package clampwright.paint.canvas;

import clampwright.figure.Figure;
import clampwright.paint.Palette;
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
  private Figure figure;
  private Palette palette = Palette.LIGHT;

  /** An empty canvas in the light palette. */
  public FigureCanvas() {
    getChildren().add(canvas);
    canvas.setMouseTransparent(true);
    sceneProperty()
        .flatMap(scene -> scene.windowProperty())
        .flatMap(Window::outputScaleXProperty)
        .addListener(scale -> requestLayout());
  }

  /** Shows another figure from the next pulse on; the same figure again costs nothing. */
  public void setFigure(Figure figure) {
    if (figure != this.figure) {
      this.figure = figure;
      requestLayout();
    }
  }

  /** Shows the figure in another palette. */
  public void setPalette(Palette palette) {
    if (palette != this.palette) {
      this.palette = palette;
      requestLayout();
    }
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
    new CanvasPainter(canvas.getGraphicsContext2D(), palette, PIXELS_PER_MM, scale).paint(figure);
  }
}

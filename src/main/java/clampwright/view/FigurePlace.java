package clampwright.view;

import clampwright.figure.Figure;
import clampwright.paint.canvas.FigureCanvas;
import javafx.scene.AccessibleRole;
import javafx.scene.layout.Region;

/** A place that a figure fills; it is drawn for the size that the place has. */
public final class FigurePlace extends Region {

  /** Draws a figure for a sheet of this size [mm]. */
  @FunctionalInterface
  public interface Draw {
    Figure of(double width, double height);
  }

  private final FigureCanvas canvas = new FigureCanvas();
  private Draw draw;
  private double drawnWidth;
  private double drawnHeight;

  /**
   * An empty place on the background of what is behind it.
   *
   * @param description for whoever cannot see it
   */
  public FigurePlace(String description) {
    setAccessibleRole(AccessibleRole.IMAGE_VIEW);
    setAccessibleText(description);
    canvas.setOnPaper(false);
    getChildren().add(canvas);
  }

  /** Keeps a height [px]. */
  public FigurePlace tall(double height) {
    setMinHeight(height);
    setPrefHeight(height);
    return this;
  }

  public void show(Draw draw) {
    this.draw = draw;
    drawnWidth = 0;
    requestLayout();
  }

  @Override
  protected void layoutChildren() {
    canvas.resizeRelocate(0, 0, getWidth(), getHeight());
    boolean other = getWidth() != drawnWidth || getHeight() != drawnHeight;
    if (draw != null && getWidth() > 0 && getHeight() > 0 && other) {
      drawnWidth = getWidth();
      drawnHeight = getHeight();
      double perMm = FigureCanvas.PIXELS_PER_MM;
      canvas.setFigure(draw.of(getWidth() / perMm, getHeight() / perMm));
    }
  }
}

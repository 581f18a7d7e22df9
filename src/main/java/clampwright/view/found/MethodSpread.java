package clampwright.view.found;

import clampwright.figure.MethodSpreadFigure;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness;
import clampwright.paint.canvas.FigureCanvas;
import javafx.scene.layout.Region;

/** The load factor by every method as dots on one axis. */
final class MethodSpread extends Region {
  static final double HEIGHT = 66;

  private final FigureCanvas canvas = new FigureCanvas();
  private MemberStiffness members;
  private StiffnessMethod chosen;

  MethodSpread() {
    getStyleClass().add("method-spread");
    setMinHeight(HEIGHT);
    setPrefHeight(HEIGHT);
    getChildren().add(canvas);
  }

  void show(MemberStiffness members, StiffnessMethod chosen) {
    this.members = members;
    this.chosen = chosen;
    requestLayout();
  }

  @Override
  protected void layoutChildren() {
    canvas.resizeRelocate(0, 0, getWidth(), getHeight());
    if (members != null && getWidth() > 0) {
      canvas.setFigure(
          MethodSpreadFigure.of(
              members,
              chosen,
              getWidth() / FigureCanvas.PIXELS_PER_MM,
              getHeight() / FigureCanvas.PIXELS_PER_MM));
    }
  }
}

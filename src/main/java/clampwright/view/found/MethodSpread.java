package clampwright.view.found;

import clampwright.figure.MethodSpreadFigure;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness;
import clampwright.paint.canvas.FigureCanvas;
import javafx.scene.AccessibleRole;
import javafx.scene.layout.Region;

/** The load factor by every method as dots on one axis. */
final class MethodSpread extends Region {
  private static final double HEIGHT = 60;

  private final FigureCanvas canvas = new FigureCanvas();
  private MemberStiffness members;
  private StiffnessMethod chosen;
  private double introduction;
  private double drawnWidth;

  MethodSpread() {
    getStyleClass().add("method-spread");
    setMinHeight(HEIGHT);
    setPrefHeight(HEIGHT);
    setAccessibleRole(AccessibleRole.IMAGE_VIEW);
    setAccessibleText("Load factor by method; the list below has the numbers");
    canvas.setOnPaper(false);
    getChildren().add(canvas);
  }

  void show(MemberStiffness members, StiffnessMethod chosen, double introduction) {
    this.introduction = introduction;
    this.members = members;
    this.chosen = chosen;
    drawnWidth = 0;
    requestLayout();
  }

  @Override
  protected void layoutChildren() {
    canvas.resizeRelocate(0, 0, getWidth(), getHeight());
    if (members != null && getWidth() > 0 && getWidth() != drawnWidth) {
      drawnWidth = getWidth();
      double perMm = FigureCanvas.PIXELS_PER_MM;
      canvas.setFigure(
          MethodSpreadFigure.of(
              members, chosen, introduction, getWidth() / perMm, getHeight() / perMm));
    }
  }
}

package clampwright.view.section;

import clampwright.edit.SketchModel;
import clampwright.figure.Sheet;
import clampwright.joint.Element;
import clampwright.joint.Sketch;
import clampwright.paint.canvas.FigureCanvas;
import java.util.List;
import javafx.geometry.Point2D;
import javafx.scene.Scene;
import javafx.stage.Stage;
import org.testfx.util.WaitForAsyncUtils;

/** A section on a screen of its own, and where on that screen the places of the joint are. */
final class SectionScene {
  static final double WIDTH = 900;
  static final double HEIGHT = 640;

  final SketchModel model;
  final SectionPane pane;

  SectionScene(Stage stage, Sketch sketch) {
    model = new SketchModel(sketch);
    pane = new SectionPane(model);
    stage.setScene(new Scene(pane, WIDTH, HEIGHT));
    // The stage may still have the size that another test gave it.
    stage.sizeToScene();
    stage.show();
  }

  List<Element> elements() {
    return model.sketch().joint().elements();
  }

  Element element(int i) {
    return elements().get(i);
  }

  /** z of an element's upper face. */
  double top(int i) {
    return elements().stream().limit(i).mapToDouble(Element::thickness).sum();
  }

  double middle(int i) {
    return top(i) + element(i).thickness() / 2;
  }

  double bottom(int i) {
    return top(i + 1);
  }

  /** A place of the joint on the screen. */
  Point2D at(double fromAxis, double z) {
    Sheet sheet = sheet();
    return screen(sheet.x(fromAxis), sheet.y(z));
  }

  /** A place of the sheet on the screen. */
  Point2D screen(double x, double y) {
    return pane.localToScreen(x * FigureCanvas.PIXELS_PER_MM, y * FigureCanvas.PIXELS_PER_MM);
  }

  Sheet sheet() {
    WaitForAsyncUtils.waitForFxEvents();
    return pane.viewport().sheet();
  }

  /** So many mm of the joint, in pixels. */
  double pixels(double joint) {
    return joint * sheet().scale() * FigureCanvas.PIXELS_PER_MM;
  }
}

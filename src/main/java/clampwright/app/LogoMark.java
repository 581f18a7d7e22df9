package clampwright.app;

import javafx.scene.Group;
import javafx.scene.shape.Line;
import javafx.scene.shape.Polyline;

/** The program's mark: two clamp faces and the cones between them. */
final class LogoMark extends Group {
  LogoMark() {
    getStyleClass().add("mark");
    Line top = new Line(0, 0, 22, 0);
    Line bottom = new Line(0, 22, 22, 22);
    top.getStyleClass().add("bar");
    bottom.getStyleClass().add("bar");
    Polyline head = new Polyline(7, 2, 1, 11, 7, 20);
    head.getStyleClass().add("head");
    Polyline nut = new Polyline(15, 20, 21, 11, 15, 2);
    nut.getStyleClass().add("nut");
    getChildren().addAll(top, bottom, head, nut);
  }
}

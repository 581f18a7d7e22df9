package clampwright.view.given;

import clampwright.view.field.FieldRow;
import javafx.scene.Node;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Rows of fields, one below the other. */
class Rows extends VBox {
  Rows() {
    getStyleClass().add("rows");
  }

  final FieldRow add(String name, Region field) {
    FieldRow row = new FieldRow(name, field);
    getChildren().add(row);
    return row;
  }

  final void add(Node node) {
    getChildren().add(node);
  }
}

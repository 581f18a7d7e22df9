package clampwright.view.field;

import clampwright.view.MathText;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;

/** A label and its field on one line. */
public final class FieldRow extends HBox {
  public FieldRow(String name, Region field) {
    getStyleClass().add("field-row");
    setAlignment(Pos.CENTER_LEFT);
    Label label = label(name);
    label.getStyleClass().add("field-label");
    label.setMinWidth(0);
    label.setMaxWidth(Double.MAX_VALUE);
    HBox.setHgrow(label, Priority.ALWAYS);
    label.setLabelFor(field instanceof QuantityField quantity ? quantity.text() : field);
    getChildren().addAll(label, field);
  }

  /** A symbol's index is set low: R_m. */
  private static Label label(String name) {
    if (!name.contains("_")) {
      return new Label(name);
    }
    MathText math = new MathText();
    math.show(name);
    Label label = new Label();
    label.setGraphic(math);
    label.setAccessibleText(name);
    return label;
  }
}

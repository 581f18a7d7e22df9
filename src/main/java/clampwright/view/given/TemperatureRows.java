package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.view.field.NameField;
import clampwright.view.field.QuantityField;
import java.util.function.IntConsumer;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;

/** The fields of one temperature case. */
final class TemperatureRows extends Rows {
  private final QuantityField members;
  private final QuantityField bolt;

  /**
   * The fields of the case at an index.
   *
   * @param remove told the index when the case is to go
   */
  TemperatureRows(SketchModel model, int index, IntConsumer remove) {
    NameField name = TemperatureFields.name(model, index);
    name.setId("temperature-name-" + index);
    HBox.setHgrow(name, Priority.ALWAYS);
    Button button = Fields.smallButton("−", "Remove temperature case");
    button.setId("remove-temperature-" + index);
    button.setOnAction(event -> remove.accept(index));
    HBox line = new HBox(name, button);
    line.getStyleClass().addAll("field-with-buttons", "wide-field");
    line.setAlignment(Pos.CENTER_RIGHT);
    add("Case", line);
    members =
        Fields.quantity(model, "temperature-members-" + index, TemperatureFields.members(index));
    add("Members", members);
    bolt = Fields.quantity(model, "temperature-bolt-" + index, TemperatureFields.bolt(index));
    add("Bolt", bolt);
  }

  /** Gives up what is typed, as when the case that it was typed for is gone. */
  void restore() {
    members.restore();
    bolt.restore();
  }
}

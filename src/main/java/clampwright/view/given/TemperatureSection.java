package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.view.OncePerPulse;
import java.util.ArrayList;
import java.util.List;
import javafx.scene.control.Button;

/**
 * The temperatures at assembly and in service. Rows are made when first needed and kept, as their
 * fields follow the model as long as it lives.
 */
final class TemperatureSection extends Rows {
  private final SketchModel model;
  private final Rows cases = new Rows();
  private final List<TemperatureRows> rows = new ArrayList<>();

  TemperatureSection(SketchModel model) {
    this.model = model;
    add(
        "At assembly",
        Fields.quantity(model, "assembly-temperature", TemperatureFields.assembly()));
    Button add = Fields.smallButton("Add temperature case", "Add temperature case");
    add.getStyleClass().add("worded");
    add.setId("add-temperature-case");
    add.setOnAction(event -> model.change("Add temperature case", TemperatureFields::added));
    add(cases);
    add(add);
    OncePerPulse.keep(this, this::follow, model.sketchProperty());
  }

  private void follow() {
    int count = TemperatureFields.service(model.sketch()).temperatures().size();
    while (rows.size() < count) {
      TemperatureRows more = new TemperatureRows(model, rows.size(), this::remove);
      rows.add(more);
      cases.add(more);
    }
    for (int i = 0; i < rows.size(); i++) {
      Section.setShown(rows.get(i), i < count);
    }
    Section.setShown(cases, count > 0);
  }

  private void remove(int index) {
    model.change("Remove temperature case", sketch -> TemperatureFields.removed(sketch, index));
    rows.forEach(TemperatureRows::restore);
  }
}

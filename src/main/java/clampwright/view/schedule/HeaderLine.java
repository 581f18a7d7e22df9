package clampwright.view.schedule;

import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import javafx.scene.control.Label;

/** The titles of the columns, with their units. */
final class HeaderLine extends Line {
  private UnitSystem shown;

  HeaderLine() {
    super(24);
    getStyleClass().add("schedule-header");
    for (Column column : Column.values()) {
      set(column, new Label(column.title()));
    }
  }

  void show(UnitSystem units) {
    if (units != shown) {
      shown = units;
      unit(Column.THICKNESS, Dimension.LENGTH);
      unit(Column.AREA, Dimension.AREA);
      unit(Column.STIFFNESS, Dimension.STIFFNESS);
    }
  }

  private void unit(Column column, Dimension dimension) {
    ((Label) get(column)).setText(column.title() + " " + Quantities.unit(dimension, shown));
  }
}

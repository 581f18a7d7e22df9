package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.quantity.UnitSystem;

/** Switches the units in which a sketch is shown. */
final class Units {
  private Units() {}

  static void show(SketchModel model, UnitSystem units) {
    String name = units == UnitSystem.METRIC ? "Show mm and N" : "Show in and lbf";
    model.change(name, sketch -> sketch.withUnits(units));
  }

  static void toggle(SketchModel model) {
    boolean metric = model.sketch().units() == UnitSystem.METRIC;
    show(model, metric ? UnitSystem.INCH : UnitSystem.METRIC);
  }
}

package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.Introduction;
import clampwright.joint.LoadCase;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.view.field.SketchNumber;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;

/** The outside load on one bolt, one load case at a time. */
final class LoadSection extends Section {
  LoadSection(SketchModel model) {
    super("Load per bolt");
    add("Axial", Fields.quantity(model, "axial-load", axial(model)));
    add("Enters at n", Fields.quantity(model, "introduction", introduction(model)));
  }

  static LoadCase load(SketchModel model, Sketch sketch) {
    return sketch.joint().service().loads().get(model.loadCase());
  }

  static Sketch withLoad(SketchModel model, Sketch sketch, UnaryOperator<LoadCase> change) {
    int shown = model.loadCase();
    return sketch.withJoint(joint -> joint.withService(joint.service().withLoad(shown, change)));
  }

  /** The greatest axial load; a steady load stays steady, and the least never gets above it. */
  static SketchNumber axial(SketchModel model) {
    return SketchNumber.required(
        "Axial load",
        Dimension.FORCE,
        sketch -> load(model, sketch).axialMax(),
        (sketch, value) ->
            withLoad(
                model,
                sketch,
                load -> {
                  boolean steady = load.axialMin() == load.axialMax();
                  return load.withAxial(steady ? value : Math.min(load.axialMin(), value), value);
                }));
  }

  static SketchNumber introduction(SketchModel model) {
    return SketchNumber.sometimes(
        "Load-introduction factor",
        Dimension.RATIO,
        sketch ->
            load(model, sketch).introduction() instanceof Introduction.Factor typed
                ? OptionalDouble.of(typed.factor())
                : OptionalDouble.empty(),
        (sketch, value) ->
            withLoad(model, sketch, load -> load.withIntroduction(new Introduction.Factor(value))));
  }
}

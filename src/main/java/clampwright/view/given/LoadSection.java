package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.quantity.Dimension;
import clampwright.view.field.SketchNumber;

/** The outside load on one bolt. */
final class LoadSection extends Section {
  LoadSection(SketchModel model) {
    super("Load per bolt");
    add("Axial", Fields.quantity(model, "axial-load", axial()));
    add("Enters at n", Fields.quantity(model, "introduction", introduction()));
  }

  static SketchNumber axial() {
    return SketchNumber.required(
        "Axial load",
        Dimension.FORCE,
        sketch -> sketch.joint().load().axial(),
        (sketch, value) ->
            sketch.withJoint(joint -> joint.withLoad(joint.load().withAxial(value))));
  }

  static SketchNumber introduction() {
    return SketchNumber.required(
        "Load-introduction factor",
        Dimension.RATIO,
        sketch -> sketch.joint().load().introduction(),
        (sketch, value) ->
            sketch.withJoint(joint -> joint.withLoad(joint.load().withIntroduction(value))));
  }
}

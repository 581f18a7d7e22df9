package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.Preload;
import clampwright.quantity.Dimension;
import clampwright.view.field.SketchNumber;

/** How tight the bolt is. */
final class TighteningSection extends Section {
  TighteningSection(SketchModel model) {
    super("Tightening");
    add("Preload", Fields.quantity(model, "preload", preload()));
  }

  private static SketchNumber preload() {
    return SketchNumber.required(
        "Preload",
        Dimension.FORCE,
        sketch -> sketch.joint().preload().force(),
        (sketch, value) -> sketch.withJoint(joint -> joint.withPreload(new Preload(value))));
  }
}

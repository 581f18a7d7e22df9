package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.Target;
import clampwright.mechanics.AssemblyPreload;
import clampwright.quantity.Dimension;
import clampwright.view.field.SketchNumber;

/** How tight the bolt is. */
final class TighteningSection extends Section {
  TighteningSection(SketchModel model) {
    super("Tightening");
    add("Preload", Fields.quantity(model, "preload", preload()));
  }

  static SketchNumber preload() {
    return SketchNumber.required(
        "Preload",
        Dimension.FORCE,
        sketch ->
            AssemblyPreload.of(sketch.joint(), sketch.joint().tightening().target()).orElse(0),
        (sketch, value) ->
            sketch.withJoint(
                joint ->
                    joint.withTightening(joint.tightening().withTarget(new Target.Force(value)))));
  }
}

package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.view.Hover;
import clampwright.view.OncePerPulse;
import clampwright.view.field.FieldRow;
import clampwright.view.field.QuantityField;
import java.util.OptionalDouble;
import javafx.scene.control.Label;

/** How tight the bolt is, how far that strays, and what is lost of it. */
final class TighteningSection extends Section {
  private static final String TORSION =
      "Friction in the thread, for the bolt's torsion at assembly; without it torsion is not"
          + " counted.";

  private final SketchModel model;
  private final FieldRow preload;
  private final FieldRow share;
  private final FieldRow torque;
  private final FieldRow nutFactor;
  private final FieldRow threadFriction;
  private final FieldRow faceFriction;
  private final Label otherwise = Fields.hint("preload-otherwise");
  private final FieldRow torsionFriction;
  private final QuantityField embedment;
  private final FieldRow sheared;

  TighteningSection(SketchModel model) {
    super("Tightening");
    this.model = model;
    add("Given as", Fields.choice(model, "target-kind", TargetFields.kind()));
    preload = add("Preload", Fields.quantity(model, "preload", TargetFields.preload()));
    share = add("Share of proof", Fields.quantity(model, "proof-share", TargetFields.proofShare()));
    torque = add("Torque", Fields.quantity(model, "torque", TargetFields.torque()));
    nutFactor = add("K", Fields.quantity(model, "nut-factor", TargetFields.nutFactor()));
    threadFriction =
        add("µ thread", Fields.quantity(model, "thread-friction", TargetFields.threadFriction()));
    faceFriction =
        add("µ under head", Fields.quantity(model, "face-friction", TargetFields.faceFriction()));
    add(otherwise);
    QuantityField scatter = Fields.quantity(model, "scatter", ScatterFields.share());
    add("Scatter", ScatterFields.method(model, scatter));
    add("Scatter ±", scatter);
    add("or α_A", Fields.quantity(model, "tightening-factor", ScatterFields.factor()));
    torsionFriction =
        add(
            "µ for torsion",
            Fields.optional(
                model, "torsion-friction", TargetFields.torsionFriction(), "not given"));
    Hover.tell(torsionFriction, () -> TORSION);
    embedment = Fields.quantity(model, "embedment", LossFields.amount());
    Rows losses = new Rows();
    losses.add("Embedment", LossFields.kind(model, embedment));
    sheared =
        losses.add("Faces carry", Fields.choice(model, "embedment-load", LossFields.sheared()));
    losses.add("f_Z", embedment);
    losses.add("Relaxation", Fields.quantity(model, "relaxation", LossFields.relaxation()));
    losses.add("Creep", Fields.quantity(model, "creep", LossFields.creep()));
    fold("losses", losses);
    OncePerPulse.keep(this, this::follow, model.sketchProperty(), model.assessmentProperty());
  }

  private void follow() {
    Sketch sketch = model.sketch();
    boolean byNutFactor = TargetFields.is(sketch, Target.NutFactorTorque.class);
    boolean byFriction = TargetFields.is(sketch, Target.FrictionTorque.class);
    setShown(preload, TargetFields.is(sketch, Target.Force.class));
    setShown(share, TargetFields.is(sketch, Target.ProofFraction.class));
    setShown(torque, byNutFactor || byFriction);
    setShown(nutFactor, byNutFactor);
    setShown(threadFriction, byFriction);
    setShown(faceFriction, byFriction);
    setShown(torsionFriction, !byFriction);
    otherwise.setText(PreloadForms.text(sketch));
    boolean rough = LossFields.isFromRoughness(sketch);
    setShown(sheared, rough);
    embedment.setAutomatic(rough ? LossFields.assessed(model.assessment()) : OptionalDouble.of(0));
  }
}

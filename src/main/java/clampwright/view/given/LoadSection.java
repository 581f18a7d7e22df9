package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.Introduction;
import clampwright.joint.LoadCase;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.view.OncePerPulse;
import clampwright.view.field.FieldRow;
import clampwright.view.field.SketchNumber;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import javafx.scene.control.Label;

/** The outside load on one bolt, one load case at a time, and the temperatures of service. */
final class LoadSection extends Section {
  private final SketchModel model;
  private final FieldRow factor;
  private final FieldRow upper;
  private final FieldRow lower;
  private final Label found = Fields.hint("introduction-found");
  private final FieldRow temperature;

  LoadSection(SketchModel model) {
    super("Load per bolt");
    this.model = model;
    add("Case", new LoadCases(model));
    add("Name", LoadFields.name(model));
    add("Axial, most", LoadFields.quantity(model, "axial-load", axial(model)));
    add("Axial, least", LoadFields.quantity(model, "axial-least", LoadFields.axialLeast(model)));
    add("Shear", LoadFields.quantity(model, "shear-load", LoadFields.shear(model)));
    add("Enters at", LoadFields.wideChoice(model, "load-enters", IntroductionFields.kind(model)));
    factor = add("n", LoadFields.quantity(model, "introduction", introduction(model)));
    upper = add("Enters", LoadFields.wideChoice(model, "load-in", IntroductionFields.upper(model)));
    lower =
        add("Leaves", LoadFields.wideChoice(model, "load-out", IntroductionFields.lower(model)));
    add(found);
    add("µ between parts", LoadFields.quantity(model, "slip-friction", LoadFields.friction(model)));
    add("Slip faces", LoadFields.quantity(model, "slip-faces", LoadFields.slipFaces(model)));
    temperature =
        add(
            "Temperature",
            LoadFields.choice(model, "load-temperature", LoadFields.temperature(model)));
    fold("temperatures", new TemperatureSection(model));
    OncePerPulse.keep(
        this,
        this::follow,
        model.sketchProperty(),
        model.assessmentProperty(),
        model.shownCaseProperty());
  }

  private void follow() {
    Sketch sketch = model.sketch();
    boolean atParts = IntroductionFields.isAtParts(model, sketch);
    OptionalDouble n = IntroductionFields.inForce(model);
    setShown(factor, !atParts);
    setShown(upper, atParts);
    setShown(lower, atParts);
    setShown(found, atParts && n.isPresent());
    n.ifPresent(
        value -> found.setText("n = " + Quantities.number(Dimension.RATIO, sketch.units(), value)));
    boolean named = !load(model, sketch).temperature().equals(Optional.empty());
    setShown(temperature, named || !sketch.joint().service().temperatures().isEmpty());
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
        (sketch, value) -> withLoad(model, sketch, load -> load.withGreatest(value)));
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

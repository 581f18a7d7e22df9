package clampwright.view.given;

import static clampwright.view.given.LoadSection.load;
import static clampwright.view.given.LoadSection.withLoad;

import clampwright.edit.SketchModel;
import clampwright.joint.LoadCase;
import clampwright.joint.Sketch;
import clampwright.joint.TemperatureCase;
import clampwright.quantity.Dimension;
import clampwright.view.field.Choice;
import clampwright.view.field.ChoiceField;
import clampwright.view.field.NameField;
import clampwright.view.field.QuantityField;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.ToDoubleFunction;

/** Fields of the load case that is shown; they follow when another one is. */
final class LoadFields {
  private LoadFields() {}

  /** A field of the shown load case. What is typed belongs to the case it was typed for. */
  static QuantityField quantity(SketchModel model, String id, SketchNumber number) {
    QuantityField field = Fields.quantity(model, id, number);
    model
        .shownCaseProperty()
        .addListener(
            observable -> {
              field.refresh();
              field.restore();
            });
    return field;
  }

  static <T> ChoiceField<T> choice(SketchModel model, String id, SketchChoice<T> choice) {
    ChoiceField<T> field = Fields.choice(model, id, choice);
    model.shownCaseProperty().addListener(observable -> field.refresh());
    return field;
  }

  static <T> ChoiceField<T> wideChoice(SketchModel model, String id, SketchChoice<T> choice) {
    ChoiceField<T> field = choice(model, id, choice);
    field.getStyleClass().add("wide-field");
    return field;
  }

  static NameField name(SketchModel model) {
    NameField field =
        new NameField(
            model,
            "Load case name",
            sketch -> Optional.of(load(model, sketch).name()),
            (sketch, name) -> withLoad(model, sketch, load -> load.withName(name)));
    field.setId("load-case-name");
    field.getStyleClass().add("wide-field");
    model.shownCaseProperty().addListener(observable -> field.refresh());
    return field;
  }

  /** The least axial load, which is not above the greatest. */
  static SketchNumber axialLeast(SketchModel model) {
    return of(
        model,
        "Least axial load",
        Dimension.FORCE,
        LoadCase::axialMin,
        (load, value) -> load.withAxial(value, load.axialMax()));
  }

  static SketchNumber shear(SketchModel model) {
    return of(model, "Shear load", Dimension.FORCE, LoadCase::shear, LoadCase::withShear);
  }

  static SketchNumber friction(SketchModel model) {
    return of(
        model,
        "Friction between the parts",
        Dimension.RATIO,
        LoadCase::friction,
        LoadCase::withFriction);
  }

  static SketchNumber slipFaces(SketchModel model) {
    return of(
        model,
        "Slip faces",
        Dimension.COUNT,
        LoadCase::slipFaces,
        (load, value) -> load.withSlipFaces(whole("number of slip faces", value)));
  }

  private static int whole(String what, double value) {
    if (value != Math.rint(value)) {
      throw new IllegalArgumentException(what + " must be a whole number");
    }
    if (value > Integer.MAX_VALUE) {
      throw new IllegalArgumentException(what + " must be smaller");
    }
    return (int) value;
  }

  private static SketchNumber of(
      SketchModel model,
      String name,
      Dimension dimension,
      ToDoubleFunction<LoadCase> read,
      BiFunction<LoadCase, Double, LoadCase> write) {
    return SketchNumber.required(
        name,
        dimension,
        sketch -> read.applyAsDouble(load(model, sketch)),
        (sketch, value) -> withLoad(model, sketch, load -> write.apply(load, value)));
  }

  /** The temperature case that the load goes with; empty = any of them. */
  static SketchChoice<Optional<String>> temperature(SketchModel model) {
    return new SketchChoice<>(
        "Temperature of the load case",
        sketch -> Optional.of(load(model, sketch).temperature()),
        (sketch, name) -> withLoad(model, sketch, load -> load.withTemperature(name)),
        name -> name.map(LoadFields::named).orElse("any"),
        LoadFields::temperatures,
        (sketch, name) -> "");
  }

  private static List<Choice<Optional<String>>> temperatures(Sketch sketch) {
    List<Choice<Optional<String>>> choices = new ArrayList<>();
    choices.add(new Choice<>("any", "", Optional.empty(), "the worst of them, and as assembled"));
    for (TemperatureCase state : sketch.joint().service().temperatures()) {
      choices.add(Choice.of(named(state.name()), Optional.of(state.name())));
    }
    return choices;
  }

  /** A name as shown where it may be empty. */
  static String named(String name) {
    return name.isBlank() ? "(no name)" : name;
  }
}

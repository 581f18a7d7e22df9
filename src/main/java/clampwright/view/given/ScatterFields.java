package clampwright.view.given;

import static clampwright.view.given.Fields.tightening;
import static clampwright.view.given.Fields.withTightening;

import clampwright.edit.SketchModel;
import clampwright.joint.Scatter;
import clampwright.quantity.Dimension;
import clampwright.view.field.Choice;
import clampwright.view.field.ChoiceField;
import clampwright.view.field.QuantityField;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** How far the preload strays: by the way of tightening, as a share, or as α_A. */
final class ScatterFields {
  private ScatterFields() {}

  /**
   * The choice of a way of tightening; "typed" goes to the field for the share.
   *
   * @param typed where a share is typed
   */
  static ChoiceField<ScatterMethod> method(SketchModel model, QuantityField typed) {
    SketchChoice<ScatterMethod> choice = choice();
    ChoiceField<ScatterMethod> field =
        new ChoiceField<>(
            model,
            choice,
            method -> {
              if (method == ScatterMethod.TYPED) {
                typed.text().requestFocus();
                typed.text().selectAll();
              } else {
                model.change(choice.name(), sketch -> choice.write().apply(sketch, method));
              }
            });
    field.setId("scatter-method");
    field.getStyleClass().add("wide-field");
    return field;
  }

  private static SketchChoice<ScatterMethod> choice() {
    List<Choice<ScatterMethod>> choices =
        Arrays.stream(ScatterMethod.values())
            .map(method -> new Choice<>(method.listed(), "", method, method.origin()))
            .toList();
    return new SketchChoice<>(
        "Scatter",
        sketch -> Optional.of(ScatterMethod.of(tightening(sketch).scatter())),
        (sketch, method) -> withTightening(sketch, it -> it.withScatter(method.scatter())),
        ScatterMethod::label,
        sketch -> choices,
        (sketch, method) -> method.origin());
  }

  static SketchNumber share() {
    return SketchNumber.required(
        "Scatter",
        Dimension.SHARE,
        sketch -> tightening(sketch).scatter().share(),
        (sketch, value) ->
            withTightening(sketch, it -> it.withScatter(new Scatter.PlusMinus(value))));
  }

  /** Greatest over least preload, α_A; typed, the scatter is kept as such a factor. */
  static SketchNumber factor() {
    return SketchNumber.required(
        "Tightening factor",
        Dimension.RATIO,
        sketch -> factor(tightening(sketch).scatter()),
        (sketch, value) ->
            withTightening(sketch, it -> it.withScatter(new Scatter.TighteningFactor(value))));
  }

  private static double factor(Scatter scatter) {
    return scatter instanceof Scatter.TighteningFactor typed
        ? typed.factor()
        : (1 + scatter.share()) / (1 - scatter.share());
  }
}

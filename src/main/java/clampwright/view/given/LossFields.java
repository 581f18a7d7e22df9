package clampwright.view.given;

import static clampwright.view.given.Fields.tightening;
import static clampwright.view.given.Fields.withTightening;

import clampwright.edit.SketchModel;
import clampwright.joint.Embedment;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.quantity.Dimension;
import clampwright.view.field.Choice;
import clampwright.view.field.ChoiceField;
import clampwright.view.field.QuantityField;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What is lost of the preload after tightening. */
final class LossFields {
  private LossFields() {}

  /**
   * The choice where settling comes from; "typed" goes to the field for the amount, which starts
   * with the one in force.
   *
   * @param amount where an amount is typed
   */
  static ChoiceField<EmbedmentKind> kind(SketchModel model, QuantityField amount) {
    SketchChoice<EmbedmentKind> choice = choice();
    ChoiceField<EmbedmentKind> field =
        new ChoiceField<>(
            model,
            choice,
            kind -> {
              model.change(choice.name(), sketch -> chosen(model, sketch, kind));
              if (kind == EmbedmentKind.TYPED) {
                amount.text().requestFocus();
                amount.text().selectAll();
              }
            });
    field.setId("embedment-kind");
    return field;
  }

  private static Sketch chosen(SketchModel model, Sketch sketch, EmbedmentKind kind) {
    Embedment embedment = tightening(sketch).embedment();
    if (kind == EmbedmentKind.of(embedment)) {
      return sketch;
    }
    Embedment chosen =
        kind == EmbedmentKind.TYPED
            ? new Embedment.Typed(assessed(model.assessment()).orElse(0))
            : kind.in(embedment);
    return withTightening(sketch, it -> it.withEmbedment(chosen));
  }

  /** Settling in force [mm], without the dust of sums; empty while the joint is not solved. */
  static OptionalDouble assessed(Assessment assessment) {
    return assessment instanceof Assessment.Solved solved
        ? OptionalDouble.of(Math.round(solved.preload().embedment() * 1e9) / 1e9)
        : OptionalDouble.empty();
  }

  private static SketchChoice<EmbedmentKind> choice() {
    List<Choice<EmbedmentKind>> choices =
        Arrays.stream(EmbedmentKind.values())
            .map(kind -> new Choice<>(kind.label(), "", kind, kind.origin()))
            .toList();
    return new SketchChoice<>(
        "Embedment",
        sketch -> Optional.of(EmbedmentKind.of(tightening(sketch).embedment())),
        (sketch, kind) -> withTightening(sketch, it -> it.withEmbedment(kind.in(it.embedment()))),
        EmbedmentKind::label,
        sketch -> choices,
        (sketch, kind) -> kind.origin());
  }

  static boolean isFromRoughness(Sketch sketch) {
    return tightening(sketch).embedment() instanceof Embedment.FromRoughness;
  }

  /** Whether the rough faces carry shear. */
  static SketchChoice<Boolean> sheared() {
    return SketchChoice.among(
        "Load on the faces",
        sketch ->
            tightening(sketch).embedment() instanceof Embedment.FromRoughness rough
                ? Optional.of(rough.sheared())
                : Optional.empty(),
        (sketch, sheared) ->
            tightening(sketch).embedment() instanceof Embedment.FromRoughness rough
                ? withTightening(
                    sketch,
                    it -> it.withEmbedment(new Embedment.FromRoughness(rough.roughness(), sheared)))
                : sketch,
        sheared -> sheared ? "shear" : "axial",
        List.of(false, true));
  }

  /** f_Z; empty = from the roughness, or none. */
  static SketchNumber amount() {
    return SketchNumber.optional(
        "Embedment",
        Dimension.SETTLING,
        sketch ->
            tightening(sketch).embedment() instanceof Embedment.Typed typed && typed.amount() > 0
                ? OptionalDouble.of(typed.amount())
                : OptionalDouble.empty(),
        (sketch, value) ->
            value.isEmpty() && isFromRoughness(sketch)
                ? sketch
                : withTightening(
                    sketch, it -> it.withEmbedment(new Embedment.Typed(value.orElse(0)))));
  }

  static SketchNumber relaxation() {
    return SketchNumber.required(
        "Relaxation",
        Dimension.SHARE,
        sketch -> tightening(sketch).relaxation(),
        (sketch, value) -> withTightening(sketch, it -> it.withRelaxation(value)));
  }

  static SketchNumber creep() {
    return SketchNumber.required(
        "Creep",
        Dimension.SHARE,
        sketch -> tightening(sketch).creep(),
        (sketch, value) -> withTightening(sketch, it -> it.withCreep(value)));
  }
}

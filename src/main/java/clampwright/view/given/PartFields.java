package clampwright.view.given;

import clampwright.edit.OutlineKind;
import clampwright.edit.SketchModel;
import clampwright.edit.Stacking;
import clampwright.joint.Element;
import clampwright.joint.Material;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.view.field.ChoiceField;
import clampwright.view.field.NameField;
import clampwright.view.field.QuantityField;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.Supplier;
import java.util.function.ToDoubleFunction;
import java.util.function.UnaryOperator;

/**
 * Fields for one element of the stack: the given pane's for the selected part, the schedule's for
 * the element of a row.
 */
public final class PartFields {
  private final SketchModel model;
  private final Supplier<Part> part;

  /**
   * Fields for whatever part the supplier names at the time; empty while that is no element.
   *
   * @param part asked for at each reading and writing
   */
  public PartFields(SketchModel model, Supplier<Part> part) {
    this.model = model;
    this.part = part;
  }

  public NameField name() {
    return new NameField(
        model,
        "Name",
        sketch -> element(sketch).map(Element::name),
        (sketch, name) -> with(sketch, element -> element.withName(name)));
  }

  public ChoiceField<Material> material() {
    return new ChoiceField<>(
        model,
        new SketchChoice<>(
            "Material",
            sketch -> element(sketch).map(Element::material),
            (sketch, material) -> with(sketch, element -> element.withMaterial(material)),
            Material::name,
            sketch -> Fields.materials(),
            Fields::origin));
  }

  public QuantityField thickness() {
    return length("Thickness", Element::thickness, Element::withThickness);
  }

  /** A typed modulus makes the material one of the sketch's own. */
  QuantityField modulus() {
    return number(
        "Modulus",
        Dimension.MODULUS,
        element -> element.material().modulus(),
        (element, value) -> element.withMaterial(OwnMaterial.of(element.material(), value)));
  }

  /** R_m of the material. */
  QuantityField tensile() {
    return strength("Tensile strength", Material::tensile, Material::withTensile);
  }

  /** The pressure under a clamp face that the material bears. */
  QuantityField pressureLimit() {
    return strength("Pressure limit", Material::pressureLimit, Material::withPressureLimit);
  }

  private QuantityField strength(
      String name,
      Function<Material, OptionalDouble> read,
      BiFunction<Material, OptionalDouble, Material> write) {
    QuantityField field =
        new QuantityField(
            model,
            SketchNumber.optional(
                name,
                Dimension.STRESS,
                sketch ->
                    element(sketch)
                        .map(element -> read.apply(element.material()))
                        .orElse(OptionalDouble.empty()),
                (sketch, value) ->
                    with(
                        sketch,
                        element -> element.withMaterial(write.apply(element.material(), value)))));
    field.setOpen("not given");
    return field;
  }

  public QuantityField hole() {
    return length("Hole diameter", Element::hole, Element::withHole);
  }

  QuantityField diameter() {
    return outline(
        "Outside diameter",
        Outline.Round.class,
        Outline.Round::diameter,
        (round, value) -> new Outline.Round(value));
  }

  QuantityField leftEdge() {
    return outline(
        "Edge distance, left",
        Outline.Strip.class,
        Outline.Strip::left,
        (strip, value) -> new Outline.Strip(value, strip.right()));
  }

  QuantityField rightEdge() {
    return outline(
        "Edge distance, right",
        Outline.Strip.class,
        Outline.Strip::right,
        (strip, value) -> new Outline.Strip(strip.left(), value));
  }

  ChoiceField<OutlineKind> outlineKind() {
    return new ChoiceField<>(
        model,
        SketchChoice.among(
            "Outline",
            sketch -> element(sketch).map(Element::outline).map(OutlineKind::of),
            (sketch, kind) ->
                element(sketch).isPresent()
                    ? Stacking.outlined(sketch, part.get().index(), kind).sketch()
                    : sketch,
            PartFields::word,
            List.of(OutlineKind.values())));
  }

  private static String word(OutlineKind kind) {
    return switch (kind) {
      case WIDE -> "wide";
      case ROUND -> "round";
      case STRIP -> "straight edges";
    };
  }

  Optional<Element> element(Sketch sketch) {
    Part part = this.part.get();
    return part.isElement() && part.index() < sketch.joint().elements().size()
        ? Optional.of(sketch.joint().elements().get(part.index()))
        : Optional.empty();
  }

  private Sketch with(Sketch sketch, UnaryOperator<Element> change) {
    return element(sketch)
        .map(
            element ->
                sketch.withJoint(
                    joint -> joint.withElement(part.get().index(), change.apply(element))))
        .orElse(sketch);
  }

  private QuantityField length(
      String name, ToDoubleFunction<Element> read, BiFunction<Element, Double, Element> write) {
    return number(name, Dimension.LENGTH, read, write);
  }

  private QuantityField number(
      String name,
      Dimension dimension,
      ToDoubleFunction<Element> read,
      BiFunction<Element, Double, Element> write) {
    return new QuantityField(
        model,
        SketchNumber.sometimes(
            name,
            dimension,
            sketch ->
                element(sketch)
                    .map(element -> OptionalDouble.of(read.applyAsDouble(element)))
                    .orElse(OptionalDouble.empty()),
            (sketch, value) -> with(sketch, element -> write.apply(element, value))));
  }

  private <O extends Outline> QuantityField outline(
      String name, Class<O> kind, ToDoubleFunction<O> read, BiFunction<O, Double, Outline> write) {
    Function<Sketch, Optional<O>> outline =
        sketch -> element(sketch).map(Element::outline).filter(kind::isInstance).map(kind::cast);
    return new QuantityField(
        model,
        SketchNumber.sometimes(
            name,
            Dimension.LENGTH,
            sketch ->
                outline
                    .apply(sketch)
                    .map(is -> OptionalDouble.of(read.applyAsDouble(is)))
                    .orElse(OptionalDouble.empty()),
            (sketch, value) ->
                outline
                    .apply(sketch)
                    .map(is -> with(sketch, it -> it.withOutline(write.apply(is, value))))
                    .orElse(sketch)));
  }
}

package clampwright.view.given;

import static clampwright.view.given.Fields.fastener;
import static clampwright.view.given.Fields.withFastener;

import clampwright.catalog.Catalogue;
import clampwright.edit.SketchModel;
import clampwright.edit.ThreadChange;
import clampwright.joint.Anchor;
import clampwright.joint.Head;
import clampwright.joint.Material;
import clampwright.joint.ScrewThread;
import clampwright.joint.Sketch;
import clampwright.joint.Strength;
import clampwright.mechanics.Assessment;
import clampwright.quantity.Dimension;
import clampwright.view.Hover;
import clampwright.view.OncePerPulse;
import clampwright.view.field.Choice;
import clampwright.view.field.FieldRow;
import clampwright.view.field.QuantityField;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** The bolt and what it is screwed into. */
final class FastenerSection extends Section {
  private static final String OWN = "own size";

  private final QuantityField length;
  private final QuantityField shankLength;
  private final QuantityField shankDiameter;
  private final FieldRow nutFace;

  FastenerSection(SketchModel model) {
    super("Fastener");
    add("Thread", Fields.choice(model, "thread", thread()));
    add("Head", Fields.choice(model, "head", head()));
    add("Strength class", Fields.choice(model, "strength", strength()));
    length = Fields.quantity(model, "bolt-length", length());
    add("Length", length);
    shankLength = Fields.quantity(model, "shank-length", shankLength());
    add("Shank", shankLength);
    add("Screwed into", Fields.choice(model, "anchor", anchor()));
    shankDiameter = Fields.quantity(model, "shank-diameter", shankDiameter());
    FieldRow headFace = add("Head face Ø", Fields.quantity(model, "head-face", headFace()));
    Hover.tell(headFace, () -> origin(model.sketch(), fastener(model.sketch()).head()));
    nutFace = add("Nut face Ø", Fields.quantity(model, "nut-face", nutFace()));
    Hover.tell(nutFace, () -> origin(model.sketch(), fastener(model.sketch()).anchor()));
    FieldRow shank = add("Shank Ø", shankDiameter);
    FieldRow bore = add("Bore Ø", Fields.quantity(model, "bore", bore()));
    FieldRow material = add("Material", Fields.choice(model, "bolt-material", material()));
    FieldRow modulus = add("Modulus E", Fields.quantity(model, "bolt-modulus", modulus()));
    fold("faces, bore, material", headFace, nutFace, shank, bore, material, modulus);
    OncePerPulse.keep(
        this,
        () -> {
          follow(model.sketch());
          follow(model.assessment());
        },
        model.sketchProperty(),
        model.assessmentProperty());
  }

  private void follow(Sketch sketch) {
    boolean tapped = fastener(sketch).isTapped();
    nutFace.setDisable(tapped);
    shankDiameter.setAutomatic(OptionalDouble.of(fastener(sketch).thread().diameter()));
  }

  private void follow(Assessment assessment) {
    if (assessment instanceof Assessment.Solved solved) {
      length.setAutomatic(OptionalDouble.of(solved.bolt().length()));
      shankLength.setAutomatic(OptionalDouble.of(solved.bolt().shankLength()));
    } else {
      length.setAutomatic(OptionalDouble.empty());
      shankLength.setAutomatic(OptionalDouble.empty());
    }
  }

  static SketchChoice<ScrewThread> thread() {
    return new SketchChoice<>(
        "Thread",
        sketch -> Optional.of(fastener(sketch).thread()),
        (sketch, thread) -> sketch.withJoint(joint -> ThreadChange.of(joint, thread)),
        thread -> thread.designation().replace("x", " × "),
        sketch ->
            Fields.choices(
                Catalogue.standard().threads().stream()
                    .filter(entry -> !Catalogue.standard().heads(entry.value()).isEmpty())
                    .toList(),
                entry -> entry.group()),
        Fields::origin);
  }

  static SketchChoice<Head> head() {
    return new SketchChoice<>(
        "Head",
        sketch -> Optional.of(fastener(sketch).head()),
        (sketch, head) -> withFastener(sketch, bolt -> bolt.withHead(head)),
        head -> style(head.style()) + (head.standard().equals(OWN) ? ", own" : ""),
        sketch ->
            Fields.choices(
                Catalogue.standard().heads(fastener(sketch).thread()),
                entry -> style(entry.value().style())),
        FastenerSection::origin);
  }

  private static String origin(Sketch sketch, Head head) {
    return head.standard() + "\n" + Fields.origin(sketch, head);
  }

  private static String origin(Sketch sketch, Anchor anchor) {
    return anchor instanceof Anchor.Nut nut
        ? nut.standard() + "\n" + Fields.origin(sketch, nut)
        : "";
  }

  private static String style(Head.Style style) {
    return switch (style) {
      case HEXAGON -> "hexagon";
      case SOCKET -> "socket";
      case FLANGE -> "flange";
    };
  }

  static SketchChoice<Strength> strength() {
    return new SketchChoice<>(
        "Strength class",
        sketch -> Optional.of(fastener(sketch).strength()),
        (sketch, strength) -> withFastener(sketch, bolt -> bolt.withStrength(strength)),
        Strength::grade,
        sketch ->
            Fields.choices(
                Catalogue.standard().strengths(fastener(sketch).thread()), entry -> entry.group()),
        Fields::origin);
  }

  private static SketchChoice<Material> material() {
    return new SketchChoice<>(
        "Bolt material",
        sketch -> Optional.of(fastener(sketch).material()),
        (sketch, material) -> withFastener(sketch, bolt -> bolt.withMaterial(material)),
        Material::name,
        sketch -> Fields.materials(),
        Fields::origin);
  }

  static SketchChoice<Anchor> anchor() {
    return new SketchChoice<>(
        "Screwed into",
        sketch -> Optional.of(fastener(sketch).anchor()),
        (sketch, anchor) -> withFastener(sketch, bolt -> bolt.withAnchor(anchor)),
        anchor ->
            anchor instanceof Anchor.Nut nut
                ? "nut" + (nut.standard().equals(OWN) ? ", own" : "")
                : "tapped hole",
        FastenerSection::anchors,
        FastenerSection::origin);
  }

  private static List<Choice<Anchor>> anchors(Sketch sketch) {
    List<Choice<Anchor>> anchors = new ArrayList<>();
    anchors.addAll(
        Fields.<Anchor, Anchor.Nut>choices(
            Catalogue.standard().nuts(fastener(sketch).thread()), entry -> "nut"));
    anchors.add(new Choice<>("thread in the last layer", "tapped hole", new Anchor.Tapped(), ""));
    return anchors;
  }

  static SketchNumber length() {
    return SketchNumber.optional(
        "Bolt length",
        Dimension.LENGTH,
        sketch -> fastener(sketch).length(),
        (sketch, value) -> withFastener(sketch, bolt -> bolt.withLength(value)));
  }

  static SketchNumber shankLength() {
    return SketchNumber.optional(
        "Shank length",
        Dimension.LENGTH,
        sketch -> fastener(sketch).shankLength(),
        (sketch, value) -> withFastener(sketch, bolt -> bolt.withShankLength(value)));
  }

  private static SketchNumber shankDiameter() {
    return SketchNumber.optional(
        "Shank diameter",
        Dimension.LENGTH,
        sketch -> fastener(sketch).shankDiameter(),
        (sketch, value) -> withFastener(sketch, bolt -> bolt.withShankDiameter(value)));
  }

  private static SketchNumber bore() {
    return SketchNumber.required(
        "Bore",
        Dimension.LENGTH,
        sketch -> fastener(sketch).bore(),
        (sketch, value) -> withFastener(sketch, bolt -> bolt.withBore(value)));
  }

  private static SketchNumber modulus() {
    return SketchNumber.required(
        "Bolt modulus",
        Dimension.MODULUS,
        sketch -> fastener(sketch).material().modulus(),
        (sketch, value) ->
            withFastener(
                sketch, bolt -> bolt.withMaterial(OwnMaterial.of(bolt.material(), value))));
  }

  static SketchNumber headFace() {
    return SketchNumber.required(
        "Head face diameter",
        Dimension.LENGTH,
        sketch -> fastener(sketch).head().bearingDiameter(),
        (sketch, value) -> withFastener(sketch, bolt -> bolt.withHead(own(bolt.head(), value))));
  }

  /** A typed face no longer comes from the standard. */
  private static Head own(Head head, double face) {
    return new Head(head.style(), OWN, face, head.height(), head.width(), head.rim());
  }

  static SketchNumber nutFace() {
    return SketchNumber.sometimes(
        "Nut face diameter",
        Dimension.LENGTH,
        sketch ->
            fastener(sketch).anchor() instanceof Anchor.Nut nut
                ? OptionalDouble.of(nut.bearingDiameter())
                : OptionalDouble.empty(),
        FastenerSection::withNutFace);
  }

  private static Sketch withNutFace(Sketch sketch, double face) {
    return withFastener(
        sketch,
        bolt ->
            bolt.anchor() instanceof Anchor.Nut nut
                ? bolt.withAnchor(new Anchor.Nut(OWN, face, nut.height(), nut.width()))
                : bolt);
  }
}

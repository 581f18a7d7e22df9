package clampwright.view.given;

import clampwright.edit.End;
import clampwright.edit.SketchModel;
import clampwright.edit.Stacking;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.view.field.FieldRow;
import clampwright.view.field.NameField;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Predicate;
import javafx.scene.layout.Region;

/**
 * The fields of one part alone, to be shown beside it; their ids begin with "card-". Each card is
 * made when first asked for and kept, as its fields follow the model as long as it lives.
 */
public final class PartCards {
  private final SketchModel model;
  private final Map<Part.Kind, Section> cards = new EnumMap<>(Part.Kind.class);

  public PartCards(SketchModel model) {
    this.model = model;
  }

  /** The card of the selected part; empty when nothing in particular is selected. */
  public Optional<Region> ofSelection() {
    Part.Kind kind = model.selection().kind();
    return kind == Part.Kind.JOINT
        ? Optional.empty()
        : Optional.of(cards.computeIfAbsent(kind, this::made));
  }

  private Section made(Part.Kind kind) {
    return switch (kind) {
      case ELEMENT -> element();
      case HEAD -> head();
      case SHANK -> bolt();
      case ANCHOR -> anchor();
      case HEAD_CONE, NUT_CONE -> cones();
      case LOAD -> load();
      case PRELOAD -> preload();
      case NOTE -> note();
      case JOINT -> throw new IllegalArgumentException("the joint as a whole has no card");
    };
  }

  private Section element() {
    PartSection section = new PartSection(model, "card");
    FieldRow head =
        section.add(
            "Washer rule",
            Fields.choice(model, "card-head-washer-rule", MethodSection.headWasherRule()));
    FieldRow nut =
        section.add(
            "Washer rule",
            Fields.choice(model, "card-nut-washer-rule", MethodSection.nutWasherRule()));
    showWhile(head, sketch -> isSelectedWasher(sketch, End.HEAD));
    showWhile(nut, sketch -> isSelectedWasher(sketch, End.NUT));
    return section;
  }

  private boolean isSelectedWasher(Sketch sketch, End end) {
    int last = sketch.joint().elements().size() - 1;
    boolean there = model.selection().equals(Part.element(end == End.HEAD ? 0 : Math.max(0, last)));
    return there && Stacking.hasWasher(sketch, end) && Stacking.canAddWasher(sketch, end);
  }

  private Section head() {
    Section section = new Section("Head");
    section.add("Head", Fields.choice(model, "card-head", FastenerSection.head()));
    section.add(
        "Head face Ø", Fields.quantity(model, "card-head-face", FastenerSection.headFace()));
    return section;
  }

  private Section bolt() {
    Section section = new Section("Bolt");
    section.add("Thread", Fields.choice(model, "card-thread", FastenerSection.thread()));
    section.add(
        "Strength class", Fields.choice(model, "card-strength", FastenerSection.strength()));
    section.add("Length", Fields.quantity(model, "card-length", FastenerSection.length()));
    section.add("Shank", Fields.quantity(model, "card-shank", FastenerSection.shankLength()));
    return section;
  }

  private Section anchor() {
    Section section = new Section("Screwed into");
    section.add("Screwed into", Fields.choice(model, "card-anchor", FastenerSection.anchor()));
    FieldRow face =
        section.add(
            "Nut face Ø", Fields.quantity(model, "card-nut-face", FastenerSection.nutFace()));
    showWhile(face, sketch -> !sketch.joint().fastener().isTapped());
    return section;
  }

  private Section cones() {
    Section section = new Section("Pressure cones");
    section.add("Half-angle", Fields.choice(model, "card-angle-rule", AngleFields.rule(model)));
    FieldRow head =
        section.add("Angle", Fields.quantity(model, "card-head-angle", AngleFields.head()));
    FieldRow nut =
        section.add(
            "Angle at the nut", Fields.quantity(model, "card-nut-angle", AngleFields.nut()));
    showWhile(head, AngleFields::isTyped);
    showWhile(nut, AngleFields::isTyped);
    return section;
  }

  private Section note() {
    Section section = new Section("Note");
    NameField text =
        new NameField(
            model,
            "Change note",
            sketch ->
                model.selection().isNote()
                    ? Optional.of(sketch.notes().get(model.selection().index()).text())
                    : Optional.empty(),
            (sketch, words) ->
                sketch.withNote(model.selection().index(), note -> note.withText(words)));
    text.setId("card-note");
    text.getStyleClass().add("wide-field");
    model.selectionProperty().subscribe((Part was, Part is) -> text.refresh());
    section.add("Words", text);
    return section;
  }

  private Section preload() {
    Section section = new Section("Tightening");
    FieldRow preload =
        section.add("Preload", Fields.quantity(model, "card-preload", TargetFields.preload()));
    FieldRow share =
        section.add(
            "Share of proof",
            Fields.quantity(model, "card-proof-share", TargetFields.proofShare()));
    FieldRow torque =
        section.add("Torque", Fields.quantity(model, "card-torque", TargetFields.torque()));
    showWhile(preload, sketch -> TargetFields.is(sketch, Target.Force.class));
    showWhile(share, sketch -> TargetFields.is(sketch, Target.ProofFraction.class));
    showWhile(torque, sketch -> TargetFields.torque().read().apply(sketch).isPresent());
    return section;
  }

  private Section load() {
    Section section = new Section("Load per bolt");
    section.add("Axial", LoadFields.quantity(model, "card-axial-load", LoadSection.axial(model)));
    FieldRow n =
        section.add(
            "Enters at n", LoadFields.quantity(model, "card-n", LoadSection.introduction(model)));
    model.shownCaseProperty().addListener(observable -> showFactor(n));
    showWhile(n, sketch -> !IntroductionFields.isAtParts(model, sketch));
    return section;
  }

  private void showFactor(FieldRow row) {
    Section.setShown(row, !IntroductionFields.isAtParts(model, model.sketch()));
  }

  private void showWhile(FieldRow row, Predicate<Sketch> wanted) {
    Runnable follow = () -> Section.setShown(row, wanted.test(model.sketch()));
    model.sketchProperty().addListener(observable -> follow.run());
    model.selectionProperty().addListener(observable -> follow.run());
    follow.run();
  }
}

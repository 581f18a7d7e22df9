package clampwright.view.given;

import clampwright.catalog.Catalogue;
import clampwright.catalog.Entry;
import clampwright.edit.SketchModel;
import clampwright.joint.Fastener;
import clampwright.joint.Material;
import clampwright.joint.Sketch;
import clampwright.joint.Tightening;
import clampwright.view.Hover;
import clampwright.view.field.Choice;
import clampwright.view.field.ChoiceField;
import clampwright.view.field.QuantityField;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.List;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import javafx.scene.control.Button;
import javafx.scene.control.Label;

/** Makes the fields of the given pane, with their ids. */
final class Fields {
  private static final String TYPED = "typed, not from a table";

  private Fields() {}

  static QuantityField quantity(SketchModel model, String id, SketchNumber number) {
    QuantityField field = new QuantityField(model, number);
    field.text().setId(id);
    return field;
  }

  static <T> ChoiceField<T> choice(SketchModel model, String id, SketchChoice<T> choice) {
    ChoiceField<T> field = new ChoiceField<>(model, choice);
    field.setId(id);
    return field;
  }

  /** A field that may stay empty, and what it means then. */
  static QuantityField optional(SketchModel model, String id, SketchNumber number, String open) {
    QuantityField field = quantity(model, id, number);
    field.setOpen(open);
    return field;
  }

  /** A choice with long words, and so wider. */
  static <T> ChoiceField<T> wideChoice(SketchModel model, String id, SketchChoice<T> choice) {
    ChoiceField<T> field = choice(model, id, choice);
    field.getStyleClass().add("wide-field");
    return field;
  }

  /** A small button beside fields; what it does is said when the pointer rests on it. */
  static Button smallButton(String sign, String does) {
    Button button = new Button(sign);
    button.getStyleClass().setAll("small-button");
    button.setAccessibleText(does);
    Hover.tell(button, () -> does);
    return button;
  }

  /** A quiet line under fields that says what they come to. */
  static Label hint(String id) {
    Label hint = new Label();
    hint.setId(id);
    hint.getStyleClass().add("hint-line");
    hint.setWrapText(true);
    return hint;
  }

  static Sketch withTightening(Sketch sketch, UnaryOperator<Tightening> change) {
    return sketch.withJoint(joint -> joint.withTightening(change.apply(joint.tightening())));
  }

  static Tightening tightening(Sketch sketch) {
    return sketch.joint().tightening();
  }

  static Sketch withFastener(Sketch sketch, UnaryOperator<Fastener> change) {
    return sketch.withJoint(joint -> joint.withFastener(change.apply(joint.fastener())));
  }

  static Fastener fastener(Sketch sketch) {
    return sketch.joint().fastener();
  }

  /** Where a value comes from. */
  static String origin(Sketch sketch, Object value) {
    return Catalogue.standard().originOf(fastener(sketch).thread(), value).orElse(TYPED);
  }

  /** Table entries as choices; the group can be put in words. */
  static <S, T extends S> List<Choice<S>> choices(
      List<Entry<T>> entries, Function<Entry<T>, String> group) {
    return entries.stream()
        .map(
            entry ->
                new Choice<S>(entry.label(), group.apply(entry), entry.value(), entry.origin()))
        .toList();
  }

  static List<Choice<Material>> materials() {
    return choices(Catalogue.standard().materials(), entry -> family(entry.value().family()));
  }

  private static String family(Material.Family family) {
    return switch (family) {
      case STEEL -> "Steel";
      case ALUMINIUM -> "Aluminium";
      case COPPER -> "Copper alloys";
      case GREY_IRON -> "Grey iron";
      case OTHER -> "Other";
    };
  }
}

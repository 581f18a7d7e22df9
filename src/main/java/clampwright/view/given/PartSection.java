package clampwright.view.given;

import clampwright.edit.OutlineKind;
import clampwright.edit.SketchModel;
import clampwright.joint.Element;
import clampwright.joint.Material;
import clampwright.joint.Part;
import clampwright.view.Hover;
import clampwright.view.field.ChoiceField;
import clampwright.view.field.FieldRow;
import clampwright.view.field.NameField;
import clampwright.view.field.QuantityField;
import java.util.List;
import java.util.Optional;

/** The fields of the selected element; hidden while none is selected. */
final class PartSection extends Section {
  private final SketchModel model;
  private final PartFields fields;
  private final NameField name;
  private final ChoiceField<Material> material;
  private final ChoiceField<OutlineKind> outline;
  private final List<QuantityField> numbers;
  private final FieldRow hole;
  private final FieldRow diameter;
  private final FieldRow left;
  private final FieldRow right;

  PartSection(SketchModel model) {
    this(model, "part");
  }

  /**
   * The same fields once more, elsewhere.
   *
   * @param prefix with which their ids begin
   */
  PartSection(SketchModel model, String prefix) {
    super("Selected part");
    this.model = model;
    setId(prefix + "-section");
    fields = new PartFields(model, () -> model.selectionProperty().get());
    name = fields.name();
    material = fields.material();
    outline = fields.outlineKind();
    numbers =
        List.of(
            fields.thickness(),
            fields.hole(),
            fields.diameter(),
            fields.leftEdge(),
            fields.rightEdge(),
            fields.modulus(),
            fields.tensile(),
            fields.pressureLimit());
    name.setId(prefix + "-name");
    name.getStyleClass().add("wide-field");
    material.getStyleClass().add("wide-field");
    material.setId(prefix + "-material");
    outline.setId(prefix + "-outline");
    List<String> ids =
        List.of(
            "-thickness",
            "-hole",
            "-diameter",
            "-left",
            "-right",
            "-modulus",
            "-tensile",
            "-pressure-limit");
    for (int i = 0; i < ids.size(); i++) {
      numbers.get(i).text().setId(prefix + ids.get(i));
    }
    add("Name", name);
    add("Material", material);
    add("Modulus E", numbers.get(5));
    add("Thickness", numbers.get(0));
    hole = add("Hole Ø", numbers.get(1));
    add("Outline", outline);
    diameter = add("Outside Ø", numbers.get(2));
    left = add("Edge, left", numbers.get(3));
    right = add("Edge, right", numbers.get(4));
    FieldRow tensile = add("R_m", numbers.get(6));
    FieldRow pressure = add("Pressure limit", numbers.get(7));
    fold("strength", tensile, pressure).setId(prefix + "-fold-strength");
    for (QuantityField size : numbers.subList(0, 3)) {
      Hover.tell(size, this::origin);
    }
    model.selectionProperty().subscribe((Part was, Part is) -> reread());
    model.sketchProperty().addListener(observable -> follow());
    follow();
  }

  private String origin() {
    return fields
        .element(model.sketch())
        .map(element -> Origins.of(element, model.sketch().joint().fastener().thread()))
        .orElse("");
  }

  private void reread() {
    name.refresh();
    material.refresh();
    outline.refresh();
    numbers.forEach(QuantityField::refresh);
    follow();
  }

  private void follow() {
    Optional<Element> element = fields.element(model.sketch());
    setShown(this, element.isPresent());
    if (element.isPresent()) {
      Part part = model.selectionProperty().get();
      setTitle((element.get().isWasher() ? "Washer, no. " : "Layer, no. ") + (part.index() + 1));
      OutlineKind kind = OutlineKind.of(element.get().outline());
      setShown(hole, !model.sketch().joint().isTappedLayer(part.index()));
      setShown(diameter, kind == OutlineKind.ROUND);
      setShown(left, kind == OutlineKind.STRIP);
      setShown(right, kind == OutlineKind.STRIP);
    }
  }
}

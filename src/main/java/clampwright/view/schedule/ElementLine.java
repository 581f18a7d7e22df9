package clampwright.view.schedule;

import clampwright.edit.SketchModel;
import clampwright.joint.Element;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.ElementFinding;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import clampwright.view.PartName;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import javafx.css.PseudoClass;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;

/** One element of the stack. */
final class ElementLine extends Line {
  static final double HEIGHT = 21.5;
  private static final PseudoClass SELECTED = PseudoClass.getPseudoClass("selected");
  private static final PseudoClass BLAMED = PseudoClass.getPseudoClass("blamed");

  private final int index;
  private final Governs governs = new Governs();
  private final ShareBar share = new ShareBar();
  private final CellEditing editing;

  /** Kept up to date also while a field stands in their place. */
  private final Map<Column, Label> labels = new EnumMap<>(Column.class);

  ElementLine(SketchModel model, int index) {
    super(HEIGHT);
    this.index = index;
    getStyleClass().add("schedule-line");
    setId("schedule-" + (index + 1));
    setAccessibleRole(AccessibleRole.TABLE_ROW);
    setFocusTraversable(true);
    for (Column column : Column.values()) {
      switch (column) {
        case GOVERNS -> set(column, governs);
        case SHARE -> set(column, share);
        default -> {
          labels.put(column, label(column));
          set(column, labels.get(column));
        }
      }
    }
    editing = new CellEditing(this, model, Part.element(index));
  }

  private static Label label(Column column) {
    Label label = new Label();
    label.getStyleClass().add(column.name().toLowerCase(java.util.Locale.ROOT).replace('_', '-'));
    return label;
  }

  CellEditing editing() {
    return editing;
  }

  void select(boolean selected) {
    pseudoClassStateChanged(SELECTED, selected);
  }

  /**
   * Shows the element.
   *
   * @param finding empty while the joint has no solution
   * @param scale of the found columns
   * @param blamed whether a reason points at this element
   */
  void show(Sketch sketch, Optional<ElementFinding> finding, Scale scale, boolean blamed) {
    Element element = sketch.joint().elements().get(index);
    UnitSystem units = sketch.units();
    text(Column.NUMBER, Integer.toString(index + 1));
    text(Column.PART, PartName.of(Part.element(index), sketch.joint()));
    text(Column.MATERIAL, element.material().name());
    text(Column.THICKNESS, length(element.thickness(), units));
    boolean tapped = sketch.joint().isTappedLayer(index);
    text(Column.HOLE, tapped ? "tapped" : length(element.hole(), units));
    text(Column.OUTLINE, Outlines.text(element.outline(), units));
    pseudoClassStateChanged(BLAMED, blamed);
    governs.setVisible(finding.isPresent());
    share.setVisible(finding.isPresent());
    if (finding.isPresent()) {
      show(finding.get(), scale, units);
    } else {
      for (Column column :
          new Column[] {
            Column.FROM_HEAD, Column.FROM_NUT, Column.EFFECTIVE, Column.AREA, Column.STIFFNESS
          }) {
        text(column, "");
      }
    }
    setAccessibleText(description(finding));
  }

  private void show(ElementFinding finding, Scale scale, UnitSystem units) {
    text(Column.FROM_HEAD, length(finding.depthFromHead(), units));
    text(Column.FROM_NUT, length(finding.depthFromNut(), units));
    governs.show(finding);
    text(Column.EFFECTIVE, length(finding.effectiveDiameter(), units));
    text(Column.AREA, Quantities.number(Dimension.AREA, units, finding.area()));
    text(Column.STIFFNESS, scale.stiffness(finding, units));
    share.show(scale.share(finding));
  }

  private static String length(double value, UnitSystem units) {
    return Quantities.number(Dimension.LENGTH, units, value);
  }

  private void text(Column column, String text) {
    Label label = labels.get(column);
    if (!text.equals(label.getText())) {
      label.setText(text);
    }
  }

  private String description(Optional<ElementFinding> finding) {
    StringBuilder text = new StringBuilder();
    labels.forEach(
        (column, label) -> {
          if (!label.getText().isEmpty()) {
            text.append(column.title()).append(' ').append(label.getText()).append(", ");
          }
        });
    finding.ifPresent(found -> text.append("governs ").append(Governs.text(found)));
    return text.toString().strip();
  }
}

package clampwright.view.found;

import clampwright.figure.Sentences;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness;
import clampwright.mechanics.MemberStiffness.NotApplicable;
import clampwright.mechanics.MemberStiffness.Result;
import clampwright.mechanics.MemberStiffness.Value;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import java.util.EnumMap;
import java.util.Map;
import javafx.css.PseudoClass;
import javafx.geometry.HPos;
import javafx.scene.control.Label;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Priority;

/** Member stiffness and load factor by every method, or why a method does not apply. */
final class MethodList extends GridPane {
  private static final PseudoClass CHOSEN = PseudoClass.getPseudoClass("chosen");

  /** The cells of one method. */
  private record Line(Label name, Label stiffness, Label factor, Label why) {}

  private final Map<StiffnessMethod, Line> lines = new EnumMap<>(StiffnessMethod.class);
  private final Label unit = cell("method-head");

  MethodList() {
    getStyleClass().add("method-list");
    ColumnConstraints name = new ColumnConstraints();
    name.setHgrow(Priority.ALWAYS);
    getColumnConstraints().setAll(name, rightAligned(78), rightAligned(54));
    Label factor = cell("method-head");
    factor.setText("Φ");
    add(unit, 1, 0);
    add(factor, 2, 0);
    int row = 1;
    for (StiffnessMethod method : StiffnessMethod.values()) {
      addLine(method, row);
      row += 2;
    }
  }

  private static ColumnConstraints rightAligned(double width) {
    ColumnConstraints column = new ColumnConstraints(width, width, width);
    column.setHalignment(HPos.RIGHT);
    return column;
  }

  private static Label cell(String style) {
    Label label = new Label();
    label.getStyleClass().add(style);
    return label;
  }

  private void addLine(StiffnessMethod method, int row) {
    Line line =
        new Line(
            cell("method-name"), cell("method-number"), cell("method-number"), cell("method-why"));
    line.name.setText(Sentences.method(method));
    line.factor.setId("factor-" + Sentences.shortMethod(method).toLowerCase(java.util.Locale.ROOT));
    line.why.setWrapText(true);
    lines.put(method, line);
    add(line.name, 0, row);
    add(line.stiffness, 1, row);
    add(line.factor, 2, row);
    add(line.why, 0, row + 1, 3, 1);
  }

  void show(
      MemberStiffness members, StiffnessMethod chosen, double introduction, UnitSystem units) {
    unit.setText(Quantities.unit(Dimension.STIFFNESS, units));
    lines.forEach(
        (method, line) -> {
          Result result = members.get(method);
          boolean applies = result instanceof Value;
          line.stiffness.setText(
              result instanceof Value value
                  ? Quantities.number(Dimension.STIFFNESS, units, value.stiffness())
                  : "");
          line.factor.setText(
              result instanceof Value value
                  ? Quantities.number(Dimension.RATIO, units, value.loadFactor(introduction))
                  : "–");
          line.why.setText(result instanceof NotApplicable not ? not.why().text() : "");
          line.why.setVisible(!applies);
          line.why.setManaged(!applies);
          line.name.pseudoClassStateChanged(CHOSEN, method == chosen);
          line.factor.pseudoClassStateChanged(CHOSEN, method == chosen);
          line.stiffness.pseudoClassStateChanged(CHOSEN, method == chosen);
        });
  }
}

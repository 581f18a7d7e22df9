package clampwright.figure;

import clampwright.joint.Part;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Side;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import java.util.List;

/** The marks in the left column: governing side and effective diameter of each element. */
final class CallOuts {
  static final double LEFT = 3.5;
  static final double WIDTH = 29;
  private static final double USUAL_SPACING = 6.6;

  private final Drawing drawing;
  private final StackLayout layout;
  private final Assessment.Solved solved;
  private final UnitSystem units;

  CallOuts(Drawing drawing, StackLayout layout, Assessment.Solved solved, UnitSystem units) {
    this.drawing = drawing;
    this.layout = layout;
    this.solved = solved;
    this.units = units;
  }

  void draw() {
    int count = solved.elements().size();
    double[] wanted = new double[count];
    for (int i = 0; i < count; i++) {
      wanted[i] = drawing.sheet().y(solved.elements().get(i).middle());
    }
    double top = 10;
    double bottom = drawing.sheet().height() - 8;
    double spacing = LabelColumn.spacing(count, USUAL_SPACING, top, bottom);
    double[] places = LabelColumn.placed(wanted, spacing, top, bottom);
    double height = Math.min(5.3, 0.82 * spacing);
    for (int i = 0; i < count; i++) {
      callOut(i, wanted[i], places[i], height);
    }
  }

  private void callOut(int i, double wanted, double place, double height) {
    ElementFinding finding = solved.elements().get(i);
    Tag tag = Tag.of(role(finding.governing()), Part.element(i));
    double radius =
        Math.min(Math.min(finding.headDiameter(), finding.nutDiameter()) / 2, layout.reach());
    Point dot = new Point(drawing.sheet().x(-radius), wanted);
    double right = LEFT + WIDTH;
    if (dot.x() > right) {
      drawing.path(
          Tag.of(leader(finding.governing()), Part.element(i)),
          List.of(new Point(right, place), new Point(right + 3, place), dot));
      drawing.disc(tag, dot, 0.75, true);
    }
    drawing.add(
        new Mark.Pill(
            tag,
            LEFT,
            place - height / 2,
            WIDTH,
            height,
            symbol(finding.governing()),
            letter(finding.governing()),
            "Ø " + Quantities.number(Dimension.LENGTH, units, finding.effectiveDiameter()),
            Math.min(3.2, 0.62 * height)));
  }

  private static Role leader(Side side) {
    return role(side);
  }

  private static Role role(Side side) {
    return switch (side) {
      case HEAD -> Role.HEAD_MARK;
      case NUT -> Role.NUT_MARK;
      case BOTH -> Role.BOTH_MARK;
    };
  }

  private static Mark.Symbol symbol(Side side) {
    return switch (side) {
      case HEAD -> Mark.Symbol.TRIANGLE_DOWN;
      case NUT -> Mark.Symbol.TRIANGLE_UP;
      case BOTH -> Mark.Symbol.DIAMOND;
    };
  }

  private static String letter(Side side) {
    return switch (side) {
      case HEAD -> "H";
      case NUT -> "N";
      case BOTH -> "H=N";
    };
  }
}

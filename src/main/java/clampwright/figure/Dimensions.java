package clampwright.figure;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.List;

/** Thicknesses and names in the right column. */
final class Dimensions {
  private static final double USUAL_SPACING = 8.2;
  private static final double NAME_SIZE = 3.1;
  private static final double MATERIAL_SIZE = 2.7;

  /** From the reach of the stack to the names, and from the names to the edge [sheet mm]. */
  private static final double BEFORE_NAMES = 19;

  private static final double BEHIND_NAMES = 3;
  private static final double NARROWEST = 22;
  private static final double WIDEST = 42;

  private final Drawing drawing;
  private final StackLayout layout;
  private final Sketch sketch;

  Dimensions(Drawing drawing, StackLayout layout, Sketch sketch) {
    this.drawing = drawing;
    this.layout = layout;
    this.sketch = sketch;
  }

  void draw() {
    int count = layout.joint().elements().size();
    if (count == 0) {
      return;
    }
    double[] wanted = new double[count];
    for (int i = 0; i < count; i++) {
      wanted[i] = drawing.sheet().y((layout.from(i) + layout.to(i)) / 2);
    }
    double top = 11;
    double bottom = drawing.sheet().height() - 9;
    double spacing = LabelColumn.spacing(count, USUAL_SPACING, top, bottom);
    double[] places = LabelColumn.placed(wanted, spacing, top, bottom);
    for (int i = 0; i <= count; i++) {
      extension(i);
    }
    for (int i = 0; i < count; i++) {
      thickness(i, wanted[i], places[i], spacing);
    }
  }

  /** Width of the whole column, as wide as the names ask for [sheet mm]. */
  static double column(Joint joint) {
    return BEFORE_NAMES + nameRoom(joint) + BEHIND_NAMES;
  }

  private static double nameRoom(Joint joint) {
    double widest = NARROWEST;
    for (int i = 0; i < joint.elements().size(); i++) {
      Element element = joint.elements().get(i);
      widest = Math.max(widest, TextWidth.of(name(element, i), NAME_SIZE, Mark.Weight.REGULAR));
      widest =
          Math.max(widest, TextWidth.of(material(element), MATERIAL_SIZE, Mark.Weight.REGULAR));
    }
    return Math.min(WIDEST, widest);
  }

  /** x of the dimension line: right of the stack, kept on the sheet. */
  private double lineX() {
    double right = drawing.sheet().x(layout.reach()) + 4;
    return Math.min(right, drawing.sheet().width() - column(layout.joint()) + 4);
  }

  private void extension(int i) {
    int part = Math.min(i, layout.joint().elements().size() - 1);
    double y = drawing.sheet().y(layout.from(i));
    double reach = layout.joint().elements().get(part).outline().rightReach();
    double start =
        drawing.sheet().x(Math.min(reach, layout.reach())) + (Double.isInfinite(reach) ? 1 : 1);
    drawing.line(
        Tag.of(Role.LEADER, Part.element(part)),
        new Point(Math.min(start, lineX()), y),
        new Point(lineX() + 1.5, y));
  }

  private void thickness(int i, double wanted, double place, double spacing) {
    Element element = layout.joint().elements().get(i);
    Part part = Part.element(i);
    double x = lineX();
    Point from = new Point(x, drawing.sheet().y(layout.from(i)));
    Point to = new Point(x, drawing.sheet().y(layout.to(i)));
    drawing.add(new Mark.Arrow(Tag.of(Role.DIMENSION, part), from, to, true, true));
    drawing.path(
        Tag.of(Role.LEADER, part),
        List.of(new Point(x, wanted), new Point(x + 2.5, place), new Point(x + 4, place)));
    double size = Math.min(3.3, 0.75 * spacing);
    double nameSize = Math.min(size, NAME_SIZE);
    double room = nameRoom(layout.joint());
    boolean twoLines = spacing > 6.5;
    double base = twoLines ? place + 0.1 : place + 0.36 * size;
    drawing.text(
        Tag.of(Role.DIMENSION, part),
        x + 13,
        place + 0.36 * size,
        Quantities.trimmed(Dimension.LENGTH, sketch.units(), element.thickness()),
        Mark.Anchor.END,
        size,
        Mark.Weight.BOLD);
    drawing.text(
        Tag.of(Role.NAME, part),
        x + 15,
        base,
        TextWidth.cut(name(element, i), room, nameSize, Mark.Weight.REGULAR),
        Mark.Anchor.START,
        nameSize);
    if (twoLines) {
      drawing.text(
          Tag.of(Role.SUBNAME, part),
          x + 15,
          place + 3.4,
          TextWidth.cut(material(element), room, MATERIAL_SIZE, Mark.Weight.REGULAR),
          Mark.Anchor.START,
          MATERIAL_SIZE);
    }
  }

  /** The material without the remarks that the tables put in brackets. */
  private static String material(Element element) {
    return element.material().name().replaceAll("\\s*\\(.*\\)", "");
  }

  private static String name(Element element, int i) {
    return element.name().isBlank() ? "layer " + (i + 1) : element.name();
  }
}

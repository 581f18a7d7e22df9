package clampwright.figure;

import clampwright.joint.Element;
import clampwright.joint.Feature;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.List;

/** Thicknesses and names in the right column; edge distances of strips below the stack. */
final class Dimensions {
  static final double COLUMN = 44;
  private static final double USUAL_SPACING = 8.2;

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
    for (int i = 0; i < count; i++) {
      if (layout.joint().elements().get(i).outline() instanceof Outline.Strip strip) {
        edgeDistance(i, strip);
        return;
      }
    }
  }

  /** x of the dimension line: right of the stack, kept on the sheet. */
  private double lineX() {
    double right = drawing.sheet().x(layout.reach()) + 4;
    return Math.min(right, drawing.sheet().width() - COLUMN + 4);
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
        shortened(element.name().isBlank() ? "layer " + (i + 1) : element.name()),
        Mark.Anchor.START,
        Math.min(size, 3.1));
    if (twoLines) {
      drawing.text(
          Tag.of(Role.SUBNAME, part),
          x + 15,
          place + 3.4,
          shortened(material(element)),
          Mark.Anchor.START,
          2.7);
    }
  }

  /** The material without the remarks that the tables put in brackets. */
  private static String material(Element element) {
    return element.material().name().replaceAll("\\s*\\(.*\\)", "");
  }

  private static String shortened(String text) {
    return text.length() <= 17 ? text : text.substring(0, 16) + "…";
  }

  private void edgeDistance(int i, Outline.Strip strip) {
    Part part = Part.element(i);
    double y = drawing.sheet().y(layout.stack()) + 5;
    double edge = drawing.sheet().x(-strip.left());
    double axis = drawing.sheet().axisX();
    double from = drawing.sheet().y(layout.to(i));
    drawing.line(Tag.of(Role.LEADER, part), new Point(edge, from + 0.8), new Point(edge, y + 1.5));
    double nut = drawing.sheet().x(-layout.joint().fastener().head().rim() * 0.58);
    double textX = (edge + Math.min(nut, axis)) / 2;
    drawing.add(
        new Mark.Arrow(
            Tag.of(Role.DIMENSION, part, Feature.LEFT_EDGE),
            new Point(edge, y),
            new Point(axis, y),
            true,
            true));
    drawing.text(
        Tag.of(Role.DIMENSION, part),
        textX,
        y - 1,
        Quantities.trimmed(Dimension.LENGTH, sketch.units(), strip.left()),
        Mark.Anchor.MIDDLE,
        3.3,
        Mark.Weight.BOLD);
  }
}

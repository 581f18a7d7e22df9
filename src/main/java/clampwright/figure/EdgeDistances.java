package clampwright.figure;

import clampwright.joint.Element;
import clampwright.joint.Feature;
import clampwright.joint.LoadCase;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * Distances of straight edges from the axis, dimensioned below the stack: each distance once, the
 * nearest on top. On the right they start below the load arrow.
 */
final class EdgeDistances {
  private static final double ROW = 5.5;
  private static final double SIZE = 3.3;

  private final Drawing drawing;
  private final StackLayout layout;
  private final Sketch sketch;
  private final LoadCase load;

  EdgeDistances(Drawing drawing, StackLayout layout, Sketch sketch, LoadCase load) {
    this.load = load;
    this.drawing = drawing;
    this.layout = layout;
    this.sketch = sketch;
  }

  void draw() {
    side(-1, 5);
    side(1, load.axialMax() == 0 ? 5 : 14);
  }

  /** −1 left, 1 right; the first row so far below the stack [sheet mm]. */
  private void side(int side, double first) {
    Map<Double, Integer> distances = new TreeMap<>();
    for (int i = 0; i < layout.joint().elements().size(); i++) {
      Element element = layout.joint().elements().get(i);
      if (element.outline() instanceof Outline.Strip strip) {
        double distance = side < 0 ? strip.left() : strip.right();
        if (layout.isDrawn(distance)) {
          distances.put(distance, i);
        }
      }
    }
    double y = drawing.sheet().y(layout.stack()) + first;
    double lowest = drawing.sheet().height() - 4;
    for (Map.Entry<Double, Integer> entry : distances.entrySet()) {
      if (y <= lowest) {
        dimension(side, entry.getKey(), entry.getValue(), y);
      }
      y += ROW;
    }
  }

  private void dimension(int side, double distance, int element, double y) {
    Part part = Part.element(element);
    double edge = drawing.sheet().x(side * distance);
    double axis = drawing.sheet().axisX();
    double from = drawing.sheet().y(layout.to(element)) + 0.8;
    Feature feature = side < 0 ? Feature.LEFT_EDGE : Feature.RIGHT_EDGE;
    drawing.line(Tag.of(Role.LEADER, part), new Point(edge, from), new Point(edge, y + 1.5));
    drawing.add(
        new Mark.Arrow(
            Tag.of(Role.DIMENSION, part, feature),
            new Point(edge, y),
            new Point(axis, y),
            true,
            true));
    String text = Quantities.trimmed(Dimension.LENGTH, sketch.units(), distance);
    double width = TextWidth.of(text, SIZE, Mark.Weight.BOLD);
    double nut = drawing.sheet().x(side * layout.nutReach());
    boolean room = Math.abs(edge - nut) > width + 3 && side * (edge - nut) > 0;
    Mark.Anchor beyond = side < 0 ? Mark.Anchor.END : Mark.Anchor.START;
    Mark.Text between = label(part, (edge + nut) / 2, y - 1, text, Mark.Anchor.MIDDLE);
    Mark.Text outside = label(part, edge + side * 1.5, y + 0.36 * SIZE, text, beyond);
    Mark.Text below = label(part, (edge + nut) / 2, y + 1.1 * SIZE, text, Mark.Anchor.MIDDLE);
    drawing.firstFree(room ? List.of(between, below, outside) : List.of(outside, below, between));
  }

  private static Mark.Text label(Part part, double x, double y, String text, Mark.Anchor anchor) {
    Tag tag = Tag.of(Role.DIMENSION, part);
    return new Mark.Text(tag, new Point(x, y), text, anchor, SIZE, Mark.Weight.BOLD);
  }
}

package clampwright.figure;

import clampwright.joint.Element;
import clampwright.joint.Feature;
import clampwright.joint.Material;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** Draws one element of the stack: bodies of both halves, hatching, edges. */
final class LayerDrawing {
  private static final double WAVE = 0.5;

  private final Drawing drawing;
  private final StackLayout layout;

  LayerDrawing(Drawing drawing, StackLayout layout) {
    this.drawing = drawing;
    this.layout = layout;
  }

  void body(int i) {
    Element element = layout.joint().elements().get(i);
    Role role = element.isWasher() ? Role.WASHER_BODY : Role.LAYER_BODY;
    Tag body = Tag.of(role, Part.element(i), Feature.BODY);
    drawing.area(body, half(i, -1));
    List<Point> right = half(i, 1);
    drawing.area(body, right);
    boolean rising = i % 2 == 0;
    double spacing = spacing(element.material().family(), i);
    drawing.add(
        new Mark.Hatch(
            Tag.of(Role.HATCH, Part.element(i), Feature.BODY),
            right,
            HatchLines.within(right, rising, spacing)));
  }

  void edges(int i) {
    Part part = Part.element(i);
    for (int side : new int[] {-1, 1}) {
      double hole = side * layout.holeRadius(i);
      List<Point> edge = edge(i, side);
      Feature feature = side < 0 ? Feature.LEFT_EDGE : Feature.RIGHT_EDGE;
      boolean wide = !layout.isDrawn(reach(i, side));
      drawing.path(Tag.of(wide ? Role.FINE_LINE : Role.OUTLINE, part, feature), edge);
      Point top = drawing.at(hole, layout.from(i));
      Point bottom = drawing.at(hole, layout.to(i));
      if (layout.joint().isTappedLayer(i)) {
        drawing.line(Tag.of(Role.FINE_LINE, part), top, bottom);
      } else {
        drawing.line(Tag.of(Role.OUTLINE, part, Feature.HOLE_EDGE), top, bottom);
      }
      drawing.line(Tag.of(Role.OUTLINE, part), top, edge.get(0));
      drawing.line(Tag.of(Role.OUTLINE, part, Feature.FACE), bottom, edge.get(edge.size() - 1));
    }
  }

  private Outline outline(int i) {
    return layout.joint().elements().get(i).outline();
  }

  /** Distance of an outer edge from the axis; infinite for a wide part. */
  private double reach(int i, int side) {
    return side < 0 ? outline(i).leftReach() : outline(i).rightReach();
  }

  /** Polygon of one half, −1 left, 1 right. */
  List<Point> half(int i, int side) {
    double hole = side * layout.holeRadius(i);
    List<Point> points = new ArrayList<>(edge(i, side));
    points.add(drawing.at(hole, layout.to(i)));
    points.add(drawing.at(hole, layout.from(i)));
    return points;
  }

  /** The outer edge from top to bottom; a wavy break line for a wide part. */
  private List<Point> edge(int i, int side) {
    double reach = reach(i, side);
    if (layout.isDrawn(reach)) {
      return List.of(
          drawing.at(side * reach, layout.from(i)), drawing.at(side * reach, layout.to(i)));
    }
    List<Point> points = new ArrayList<>();
    double x = drawing.sheet().x(side * layout.reach());
    double top = drawing.sheet().y(layout.from(i));
    double bottom = drawing.sheet().y(layout.to(i));
    int steps = Math.max(2, Math.min(60, (int) Math.ceil((bottom - top) / 0.5)));
    for (int k = 0; k <= steps; k++) {
      double y = top + (bottom - top) * k / steps;
      double phase = 2 * Math.PI * (y - drawing.sheet().headY()) / 6;
      points.add(new Point(x + WAVE * Math.sin(phase), y));
    }
    return Collections.unmodifiableList(points);
  }

  /** Spacing by material and a little by neighbour, so that parts are told apart [sheet mm]. */
  private static double spacing(Material.Family family, int i) {
    double base =
        switch (family) {
          case STEEL -> 1.6;
          case ALUMINIUM -> 2.2;
          case COPPER -> 1.9;
          case GREY_IRON -> 1.35;
          case OTHER -> 2.6;
        };
    return base * (i % 4 < 2 ? 1 : 1.15);
  }
}

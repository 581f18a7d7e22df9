package clampwright.figure;

import clampwright.joint.Anchor;
import clampwright.joint.Fastener;
import clampwright.joint.Feature;
import clampwright.joint.Head;
import clampwright.joint.Part;
import java.util.List;

/** Draws bolt, head and nut, which are not sectioned. */
final class BoltDrawing {
  private static final double ACROSS_CORNERS = 2 / Math.sqrt(3);

  private final Drawing drawing;
  private final StackLayout layout;
  private final Fastener fastener;

  BoltDrawing(Drawing drawing, StackLayout layout) {
    this.drawing = drawing;
    this.layout = layout;
    this.fastener = layout.joint().fastener();
  }

  void draw() {
    shank();
    head();
    if (fastener.anchor() instanceof Anchor.Nut nut) {
      nut(nut);
    }
    axis();
  }

  private void shank() {
    double thread = fastener.thread().diameter() / 2;
    double root = fastener.thread().minorDiameter() / 2;
    double plain = fastener.plainDiameter() / 2;
    double start = Math.min(layout.shankLength(), layout.length());
    double end = layout.length();
    double chamfer = Math.min(thread - root, end - start);
    if (start > 0) {
      body(Part.SHANK, Role.BOLT_BODY, drawing.rectangle(-plain, 0, plain, start));
    }
    body(
        Part.SHANK,
        Role.BOLT_BODY,
        List.of(
            drawing.at(-thread, start),
            drawing.at(thread, start),
            drawing.at(thread, end - chamfer),
            drawing.at(root, end),
            drawing.at(-root, end),
            drawing.at(-thread, end - chamfer)));
    for (int side : new int[] {-1, 1}) {
      if (start > 0) {
        edge(side * plain, 0, start);
      }
      edge(side * thread, start, end - chamfer);
      fine(Part.SHANK, side * root, start, side * root, end);
      if (fastener.bore() > 0) {
        fine(Part.SHANK, side * fastener.bore() / 2, layout.top(), side * fastener.bore() / 2, end);
      }
    }
    fine(Part.SHANK, -thread, end - chamfer, thread, end - chamfer);
  }

  private void edge(double x, double from, double to) {
    Tag tag = Tag.of(Role.OUTLINE, Part.SHANK, Feature.SHANK_EDGE);
    drawing.line(tag, drawing.at(x, from), drawing.at(x, to));
  }

  private void head() {
    Head head = fastener.head();
    double top = -head.height();
    switch (head.style()) {
      case HEXAGON -> hexagon(Part.HEAD, head.width(), top, 0, true);
      case SOCKET -> socket(head, top);
      case FLANGE -> {
        double rim = head.rim() / 2;
        hexagon(Part.HEAD, head.width(), top, 0.28 * top, true);
        body(
            Part.HEAD,
            Role.BOLT_BODY,
            List.of(
                drawing.at(-0.86 * rim, 0.28 * top),
                drawing.at(0.86 * rim, 0.28 * top),
                drawing.at(rim, 0.1 * top),
                drawing.at(rim, 0),
                drawing.at(-rim, 0),
                drawing.at(-rim, 0.1 * top)));
      }
    }
  }

  private void socket(Head head, double top) {
    double half = head.width() / 2;
    double corner = 0.08 * head.width();
    body(
        Part.HEAD,
        Role.BOLT_BODY,
        List.of(
            drawing.at(-half + corner, top),
            drawing.at(half - corner, top),
            drawing.at(half, top + corner),
            drawing.at(half, 0),
            drawing.at(-half, 0),
            drawing.at(-half, top + corner)));
    double key = 0.29 * head.width();
    fine(Part.HEAD, -key, top, -key, 0.45 * top);
    fine(Part.HEAD, key, top, key, 0.45 * top);
    fine(Part.HEAD, -key, 0.45 * top, key, 0.45 * top);
  }

  private void nut(Anchor.Nut nut) {
    double top = layout.stack();
    hexagon(Part.ANCHOR, nut.width(), top, top + nut.height(), false);
  }

  /** A hexagon seen across corners, chamfered at the free end. */
  private void hexagon(Part part, double width, double top, double bottom, boolean freeTop) {
    double half = width * ACROSS_CORNERS / 2;
    double chamfer = 0.14 * (bottom - top);
    double inner = half - 1.5 * chamfer;
    double upper = freeTop ? inner : half;
    double lower = freeTop ? half : inner;
    double bevelTop = freeTop ? top + chamfer : top;
    double bevelBottom = freeTop ? bottom : bottom - chamfer;
    body(
        part,
        Role.BOLT_BODY,
        List.of(
            drawing.at(-upper, top),
            drawing.at(upper, top),
            drawing.at(half, bevelTop),
            drawing.at(half, bevelBottom),
            drawing.at(lower, bottom),
            drawing.at(-lower, bottom),
            drawing.at(-half, bevelBottom),
            drawing.at(-half, bevelTop)));
    fine(part, -half / 2, bevelTop, -half / 2, bevelBottom);
    fine(part, half / 2, bevelTop, half / 2, bevelBottom);
  }

  private void body(Part part, Role role, List<Point> points) {
    drawing.area(Tag.of(role, part), points);
    drawing.outline(Tag.of(Role.OUTLINE, part), points);
  }

  private void fine(Part part, double x1, double z1, double x2, double z2) {
    drawing.line(Tag.of(Role.FINE_LINE, part), drawing.at(x1, z1), drawing.at(x2, z2));
  }

  private void axis() {
    Point top = drawing.at(0, layout.top());
    Point bottom = drawing.at(0, layout.bottom());
    drawing.line(
        Tag.of(Role.AXIS, Part.JOINT),
        new Point(top.x(), top.y() - 3),
        new Point(bottom.x(), bottom.y() + 3));
  }
}

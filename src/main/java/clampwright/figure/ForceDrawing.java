package clampwright.figure;

import clampwright.joint.Feature;
import clampwright.joint.Introduction;
import clampwright.joint.LoadCase;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.AssemblyPreload;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.List;
import java.util.OptionalDouble;

/**
 * The arrows of the outside load, which stand where it enters and leaves, and of the preload, at
 * the ends of the bolt.
 */
final class ForceDrawing {
  private static final double LONG = 9;
  private static final double CLEAR = 1.5;
  private static final double SIZE = 3.3;

  private final Drawing drawing;
  private final StackLayout layout;
  private final Sketch sketch;
  private final LoadCase load;

  ForceDrawing(Drawing drawing, StackLayout layout, Sketch sketch, LoadCase load) {
    this.drawing = drawing;
    this.layout = layout;
    this.sketch = sketch;
    this.load = load;
  }

  void draw(boolean interactive) {
    if (layout.stack() == 0) {
      return;
    }
    reserve();
    if (load.axialMax() != 0 || interactive) {
      load();
    }
    preload();
  }

  /** Words keep clear of the bolt's ends and of the arrows. */
  private void reserve() {
    double rim = 0.58 * layout.joint().fastener().head().rim();
    drawing.reserve(drawing.at(-rim, layout.top()), drawing.at(rim, 0));
    drawing.reserve(
        drawing.at(-layout.nutReach(), layout.stack()),
        drawing.at(layout.nutReach(), layout.bottom()));
    double axis = drawing.sheet().axisX();
    double head = drawing.sheet().y(layout.top());
    drawing.reserve(new Point(axis - 0.9, head - 8), new Point(axis + 0.9, head));
    double x = drawing.sheet().x(0.72 * layout.reach());
    double top = drawing.sheet().y(0);
    double bottom = drawing.sheet().y(layout.stack());
    drawing.reserve(new Point(x - 1, top - CLEAR - LONG), new Point(x + 1, top));
    drawing.reserve(new Point(x - 1, bottom), new Point(x + 1, bottom + CLEAR + LONG));
  }

  private void load() {
    double x = drawing.sheet().x(0.72 * layout.reach());
    double top = drawing.sheet().y(0) - CLEAR;
    double bottom = drawing.sheet().y(layout.stack()) + CLEAR;
    boolean pull = load.axialMax() >= 0;
    arrow(Feature.LOAD_AT_HEAD, new Point(x, top), new Point(x, top - LONG), pull);
    arrow(Feature.LOAD_AT_NUT, new Point(x, bottom), new Point(x, bottom + LONG), pull);
    foot(Feature.LOAD_ENTERS, new Point(x, top), enters());
    foot(Feature.LOAD_LEAVES, new Point(x, bottom), leaves());
    String text = Quantities.text(Dimension.FORCE, sketch.units(), Math.abs(load.axialMax()));
    Tag tag = Tag.of(Role.LOAD, Part.LOAD);
    double y = top - 5;
    drawing.firstFree(
        List.of(
            label(tag, x - 2, y, text, Mark.Anchor.END, SIZE),
            label(tag, x + 2, y, text, Mark.Anchor.START, SIZE),
            label(tag, x, top - LONG - 1.2, text, Mark.Anchor.MIDDLE, SIZE),
            label(tag, x + 2, bottom + 6, text, Mark.Anchor.START, SIZE),
            label(tag, x - 2, bottom + 6, text, Mark.Anchor.END, SIZE)));
  }

  private static Mark.Text label(
      Tag tag, double x, double y, String text, Mark.Anchor anchor, double size) {
    return new Mark.Text(tag, new Point(x, y), text, anchor, size, Mark.Weight.BOLD);
  }

  /** Where the load enters [z]: under the head, or in the middle of a part. */
  private double enters() {
    return load.introduction() instanceof Introduction.Planes planes ? middle(planes.upper()) : 0;
  }

  private double leaves() {
    return load.introduction() instanceof Introduction.Planes planes
        ? middle(planes.lower())
        : layout.stack();
  }

  private double middle(int part) {
    int there = Math.min(part, layout.joint().elements().size() - 1);
    return (layout.from(there) + layout.to(there)) / 2;
  }

  private void arrow(Feature feature, Point foot, Point tip, boolean pull) {
    drawing.add(new Mark.Arrow(Tag.of(Role.LOAD, Part.LOAD, feature), foot, tip, !pull, pull));
  }

  /** A ring in the middle of the part where the load acts, joined to its arrow. */
  private void foot(Feature feature, Point arrow, double z) {
    double y = drawing.sheet().y(z);
    if (load.introduction() instanceof Introduction.Planes) {
      drawing.line(Tag.of(Role.LOAD, Part.LOAD), arrow, new Point(arrow.x(), y));
    } else {
      y = arrow.y();
    }
    drawing.disc(Tag.of(Role.LOAD_FOOT, Part.LOAD, feature), new Point(arrow.x(), y), 1, false);
  }

  private void preload() {
    OptionalDouble force = AssemblyPreload.of(sketch.joint(), sketch.joint().tightening().target());
    if (force.isEmpty()) {
      return;
    }
    Tag tag = Tag.of(Role.PRELOAD, Part.PRELOAD, Feature.PRELOAD_SIZE);
    double x = drawing.sheet().axisX();
    double top = drawing.sheet().y(layout.top()) - 1;
    drawing.add(new Mark.Arrow(tag, new Point(x, top), new Point(x, top - 7), false, true));
    if (!layout.joint().fastener().isTapped()) {
      double bottom = drawing.sheet().y(layout.bottom()) + 1;
      Point end = new Point(x, bottom + 7);
      drawing.add(
          new Mark.Arrow(
              Tag.of(Role.PRELOAD, Part.PRELOAD), new Point(x, bottom), end, false, true));
    }
    String text =
        "preload " + Quantities.text(Dimension.FORCE, sketch.units(), force.getAsDouble());
    Tag words = Tag.of(Role.PRELOAD, Part.PRELOAD);
    double y = top - 3.6;
    double end = drawing.sheet().y(layout.bottom()) + 5;
    drawing.firstFree(
        List.of(
            label(words, x - 2, y, text, Mark.Anchor.END, 2.9),
            label(words, x, top - 8, text, Mark.Anchor.MIDDLE, 2.9),
            label(words, x + 2, y, text, Mark.Anchor.START, 2.9),
            label(words, x - 2, top - 8, text, Mark.Anchor.END, 2.9),
            label(words, x + 2, top - 8, text, Mark.Anchor.START, 2.9),
            label(words, x + 2, end, text, Mark.Anchor.START, 2.9),
            label(words, x - 2, end, text, Mark.Anchor.END, 2.9),
            label(words, x, end + 4.5, text, Mark.Anchor.MIDDLE, 2.9)));
  }
}

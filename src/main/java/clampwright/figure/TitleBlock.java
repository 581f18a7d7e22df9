package clampwright.figure;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.UnitSystem;
import java.util.ArrayList;
import java.util.List;

/**
 * Frame and title block of a whole sheet: name of the sketch, units, program; the caution stands
 * beside it.
 */
final class TitleBlock {
  private static final double INSET = 7;
  private static final double WIDE = 92;
  static final double TALL = 15;

  private final Sketch sketch;
  private final double width;
  private final double height;
  private final List<Mark> marks = new ArrayList<>();

  TitleBlock(Sketch sketch, double width, double height) {
    this.sketch = sketch;
    this.width = width;
    this.height = height;
  }

  List<Mark> marks() {
    Tag line = Tag.of(Role.OUTLINE, Part.JOINT);
    marks.add(new Mark.Path(line, box(INSET, INSET, width - INSET, height - INSET), true));
    double left = width - INSET - WIDE;
    double top = INSET;
    marks.add(new Mark.Path(line, box(left, top, width - INSET, top + TALL), true));
    double room = WIDE - 5;
    String name = TextWidth.cut(sketch.name(), room, 4.2, Mark.Weight.BOLD);
    text(Role.NAME, left + 2.5, top + 6.4, name, 4.2, Mark.Weight.BOLD);
    String units = sketch.units() == UnitSystem.METRIC ? "mm, N" : "in, lbf";
    text(
        Role.CAPTION,
        left + 2.5,
        top + 11.8,
        "Clampwright · bolted joint in section · " + units,
        2.7,
        Mark.Weight.REGULAR);
    return marks;
  }

  private void text(Role role, double x, double y, String text, double size, Mark.Weight weight) {
    marks.add(
        new Mark.Text(
            Tag.of(role, Part.JOINT), new Point(x, y), text, Mark.Anchor.START, size, weight));
  }

  private static List<Point> box(double left, double top, double right, double bottom) {
    return List.of(
        new Point(left, top),
        new Point(right, top),
        new Point(right, bottom),
        new Point(left, bottom));
  }
}

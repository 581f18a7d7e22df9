package clampwright.figure;

import clampwright.joint.Feature;
import clampwright.joint.Note;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import java.util.List;

/** The reader's own notes, each with a leader to the nearest place of its part. */
final class NoteDrawing {
  private static final double SIZE = 3.1;
  private static final double PADDING = 0.9;

  private final Drawing drawing;
  private final StackLayout layout;
  private final Sketch sketch;

  NoteDrawing(Drawing drawing, StackLayout layout, Sketch sketch) {
    this.drawing = drawing;
    this.layout = layout;
    this.sketch = sketch;
  }

  void draw() {
    for (int i = 0; i < sketch.notes().size(); i++) {
      Note note = sketch.notes().get(i);
      boolean there =
          !note.part().isElement() || note.part().index() < layout.joint().elements().size();
      if (there) {
        note(Part.note(i), note);
      }
    }
  }

  /** Words that would leave the sheet are kept on it. */
  private void note(Part part, Note note) {
    double width = TextWidth.of(note.text(), SIZE, Mark.Weight.REGULAR);
    Point wanted = drawing.at(note.fromAxis(), middle(note.part()) + note.z());
    double most = drawing.sheet().width() - width - 2 * PADDING;
    double x = Math.max(PADDING, Math.min(most, wanted.x()));
    double y =
        Math.max(SIZE + PADDING, Math.min(drawing.sheet().height() - 2 * PADDING, wanted.y()));
    Point left = new Point(x - PADDING, y - SIZE - PADDING + 0.6);
    Point right = new Point(x + width + PADDING, y + PADDING);
    Point target = target(note.part(), left, right);
    Point from =
        new Point(
            Math.max(left.x(), Math.min(right.x(), target.x())),
            target.y() < (left.y() + right.y()) / 2 ? left.y() : right.y());
    boolean beside = target.x() < left.x() || target.x() > right.x();
    Point start =
        beside
            ? new Point(target.x() < left.x() ? left.x() : right.x(), (left.y() + right.y()) / 2)
            : from;
    drawing.line(Tag.of(Role.NOTE, part), start, target);
    drawing.disc(Tag.of(Role.NOTE, part), target, 0.6, true);
    List<Point> plate =
        List.of(left, new Point(right.x(), left.y()), right, new Point(left.x(), right.y()));
    drawing.area(Tag.of(Role.NOTE_PLATE, part, Feature.NOTE), plate);
    drawing.outline(Tag.of(Role.NOTE, part), plate);
    drawing.text(Tag.of(Role.NOTE, part), x, y, note.text(), Mark.Anchor.START, SIZE);
  }

  private double middle(Part part) {
    return switch (part.kind()) {
      case ELEMENT -> (layout.from(part.index()) + layout.to(part.index())) / 2;
      case HEAD -> layout.top() / 2;
      case SHANK -> layout.stack() / 2;
      default -> layout.stack();
    };
  }

  /** The place inside the part that is nearest to the words, on their side of the axis. */
  private Point target(Part part, Point left, Point right) {
    double wordsX = (left.x() + right.x()) / 2;
    int side = wordsX < drawing.sheet().axisX() ? -1 : 1;
    double inner = 0;
    double outer = layout.joint().fastener().head().rim() / 2;
    double top = layout.top();
    double bottom = 0;
    if (part.isElement()) {
      inner = layout.holeRadius(part.index());
      outer =
          Math.min(
              layout.reach(), layout.joint().elements().get(part.index()).outline().rightReach());
      top = layout.from(part.index());
      bottom = layout.to(part.index());
    } else if (part.kind() == Part.Kind.ANCHOR) {
      outer = layout.nutReach();
      top = layout.stack();
      bottom = layout.bottom();
    } else if (part.kind() == Part.Kind.SHANK) {
      outer = layout.joint().fastener().thread().diameter() / 2;
      top = 0;
      bottom = layout.stack();
    }
    double radius = inner + 0.75 * Math.max(0, outer - inner);
    double y = (left.y() + right.y()) / 2;
    double high = drawing.sheet().y(top + 0.25 * (bottom - top));
    double low = drawing.sheet().y(bottom - 0.25 * (bottom - top));
    return new Point(drawing.sheet().x(side * radius), Math.max(high, Math.min(low, y)));
  }
}

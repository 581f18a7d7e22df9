package clampwright.figure;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Reason;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Says at the part to blame why there is no solution: notes in the left column, where the call-outs
 * of a solved joint stand, each with a leader to its part.
 */
final class Problems {
  private static final double SIZE = 2.9;
  private static final double LINE = 3.7;
  private static final double PADDING = 1.6;
  private static final double GAP = 1.5;
  private static final double TOP = 9;

  private final Drawing drawing;
  private final StackLayout layout;
  private final Sketch sketch;

  Problems(Drawing drawing, StackLayout layout, Sketch sketch) {
    this.drawing = drawing;
    this.layout = layout;
    this.sketch = sketch;
  }

  void draw(Assessment.Unsolved unsolved) {
    List<Note> notes = new ArrayList<>();
    unsolved.reasons().stream()
        .sorted(Comparator.comparingDouble(reason -> position(reason.part())))
        .forEach(reason -> notes.add(note(reason)));
    double bottom = drawing.sheet().height() - 8;
    double below = bottom;
    for (int i = notes.size() - 1; i >= 0; i--) {
      double wanted = drawing.sheet().y(position(notes.get(i).part())) - notes.get(i).height() / 2;
      notes.get(i).top = Math.min(wanted, below - notes.get(i).height());
      below = notes.get(i).top - GAP;
    }
    double above = TOP;
    for (Note note : notes) {
      note.top = Math.max(note.top, above);
      above = note.top + note.height() + GAP;
      draw(note);
    }
  }

  /** One reason, in lines, and where it goes. */
  private static final class Note {
    private final Part part;
    private final List<String> lines;
    private double top;

    Note(Part part, List<String> lines) {
      this.part = part;
      this.lines = lines;
    }

    Part part() {
      return part;
    }

    double height() {
      return lines.size() * LINE + 2 * PADDING - (LINE - SIZE);
    }
  }

  private Note note(Reason reason) {
    String words = Sentences.reason(reason, sketch.units());
    double room = CallOuts.WIDTH - 2 * PADDING;
    return new Note(reason.part(), TextWidth.wrapped(words, room, SIZE, Mark.Weight.BOLD));
  }

  private void draw(Note note) {
    Tag tag = Tag.of(Role.PROBLEM, note.part());
    double right = CallOuts.LEFT + CallOuts.WIDTH;
    double bottom = note.top + note.height();
    double middle = (note.top + bottom) / 2;
    int index = note.part().index();
    if (note.part().isElement() && index < layout.joint().elements().size()) {
      double reach =
          Math.min(layout.reach(), layout.joint().elements().get(index).outline().leftReach());
      double from = (layout.holeRadius(index) + Math.max(reach, layout.holeRadius(index))) / 2;
      Point at = drawing.at(-from, position(note.part()));
      drawing.path(tag, List.of(new Point(right, middle), new Point(right + 3, middle), at));
      drawing.disc(tag, at, 0.9, true);
    }
    List<Point> plate =
        List.of(
            new Point(CallOuts.LEFT, note.top),
            new Point(right, note.top),
            new Point(right, bottom),
            new Point(CallOuts.LEFT, bottom));
    drawing.area(Tag.of(Role.PROBLEM_PLATE, note.part()), plate);
    drawing.outline(tag, plate);
    double base = note.top + PADDING + 0.82 * SIZE;
    for (int i = 0; i < note.lines.size(); i++) {
      drawing.text(
          tag,
          CallOuts.LEFT + PADDING,
          base + i * LINE,
          note.lines.get(i),
          Mark.Anchor.START,
          SIZE,
          Mark.Weight.BOLD);
    }
  }

  private double position(Part part) {
    boolean there = part.isElement() && part.index() < layout.joint().elements().size();
    return there ? (layout.from(part.index()) + layout.to(part.index())) / 2 : layout.top() / 2;
  }
}

package clampwright.figure;

import clampwright.figure.SectionFigure.Options;
import clampwright.joint.Feature;
import clampwright.joint.Part;
import java.util.ArrayList;
import java.util.List;

/** What an editor shows on top of the section: selection, grips, what lies under the pointer. */
final class Handles {
  private final Drawing drawing;
  private final StackLayout layout;

  Handles(Drawing drawing, StackLayout layout) {
    this.drawing = drawing;
    this.layout = layout;
  }

  void draw(Options options) {
    options.hot().ifPresent(this::hot);
    int count = layout.joint().elements().size();
    if (options.selected().isElement() && options.selected().index() < count) {
      selection(options.selected().index());
    }
    if (options.selected().isNote()) {
      note(options.selected());
    }
    for (int i = 0; count > 0 && i <= count; i++) {
      insertGrip(i);
    }
  }

  /** Traces again whatever the pointer is on. */
  private void hot(Tag hot) {
    List<Mark> traced = new ArrayList<>();
    for (Mark mark : drawing.marks()) {
      if (mark instanceof Mark.Arrow arrow && isOf(arrow, hot)) {
        Tag traces = new Tag(Role.HOT, hot.part(), hot.feature());
        traced.add(new Mark.Path(traces, List.of(arrow.from(), arrow.to()), false));
      }
      if (mark instanceof Mark.Path path && isOf(path, hot)) {
        traced.add(
            new Mark.Path(
                new Tag(Role.HOT, hot.part(), hot.feature()), path.points(), path.closed()));
      }
    }
    traced.forEach(drawing::add);
  }

  private static boolean isOf(Mark mark, Tag hot) {
    return mark.tag().part().equals(hot.part())
        && hot.feature().isPresent()
        && mark.tag().feature().equals(hot.feature());
  }

  private void note(Part note) {
    List<Mark> plates =
        drawing.marks().stream()
            .filter(mark -> mark.role() == Role.NOTE_PLATE && mark.tag().part().equals(note))
            .toList();
    for (Mark plate : plates) {
      drawing.outline(Tag.of(Role.SELECTION, note), ((Mark.Area) plate).points());
    }
  }

  private void selection(int i) {
    Part part = Part.element(i);
    LayerDrawing layers = new LayerDrawing(drawing, layout);
    drawing.outline(Tag.of(Role.SELECTION, part), layers.half(i, -1));
    drawing.outline(Tag.of(Role.SELECTION, part), layers.half(i, 1));
    double reach =
        Math.min(layout.reach(), layout.joint().elements().get(i).outline().rightReach());
    double middle = (layout.holeRadius(i) + reach) / 2;
    drawing.disc(
        Tag.of(Role.GRIP, part, Feature.FACE), drawing.at(middle, layout.to(i)), 1.1, false);
  }

  /** A small + in the gutter between bolt axis and names, at each interface. */
  private void insertGrip(int i) {
    Tag tag = Tag.of(Role.INSERT_GRIP, Part.element(i), Feature.INSERT);
    double y = drawing.sheet().y(layout.from(i));
    double x = drawing.sheet().x(-layout.reach()) - 2.6;
    drawing.disc(tag, new Point(x, y), 1.3, false);
    drawing.line(tag, new Point(x - 0.7, y), new Point(x + 0.7, y));
    drawing.line(tag, new Point(x, y - 0.7), new Point(x, y + 0.7));
  }
}

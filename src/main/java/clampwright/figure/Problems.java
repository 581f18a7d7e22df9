package clampwright.figure;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Reason;
import java.util.List;

/** Says at the part to blame why there is no solution. */
final class Problems {
  private final Drawing drawing;
  private final StackLayout layout;
  private final Sketch sketch;

  Problems(Drawing drawing, StackLayout layout, Sketch sketch) {
    this.drawing = drawing;
    this.layout = layout;
    this.sketch = sketch;
  }

  void draw(Assessment.Unsolved unsolved) {
    List<Reason> reasons = unsolved.reasons();
    double[] wanted = new double[reasons.size()];
    for (int i = 0; i < wanted.length; i++) {
      wanted[i] = drawing.sheet().y(position(reasons.get(i).part()));
    }
    java.util.Arrays.sort(wanted);
    double bottom = drawing.sheet().height() - 8;
    double spacing = LabelColumn.spacing(wanted.length, 5.5, 12, bottom);
    double[] places = LabelColumn.placed(wanted, spacing, 12, bottom);
    List<Reason> ordered =
        reasons.stream()
            .sorted(java.util.Comparator.comparingDouble(reason -> position(reason.part())))
            .toList();
    for (int i = 0; i < places.length; i++) {
      Reason reason = ordered.get(i);
      Tag tag = Tag.of(Role.PROBLEM, reason.part());
      if (reason.part().isElement()) {
        Point at =
            new Point(drawing.sheet().x(-layout.holeRadius(reason.part().index())), wanted[i]);
        drawing.disc(tag, at, 0.9, true);
      }
      drawing.text(
          tag,
          CallOuts.LEFT,
          places[i] + 1,
          Sentences.reason(reason, sketch.units()),
          Mark.Anchor.START,
          3.1,
          Mark.Weight.BOLD);
    }
  }

  private double position(Part part) {
    boolean there = part.isElement() && part.index() < layout.joint().elements().size();
    return there ? (layout.from(part.index()) + layout.to(part.index())) / 2 : layout.top() - 1;
  }
}

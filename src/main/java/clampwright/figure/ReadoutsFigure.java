package clampwright.figure;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.LoadSharing;
import clampwright.mechanics.checks.Checks;
import clampwright.mechanics.checks.Verdict;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.ArrayList;
import java.util.List;

/** The readouts as a small table: names left, values right, then the margins that apply. */
final class ReadoutsFigure {
  private static final double SIZE = 2.9;
  private static final double LINE = 4.4;

  private final Drawing drawing;
  private final double width;
  private double y;

  private ReadoutsFigure(double width) {
    this.width = width;
    drawing = new Drawing(new Sheet(width, 1, 1, 0, 0));
  }

  static Figure of(Sketch sketch, Solved solved, int loadCase, double width) {
    ReadoutsFigure figure = new ReadoutsFigure(width);
    LoadSharing sharing = solved.cases().get(loadCase);
    figure.row(sketch, "members k", Dimension.STIFFNESS, sharing.memberStiffness());
    figure.row(sketch, "bolt k", Dimension.STIFFNESS, solved.bolt().stiffness());
    figure.row(sketch, "load factor Φ", Dimension.RATIO, sharing.loadFactor());
    figure.row(sketch, "parts at, least", Dimension.FORCE, sharing.partingLoad());
    figure.row(sketch, "bolt load, most", Dimension.FORCE, sharing.boltLoad());
    figure.row(sketch, "clamp load, least", Dimension.FORCE, sharing.clampLoad());
    figure.y += 1.5;
    List<Verdict.Judged> judged = new ArrayList<>();
    for (Verdict verdict : Checks.of(sketch.joint(), solved)) {
      if (verdict instanceof Verdict.Judged each) {
        judged.add(each);
      }
    }
    judged.forEach(
        each ->
            figure.row(
                "margin, " + Sentences.check(each.kind()),
                Verdicts.margin(each.margin()) + (each.passes() ? "" : " fails"),
                each.passes() ? Role.NAME : Role.PROBLEM));
    return new Figure("Readouts", width, figure.y + 1, figure.drawing.marks());
  }

  private void row(Sketch sketch, String name, Dimension dimension, double value) {
    row(name, Quantities.text(dimension, sketch.units(), value), Role.NAME);
  }

  private void row(String name, String value, Role role) {
    y += LINE;
    drawing.text(Tag.of(Role.CAPTION, Part.JOINT), 0, y, name, Mark.Anchor.START, SIZE);
    drawing.text(
        Tag.of(role, Part.JOINT), width, y, value, Mark.Anchor.END, SIZE, Mark.Weight.BOLD);
  }
}

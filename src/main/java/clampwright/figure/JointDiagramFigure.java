package clampwright.figure;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.LoadSharing;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.ArrayList;
import java.util.List;

/**
 * The joint diagram: bolt force over its stretch, member force over what is left of their squeeze.
 * From the preload on the lines are those of the parts that the load acts on, with 1/k_b* = 1/k_b +
 * (1 − n)/k_m and 1/k_m* = n/k_m, so that the load shares out as the load factor says.
 */
public final class JointDiagramFigure {
  private static final double LEFT = 16;
  private static final double TOP = 6;
  private static final double BOTTOM = 10;
  private static final double RIGHT = 8;
  private static final double SIZE = 2.9;

  private final Sketch sketch;
  private final LoadSharing sharing;
  private final Drawing drawing;
  private final Axis force;
  private final Axis stretch;
  private final double bolt;
  private final double boltShared;
  private final double membersShared;

  private JointDiagramFigure(
      Sketch sketch, Solved solved, int loadCase, double width, double height) {
    this.sketch = sketch;
    sharing = solved.cases().get(loadCase);
    bolt = solved.bolt().stiffness();
    double n = sharing.introduction();
    boltShared = 1 / (1 / bolt + (1 - n) / sharing.memberStiffness());
    membersShared = sharing.memberStiffness() / n;
    drawing = new Drawing(new Sheet(width, height, 1, 0, 0));
    double highest =
        Math.max(
            Math.max(sharing.boltLoad(), sharing.preload().max()),
            Math.max(sharing.axialMax(), sharing.partingLoad(sharing.preload().nominal())));
    force = Axis.holding(Dimension.FORCE, sketch.units(), 0, Math.max(highest, 1), 5);
    double longest =
        Math.max(separation(sharing.preload().max()), stretchAt(sharing.preload().max(), highest));
    stretch = Axis.holding(Dimension.SETTLING, sketch.units(), 0, Math.max(longest, 1e-4), 6);
  }

  /**
   * Draws the diagram of one load case.
   *
   * @param loadCase index
   * @param width of the sheet [mm]
   * @param height of the sheet [mm]
   */
  public static Figure of(Sketch sketch, Solved solved, int loadCase, double width, double height) {
    JointDiagramFigure figure = new JointDiagramFigure(sketch, solved, loadCase, width, height);
    figure.draw();
    return new Figure("Joint diagram", width, height, figure.drawing.marks());
  }

  private void draw() {
    axes();
    double least = Math.max(0, sharing.preload().min());
    double nominal = Math.max(0, sharing.preload().nominal());
    double most = Math.max(0, sharing.preload().max());
    if (most - least > 1e-9 * most) {
      lines(least, Role.BOLT_LINE_FAINT, Role.MEMBERS_LINE_FAINT);
      lines(most, Role.BOLT_LINE_FAINT, Role.MEMBERS_LINE_FAINT);
    }
    lines(nominal, Role.BOLT_LINE, Role.MEMBERS_LINE);
    legend();
    preloadMark(nominal);
    parting(nominal);
    load(nominal);
  }

  /** Stretch of the bolt at its preload [mm]. */
  private double stretched(double preload) {
    return Math.max(0, preload) / bolt;
  }

  /** Stretch at which the members part [mm]. */
  private double separation(double preload) {
    return stretched(preload) + Math.max(0, preload) / membersShared;
  }

  /** Stretch at a bolt force beyond the preload, before or after parting [mm]. */
  private double stretchAt(double preload, double boltForce) {
    double parts = sharing.partingLoad(preload);
    double shared = stretched(preload) + (Math.min(boltForce, parts) - preload) / boltShared;
    return shared + Math.max(0, boltForce - parts) / bolt;
  }

  private Point at(double length, double newtons) {
    double width = drawing.sheet().width() - LEFT - RIGHT;
    double height = drawing.sheet().height() - TOP - BOTTOM;
    return new Point(
        LEFT + stretch.share(length) * width, TOP + (1 - force.share(newtons)) * height);
  }

  private void axes() {
    Tag line = Tag.of(Role.SCALE, Part.JOINT);
    Tag text = Tag.of(Role.SCALE_TEXT, Part.JOINT);
    drawing.line(line, at(0, 0), at(stretch.to(), 0));
    drawing.line(line, at(0, 0), at(0, force.to()));
    for (double tick : force.ticks()) {
      Point p = at(0, tick);
      drawing.line(line, new Point(p.x() - 1.2, p.y()), p);
      drawing.text(text, p.x() - 2.2, p.y() + 0.95, force.label(tick), Mark.Anchor.END, 2.7);
    }
    for (double tick : stretch.ticks()) {
      Point p = at(tick, 0);
      drawing.line(line, p, new Point(p.x(), p.y() + 1.2));
      drawing.text(text, p.x(), p.y() + 4.6, stretch.label(tick), Mark.Anchor.MIDDLE, 2.7);
    }
    drawing.text(
        text,
        1,
        TOP - 1.8,
        Quantities.unit(Dimension.FORCE, sketch.units()),
        Mark.Anchor.START,
        2.7);
    Point end = at(stretch.to(), 0);
    drawing.text(
        text,
        end.x(),
        end.y() + 8.4,
        "stretch of the bolt, " + Quantities.unit(Dimension.SETTLING, sketch.units()),
        Mark.Anchor.END,
        2.7);
  }

  private void lines(double preload, Role boltRole, Role membersRole) {
    double parts = sharing.partingLoad(preload);
    double top = Math.max(preload, Math.max(parts, sharing.axialMax()));
    List<Point> line = new ArrayList<>();
    line.add(at(0, 0));
    line.add(at(stretched(preload), preload));
    line.add(at(stretchAt(preload, parts), parts));
    if (top > parts) {
      line.add(at(stretchAt(preload, top), top));
    }
    drawing.path(Tag.of(boltRole, Part.SHANK), line);
    drawing.path(
        Tag.of(membersRole, Part.JOINT),
        List.of(at(stretched(preload), preload), at(separation(preload), 0)));
  }

  private void preloadMark(double preload) {
    Tag tag = Tag.of(Role.RUNG_PRELOAD, Part.PRELOAD);
    Point point = at(stretched(preload), preload);
    drawing.line(
        Tag.of(Role.LEADER, Part.PRELOAD), new Point(at(0, preload).x(), point.y()), point);
    drawing.disc(tag, point, 0.8, true);
    String text = "preload, nominal";
    drawing.firstFree(
        List.of(
            label(tag, point.x() - 1.5, point.y() - 1.4, text, Mark.Anchor.END),
            label(tag, point.x(), point.y() - 2.4, text, Mark.Anchor.MIDDLE),
            label(tag, point.x() + 2.5, point.y() + 3.2, text, Mark.Anchor.START),
            label(tag, point.x() + 2, point.y() - 3, text, Mark.Anchor.START),
            label(tag, point.x() - 1.5, point.y() + 5, text, Mark.Anchor.END)));
  }

  private void parting(double preload) {
    Point point = at(separation(preload), 0);
    Tag tag = Tag.of(Role.RUNG, Part.LOAD);
    drawing.disc(tag, point, 0.8, false);
    drawing.firstFree(
        List.of(
            label(tag, point.x() + 1.5, point.y() - 1.4, "parts", Mark.Anchor.START),
            label(tag, point.x() + 1.5, point.y() - 5, "parts", Mark.Anchor.START),
            label(tag, point.x() - 1.5, point.y() - 1.4, "parts", Mark.Anchor.END)));
  }

  /** The outside load between member line and bolt line, at the stretch it brings. */
  private void load(double preload) {
    double axial = sharing.axialMax();
    if (axial == 0) {
      return;
    }
    double boltForce = sharing.boltLoad(preload, axial);
    double x = stretchAt(preload, boltForce);
    Tag tag = Tag.of(Role.LOAD, Part.LOAD);
    Point upper = at(x, boltForce);
    Point lower = at(x, boltForce - axial);
    drawing.add(new Mark.Arrow(tag, lower, upper, true, true));
    String text = "load " + Quantities.text(Dimension.FORCE, sketch.units(), axial);
    double middle = (upper.y() + lower.y()) / 2 + 1;
    boolean onAxis = lower.y() + 5 > at(0, 0).y();
    Mark.Text below = label(tag, upper.x() - 2, lower.y() + 4, text, Mark.Anchor.END);
    Mark.Text beside = label(tag, upper.x() + 2, middle, text, Mark.Anchor.START);
    Mark.Text before = label(tag, upper.x() - 2, middle, text, Mark.Anchor.END);
    Mark.Text above = label(tag, upper.x() + 2, upper.y() - 2, text, Mark.Anchor.START);
    drawing.firstFree(
        onAxis ? List.of(beside, before, above) : List.of(below, above, beside, before));
  }

  private static Mark.Text label(Tag tag, double x, double y, String text, Mark.Anchor anchor) {
    Mark.Weight weight = tag.role() == Role.LOAD ? Mark.Weight.BOLD : Mark.Weight.REGULAR;
    return new Mark.Text(tag, new Point(x, y), text, anchor, SIZE, weight);
  }

  private void legend() {
    double x = LEFT + 6;
    key(x, TOP, Role.BOLT_LINE, "bolt");
    key(x, TOP + 4.6, Role.MEMBERS_LINE, "members");
    if (sharing.preload().max() > sharing.preload().min()) {
      key(x, TOP + 9.2, Role.BOLT_LINE_FAINT, "least, most preload");
    }
  }

  private void key(double x, double y, Role role, String text) {
    drawing.line(Tag.of(role, Part.JOINT), new Point(x, y), new Point(x + 6, y));
    drawing.text(Tag.of(Role.NAME, Part.JOINT), x + 7.5, y + 1, text, Mark.Anchor.START, SIZE);
  }
}

package clampwright.figure;

import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.LoadSharing;
import clampwright.mechanics.checks.BoltLimits;
import clampwright.mechanics.checks.Stripping;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * The load ladder: one force axis with the preload band, the bolt's load, its limits, the load that
 * parts the joint and the load that acts, so that one sees which comes first.
 */
public final class LoadLadderFigure {
  private static final double AXIS = 13;
  private static final double BAND = 5;
  private static final double RUNG_END = 21;
  private static final double LABELS = 26;
  private static final double SIZE = 2.9;
  private static final double SPACING = 4.3;

  /** A force with its name. */
  private record Rung(String name, double force, Role role) {}

  private LoadLadderFigure() {}

  /**
   * Draws the ladder of one load case.
   *
   * @param loadCase index
   * @param width of the sheet [mm]
   * @param height of the sheet [mm]
   */
  public static Figure of(Sketch sketch, Solved solved, int loadCase, double width, double height) {
    List<Rung> rungs = rungs(sketch.joint(), solved, loadCase);
    double low = rungs.stream().mapToDouble(Rung::force).min().orElse(0);
    double high = rungs.stream().mapToDouble(Rung::force).max().orElse(1);
    Axis axis =
        Axis.holding(Dimension.FORCE, sketch.units(), Math.min(0, low), Math.max(high, low + 1), 5);
    Drawing drawing = new Drawing(new Sheet(width, height, 1, 0, 0));
    double top = 3;
    double bottom = height - 3;
    scale(drawing, axis, top, bottom);
    LoadSharing sharing = solved.cases().get(loadCase);
    drawing.area(
        Tag.of(Role.PRELOAD_BAND, Part.PRELOAD),
        band(
            y(axis, sharing.preload().max(), top, bottom),
            y(axis, sharing.preload().min(), top, bottom)));
    rungs.sort(Comparator.comparingDouble(Rung::force).reversed());
    double[] wanted =
        rungs.stream().mapToDouble(rung -> y(axis, rung.force, top, bottom)).toArray();
    double spacing = LabelColumn.spacing(wanted.length, SPACING, top, bottom);
    double[] places = LabelColumn.placed(wanted, spacing, top, bottom);
    for (int i = 0; i < places.length; i++) {
      rung(drawing, sketch, rungs.get(i), wanted[i], places[i], Math.min(SIZE, 0.8 * spacing));
    }
    return new Figure("Load ladder", width, height, drawing.marks());
  }

  private static List<Rung> rungs(Joint joint, Solved solved, int loadCase) {
    LoadSharing sharing = solved.cases().get(loadCase);
    BoltLimits limits = BoltLimits.of(joint, Stripping.of(joint, solved));
    List<Rung> rungs = new ArrayList<>();
    rungs.add(new Rung("ultimate", limits.ultimate(), Role.RUNG));
    if (!Double.isNaN(limits.yieldLoad())) {
      rungs.add(new Rung("yield", limits.yieldLoad(), Role.RUNG));
    }
    rungs.add(new Rung("bolt load, most", sharing.boltLoad(), Role.RUNG_BOLT));
    rungs.add(new Rung("preload, nominal", sharing.preload().nominal(), Role.RUNG_PRELOAD));
    rungs.add(new Rung("parts at, least", sharing.partingLoad(), Role.RUNG));
    rungs.add(new Rung("axial load", sharing.axialMax(), Role.RUNG));
    return rungs;
  }

  private static double y(Axis axis, double force, double top, double bottom) {
    return bottom - axis.share(force) * (bottom - top);
  }

  private static void scale(Drawing drawing, Axis axis, double top, double bottom) {
    drawing.line(Tag.of(Role.SCALE, Part.JOINT), new Point(AXIS, top), new Point(AXIS, bottom));
    for (double tick : axis.ticks()) {
      double y = y(axis, tick, top, bottom);
      drawing.line(Tag.of(Role.SCALE, Part.JOINT), new Point(AXIS - 1.2, y), new Point(AXIS, y));
      drawing.text(
          Tag.of(Role.SCALE_TEXT, Part.JOINT),
          AXIS - 2.2,
          y + 0.95,
          axis.label(tick),
          Mark.Anchor.END,
          2.7);
    }
  }

  private static List<Point> band(double from, double to) {
    double left = AXIS + 1.5;
    return List.of(
        new Point(left, from),
        new Point(left + BAND, from),
        new Point(left + BAND, to),
        new Point(left, to));
  }

  private static void rung(
      Drawing drawing, Sketch sketch, Rung rung, double at, double place, double size) {
    Part part = rung.role == Role.RUNG_PRELOAD ? Part.PRELOAD : Part.LOAD;
    Tag tag = Tag.of(rung.role, part);
    drawing.line(tag, new Point(AXIS, at), new Point(RUNG_END, at));
    drawing.path(
        Tag.of(Role.LEADER, part),
        List.of(
            new Point(RUNG_END, at), new Point(LABELS - 2.5, place), new Point(LABELS - 1, place)));
    double base = place + 0.35 * size;
    drawing.text(tag, LABELS, base, rung.name, Mark.Anchor.START, size);
    drawing.text(
        tag,
        drawing.sheet().width() - 0.5,
        base,
        Quantities.number(Dimension.FORCE, sketch.units(), rung.force),
        Mark.Anchor.END,
        size,
        Mark.Weight.BOLD);
  }
}

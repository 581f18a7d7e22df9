package clampwright.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Sketch;
import clampwright.joint.Tightening;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import clampwright.quantity.Dimension;
import clampwright.quantity.UnitSystem;
import clampwright.store.Samples;
import clampwright.store.Stored;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The load ladder and the joint diagram as geometry. */
class LoadFiguresTest {
  private static final double WIDTH = 73;
  private static final double HEIGHT = 40;

  static Stream<Sketch> samples() {
    return Samples.all().stream().map(sample -> ((Stored.Opened) Samples.open(sample)).sketch());
  }

  private static Solved solved(Sketch sketch) {
    return (Solved) Assessment.of(sketch.joint());
  }

  private static Sketch loaded(double axial) {
    Sketch sketch = samples().findFirst().orElseThrow();
    LoadCase load = LoadCase.steady("Load", axial, 0.5);
    Joint joint =
        sketch
            .joint()
            .withTightening(Tightening.force(20_000))
            .withService(sketch.joint().service().withLoads(List.of(load)));
    return sketch.withJoint(joint);
  }

  @ParameterizedTest
  @MethodSource("samples")
  void everythingLiesOnItsSheet(Sketch sketch) {
    for (int i = 0; i < sketch.joint().service().loads().size(); i++) {
      checkInside(LoadLadderFigure.of(sketch, solved(sketch), i, WIDTH, HEIGHT));
      checkInside(JointDiagramFigure.of(sketch, solved(sketch), i, 190, 45));
    }
  }

  private static void checkInside(Figure figure) {
    for (Mark mark : figure.marks()) {
      for (Point point : Geometry.points(mark)) {
        boolean inside =
            point.x() >= 0
                && point.x() <= figure.width()
                && point.y() >= 0
                && point.y() <= figure.height();
        assertTrue(inside, () -> figure.title() + ": " + mark);
      }
    }
  }

  /** Labels of the ladder keep apart, whatever comes close to what. */
  @ParameterizedTest
  @MethodSource("samples")
  void rungsDoNotOverlap(Sketch sketch) {
    List<Mark.Text> names =
        LoadLadderFigure.of(sketch, solved(sketch), 0, WIDTH, HEIGHT).marks().stream()
            .filter(Mark.Text.class::isInstance)
            .map(Mark.Text.class::cast)
            .filter(text -> text.anchor() == Mark.Anchor.START)
            .toList();
    for (int i = 1; i < names.size(); i++) {
      assertTrue(names.get(i).at().y() - names.get(i - 1).at().y() >= names.get(i).size());
    }
  }

  /** On both lines at the load: the bolt takes Φ of it more, the members the rest less. */
  @Test
  void theDiagramSharesTheLoadByTheLoadFactor() {
    Sketch sketch = loaded(8_000);
    Solved solved = solved(sketch);
    Figure figure = JointDiagramFigure.of(sketch, solved, 0, 190, 60);
    Mark.Arrow load =
        figure.marks().stream()
            .filter(Mark.Arrow.class::isInstance)
            .map(Mark.Arrow.class::cast)
            .findFirst()
            .orElseThrow();
    Mark.Path members = path(figure, Role.MEMBERS_LINE);
    Mark.Path bolt = path(figure, Role.BOLT_LINE);
    assertEquals(load.from().y(), heightAt(members, load.from().x()), 1e-9);
    assertEquals(load.to().y(), heightAt(bolt, load.to().x()), 1e-9);
    double perNewton = (load.from().y() - load.to().y()) / 8_000;
    double preload = bolt.points().get(1).y();
    double more = (preload - load.to().y()) / perNewton;
    assertEquals(solved.sharing().loadFactor() * 8_000, more, 1e-6);
  }

  /** Beyond parting the bolt carries all of the load, and the arrow stands on the axis. */
  @Test
  void aPartedJointStandsOnTheAxis() {
    Sketch sketch = loaded(40_000);
    Figure figure = JointDiagramFigure.of(sketch, solved(sketch), 0, 190, 60);
    Mark.Arrow load =
        (Mark.Arrow)
            figure.marks().stream().filter(Mark.Arrow.class::isInstance).findFirst().orElseThrow();
    Mark.Path members = path(figure, Role.MEMBERS_LINE);
    assertEquals(members.points().get(1).y(), load.from().y(), 1e-9);
    assertTrue(load.from().x() > members.points().get(1).x());
  }

  private static Mark.Path path(Figure figure, Role role) {
    return figure.marks().stream()
        .filter(mark -> mark.role() == role)
        .map(Mark.Path.class::cast)
        .filter(path -> path.points().size() > 2 || role == Role.MEMBERS_LINE)
        .findFirst()
        .orElseThrow();
  }

  private static double heightAt(Mark.Path path, double x) {
    List<Point> points = path.points();
    for (int i = 0; i + 1 < points.size(); i++) {
      Point a = points.get(i);
      Point b = points.get(i + 1);
      if (x >= a.x() - 1e-9 && x <= b.x() + 1e-9) {
        return a.y() + (b.y() - a.y()) * (x - a.x()) / (b.x() - a.x());
      }
    }
    throw new AssertionError("no line at " + x);
  }

  @ParameterizedTest
  @CsvSource({"0, 46391, 5, 10", "0, 900, 5, 0.2", "-4000, 12000, 4, 5"})
  void ticksAreRound(double low, double high, int count, double step) {
    Axis axis = Axis.holding(Dimension.FORCE, UnitSystem.METRIC, low, high, count);
    assertEquals(step, axis.step(), 1e-12);
    assertTrue(axis.from() <= low && axis.to() >= high);
    List<Double> ticks = axis.ticks();
    assertEquals(axis.to(), ticks.get(ticks.size() - 1), 1e-9);
  }

  @ParameterizedTest
  @CsvSource({
    "0.004, +0.00",
    "-0.004, −0.0040",
    "-0.00001, −0.0001",
    "0.309, +0.31",
    "-0.5, −0.50",
    "1, +1.00",
    "250, > +99",
  })
  void marginsAreNeverRoundedAcrossZero(double margin, String text) {
    assertEquals(text, Verdicts.margin(margin));
  }
}

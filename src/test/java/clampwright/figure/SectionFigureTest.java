package clampwright.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Element;
import clampwright.joint.Feature;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.store.Samples;
import clampwright.store.Stored;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class SectionFigureTest {
  private static final double WIDTH = 190;
  private static final double HEIGHT = 150;

  static Stream<Sketch> samples() {
    return Samples.all().stream().map(sample -> ((Stored.Opened) Samples.open(sample)).sketch());
  }

  @ParameterizedTest
  @MethodSource("samples")
  void everyElementHasItsMarks(Sketch sketch) {
    Figure figure = drawn(sketch, SectionFigure.Options.PLAIN);
    int count = sketch.joint().elements().size();
    assertEquals(count, marks(figure, Mark.Hatch.class).size());
    assertEquals(count, marks(figure, Mark.Pill.class).size());
    assertEquals(
        count,
        figure.marks().stream().filter(mark -> mark.role() == Role.EFFECTIVE_CYLINDER).count());
  }

  @ParameterizedTest
  @MethodSource("samples")
  void hatchingStaysInsideItsPart(Sketch sketch) {
    for (Mark.Hatch hatch : marks(drawn(sketch, SectionFigure.Options.PLAIN), Mark.Hatch.class)) {
      assertFalse(hatch.strokes().isEmpty());
      for (int i = 0; i + 1 < hatch.strokes().size(); i += 2) {
        Point a = hatch.strokes().get(i);
        Point b = hatch.strokes().get(i + 1);
        Point middle = new Point((a.x() + b.x()) / 2, (a.y() + b.y()) / 2);
        boolean point = Math.hypot(a.x() - b.x(), a.y() - b.y()) < 1e-9;
        assertTrue(point || HitTest.inside(hatch.polygon(), middle));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("samples")
  void theWholeJointFitsItsSheet(Sketch sketch) {
    Figure figure = drawn(sketch, SectionFigure.Options.PLAIN);
    for (Mark.Area area : marks(figure, Mark.Area.class)) {
      for (Point point : area.points()) {
        assertTrue(point.x() > 0 && point.x() < WIDTH, () -> area.tag() + " " + point);
        assertTrue(point.y() > 0 && point.y() < HEIGHT, () -> area.tag() + " " + point);
      }
    }
  }

  @Test
  void neighboursAreHatchedTheOtherWay() {
    Sketch sketch = samples().findFirst().orElseThrow();
    List<Mark.Hatch> hatches = marks(drawn(sketch, SectionFigure.Options.PLAIN), Mark.Hatch.class);
    for (int i = 1; i < hatches.size(); i++) {
      assertTrue(slope(hatches.get(i)) * slope(hatches.get(i - 1)) < 0);
    }
  }

  /** Labels keep their order and distance and stay on the sheet, wherever they want to be. */
  @Property
  void labelsNeverOverlap(
      @ForAll @Size(min = 1, max = 20) List<@DoubleRange(min = -50, max = 300) Double> wanted,
      @ForAll @IntRange(min = 1, max = 12) int usual) {
    double[] sorted = wanted.stream().mapToDouble(Double::doubleValue).sorted().toArray();
    double spacing = LabelColumn.spacing(sorted.length, usual, 10, 140);
    double[] placed = LabelColumn.placed(sorted, spacing, 10, 140);
    for (int i = 0; i < placed.length; i++) {
      assertTrue(placed[i] >= 10 - 1e-9 && placed[i] <= 140 + 1e-9);
      assertTrue(i == 0 || placed[i] - placed[i - 1] >= spacing - 1e-9);
    }
  }

  /** Call-outs of a stack of thin shims and thick plates do not overlap. */
  @Property(tries = 100)
  void callOutsNeverOverlap(
      @ForAll @Size(min = 1, max = 20) List<@DoubleRange(min = 0.2, max = 200) Double> stack) {
    Sketch sample = samples().findFirst().orElseThrow();
    Element plate = sample.joint().elements().get(1);
    List<Element> elements = new ArrayList<>();
    stack.forEach(thickness -> elements.add(plate.withThickness(thickness)));
    Joint joint = sample.joint().withElements(elements);
    List<Mark.Pill> pills =
        marks(drawn(sample.withJoint(joint), SectionFigure.Options.PLAIN), Mark.Pill.class);
    for (int i = 0; i < pills.size(); i++) {
      Mark.Pill pill = pills.get(i);
      assertTrue(pill.y() >= 0 && pill.y() + pill.height() <= HEIGHT);
      assertTrue(i == 0 || pill.y() >= pills.get(i - 1).y() + pills.get(i - 1).height());
    }
  }

  /** Names, thicknesses and materials on the right neither overlap nor leave the sheet. */
  @Property(tries = 100)
  void namesNeverOverlap(
      @ForAll @Size(min = 1, max = 20) List<@DoubleRange(min = 0.2, max = 200) Double> stack,
      @ForAll @IntRange(min = 1, max = 60) int letters) {
    Sketch sample = samples().findFirst().orElseThrow();
    Element plate = sample.joint().elements().get(1).withName("n".repeat(letters));
    List<Element> elements = new ArrayList<>();
    stack.forEach(thickness -> elements.add(plate.withThickness(thickness)));
    Sketch sketch = sample.withJoint(sample.joint().withElements(elements));
    List<Mark.Text> texts =
        marks(drawn(sketch, SectionFigure.Options.PLAIN), Mark.Text.class).stream()
            .filter(text -> text.tag().part().isElement())
            .toList();
    for (int i = 0; i < texts.size(); i++) {
      double[] a = Geometry.box(texts.get(i));
      assertTrue(a[0] >= 0 && a[2] <= WIDTH && a[1] >= 0 && a[3] <= HEIGHT, texts.get(i).text());
      for (int j = 0; j < i; j++) {
        double[] b = Geometry.box(texts.get(j));
        boolean apart = a[0] >= b[2] || b[0] >= a[2] || a[1] >= b[3] || b[1] >= a[3];
        assertTrue(apart, texts.get(i).text() + " over " + texts.get(j).text());
      }
    }
  }

  @Test
  void edgesAreFoundBeforeBodies() {
    Sketch sketch = samples().findFirst().orElseThrow();
    Sheet sheet = SectionFigure.fitted(sketch, WIDTH, HEIGHT);
    Figure figure = drawn(sketch, SectionFigure.Options.PLAIN);
    Element washer = sketch.joint().elements().get(0);
    double lid = washer.thickness() + sketch.joint().elements().get(1).thickness();
    double hole = sketch.joint().elements().get(1).hole() / 2;
    Tag face = HitTest.at(figure, new Point(sheet.x(hole + 1), sheet.y(lid)), 0.6).orElseThrow();
    assertEquals(Part.element(1), face.part());
    assertEquals(Optional.of(Feature.FACE), face.feature());
    Tag body =
        HitTest.at(figure, new Point(sheet.x(hole + 8), sheet.y(lid - 4)), 0.6).orElseThrow();
    assertEquals(Part.element(1), body.part());
    assertEquals(Optional.of(Feature.BODY), body.feature());
    assertTrue(HitTest.at(figure, new Point(1, HEIGHT - 1), 0.6).isEmpty());
  }

  @Test
  void anImpossibleJointShowsItsReasonAndNoCones() {
    Sketch sample = samples().findFirst().orElseThrow();
    Element lid = sample.joint().elements().get(1);
    Sketch sketch = sample.withJoint(sample.joint().withElement(1, lid.withHole(60)));
    Figure figure = drawn(sketch, SectionFigure.Options.PLAIN);
    assertTrue(figure.marks().stream().anyMatch(mark -> mark.role() == Role.PROBLEM));
    assertTrue(figure.marks().stream().noneMatch(mark -> mark.role() == Role.HEAD_CONE));
    assertTrue(marks(figure, Mark.Pill.class).isEmpty());
  }

  @Test
  void zoomingKeepsThePointUnderThePointer() {
    Sheet sheet = new Sheet(WIDTH, HEIGHT, 3, 90, 40);
    Point pointer = new Point(120, 70);
    Sheet zoomed = sheet.zoomed(1.7, pointer);
    assertEquals(sheet.fromAxis(pointer.x()), zoomed.fromAxis(pointer.x()), 1e-12);
    assertEquals(sheet.z(pointer.y()), zoomed.z(pointer.y()), 1e-12);
  }

  private static double slope(Mark.Hatch hatch) {
    Point a = hatch.strokes().get(2);
    Point b = hatch.strokes().get(3);
    return (b.y() - a.y()) / (b.x() - a.x());
  }

  private static Figure drawn(Sketch sketch, SectionFigure.Options options) {
    Sheet sheet = SectionFigure.fitted(sketch, WIDTH, HEIGHT);
    return SectionFigure.of(sketch, Assessment.of(sketch.joint()), sheet, options);
  }

  private static <T extends Mark> List<T> marks(Figure figure, Class<T> kind) {
    return figure.marks().stream().filter(kind::isInstance).map(kind::cast).toList();
  }
}

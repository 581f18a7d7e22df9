package clampwright.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Element;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.store.Samples;
import clampwright.store.Stored;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Pictures that leave the program, as geometry. */
class PictureFigureTest {
  static Stream<Sketch> samples() {
    return Samples.all().stream().map(sample -> ((Stored.Opened) Samples.open(sample)).sketch());
  }

  private static Figure figure(Sketch sketch, Preset preset, Set<Show> shown) {
    return PictureFigure.of(
        sketch,
        Assessment.of(sketch.joint()),
        new PictureFigure.Request(preset, shown, "A caption below", 0));
  }

  @ParameterizedTest
  @MethodSource("samples")
  void nothingLeavesTheSheet(Sketch sketch) {
    for (Preset preset : Preset.values()) {
      checkInside(figure(sketch, preset, EnumSet.allOf(Show.class)));
      checkInside(figure(sketch, preset, Show.USUAL));
    }
  }

  private static void checkInside(Figure figure) {
    for (Mark mark : figure.marks()) {
      for (Point point : Geometry.points(mark)) {
        boolean inside =
            point.x() >= -1e-9
                && point.x() <= figure.width() + 1e-9
                && point.y() >= -1e-9
                && point.y() <= figure.height() + 1e-9;
        assertTrue(inside, () -> figure.width() + " × " + figure.height() + ": " + mark);
      }
    }
  }

  /** From 0.2 mm shims to 200 mm plates, one to twenty of them, on every sheet. */
  @Property(tries = 60)
  void anyStackStaysOnItsSheet(
      @ForAll @Size(min = 1, max = 20) List<@DoubleRange(min = 0.2, max = 200) Double> stack) {
    Sketch sample = samples().findFirst().orElseThrow();
    Element plate = sample.joint().elements().get(1);
    List<Element> elements = new ArrayList<>();
    stack.forEach(thickness -> elements.add(plate.withThickness(thickness)));
    Sketch sketch = sample.withJoint(sample.joint().withElements(elements));
    for (Preset preset : Preset.values()) {
      checkInside(figure(sketch, preset, Show.USUAL));
    }
  }

  /** No word of a picture lies over another, nor over a call-out. */
  @ParameterizedTest
  @MethodSource("samples")
  void wordsNeverOverlap(Sketch sketch) {
    for (Preset preset : Preset.values()) {
      checkApart(figure(sketch, preset, EnumSet.allOf(Show.class)));
      checkApart(figure(sketch, preset, Show.USUAL));
    }
  }

  private static void checkApart(Figure figure) {
    List<Mark> words =
        figure.marks().stream()
            .filter(
                mark ->
                    mark instanceof Mark.Pill
                        || mark instanceof Mark.Text text && !text.text().isEmpty())
            .toList();
    for (int i = 0; i < words.size(); i++) {
      double[] a = Geometry.boxOf(words.get(i));
      for (int j = 0; j < i; j++) {
        double[] b = Geometry.boxOf(words.get(j));
        boolean apart = a[0] >= b[2] || b[0] >= a[2] || a[1] >= b[3] || b[1] >= a[3];
        Mark one = words.get(i);
        Mark other = words.get(j);
        assertTrue(apart, () -> figure.width() + ": " + one + " over " + other);
      }
    }
  }

  @ParameterizedTest
  @EnumSource(Show.class)
  void whatIsNotAskedIsNotDrawn(Show show) {
    Sketch sketch = samples().findFirst().orElseThrow();
    int with = figure(sketch, Preset.SHEET, EnumSet.allOf(Show.class)).marks().size();
    int without =
        figure(sketch, Preset.SHEET, EnumSet.complementOf(EnumSet.of(show))).marks().size();
    assertTrue(without < with, show + ": " + without + " of " + with);
  }

  @Test
  void everyPictureCarriesTheCaution() {
    for (Preset preset : Preset.values()) {
      Figure figure =
          figure(samples().findFirst().orElseThrow(), preset, EnumSet.noneOf(Show.class));
      StringBuilder words = new StringBuilder();
      for (Mark mark : figure.marks()) {
        if (mark instanceof Mark.Text text) {
          words.append(text.text()).append(' ');
        }
      }
      assertTrue(words.toString().contains("local codes, licensed"), words::toString);
    }
  }

  @Test
  void gripsAreForTheScreenOnly() {
    Figure figure =
        figure(samples().findFirst().orElseThrow(), Preset.PAGE, EnumSet.allOf(Show.class));
    assertFalse(figure.marks().stream().anyMatch(mark -> mark.role() == Role.INSERT_GRIP));
    assertEquals(170, figure.width());
  }
}

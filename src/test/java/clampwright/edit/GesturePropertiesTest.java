package clampwright.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Element;
import clampwright.joint.Feature;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import java.util.List;
import java.util.Optional;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Whatever the hand does, the sketch stays valid and the way back is exact. */
class GesturePropertiesTest {

  /** A press, a release and how both go. */
  record Gesture(
      Feature feature, double index, double x, double z, double toX, double toZ, double step) {

    Part part(Sketch sketch) {
      if (feature == Feature.FLANK) {
        return index < 0.5 ? Part.HEAD_CONE : Part.NUT_CONE;
      }
      return Part.element((int) (index * sketch.joint().elements().size()));
    }

    Optional<Drag> start(Sketch sketch) {
      boolean empty = sketch.joint().elements().isEmpty();
      return empty ? Optional.empty() : Drag.start(sketch, part(sketch), feature, x, z);
    }

    Dragged dragged(Drag drag) {
      return drag.at(toX, toZ, new Snap(step));
    }
  }

  @Provide
  Arbitrary<List<Gesture>> gestures() {
    Arbitrary<Double> place = Arbitraries.doubles().between(-60, 60);
    return Combinators.combine(
            Arbitraries.of(Feature.values()),
            Arbitraries.doubles().between(0, 0.99),
            place,
            place,
            place,
            place,
            Arbitraries.of(0.0, 0.1, 1.0, 25.4 / 32))
        .as(Gesture::new)
        .list()
        .ofMaxSize(12);
  }

  @Property(tries = 300, edgeCases = EdgeCasesMode.NONE)
  void anyRunOfGesturesCanBeTakenBackExactly(@ForAll("gestures") List<Gesture> gestures) {
    Sketch start = Sketches.mixed();
    SketchModel model = new SketchModel(start);
    int steps = 0;
    for (Gesture gesture : gestures) {
      String before = model.undoNameProperty().get();
      Sketch held = model.sketch();
      gesture.start(held).map(gesture::dragged).ifPresent(dragged -> settle(model, dragged));
      checkValid(model.sketch());
      steps += model.sketch().equals(held) ? 0 : 1;
      assertTrue(!model.sketch().equals(held) || before.equals(model.undoNameProperty().get()));
    }
    Sketch end = model.sketch();
    for (int i = 0; i < steps; i++) {
      model.undo();
    }
    assertSame(start, model.sketch());
    for (int i = 0; i < steps; i++) {
      model.redo();
    }
    assertSame(end, model.sketch());
  }

  private static void settle(SketchModel model, Dragged dragged) {
    model.preview(dragged.sketch());
    model.settle(dragged.step());
  }

  private static void checkValid(Sketch sketch) {
    for (Element element : sketch.joint().elements()) {
      assertTrue(element.thickness() > 0 && element.hole() > 0);
    }
    // solved or not, it comes to something that can be said
    Assessment assessment = Assessment.of(sketch.joint());
    assertTrue(
        assessment instanceof Assessment.Solved
            || !((Assessment.Unsolved) assessment).reasons().isEmpty());
  }

  @Property(tries = 300, edgeCases = EdgeCasesMode.NONE)
  void aDragGivesTheSameWhateverCameBefore(@ForAll("gestures") List<Gesture> gestures) {
    Sketch start = Sketches.mixed();
    for (Gesture gesture : gestures) {
      gesture
          .start(start)
          .ifPresent(
              drag -> {
                Dragged first = gesture.dragged(drag);
                drag.at(-gesture.toX(), -gesture.toZ(), Snap.FREE);
                assertEquals(first, gesture.dragged(drag));
              });
    }
  }

  /** A larger thread can take its clearance hole past an edge; no other drag can. */
  @Property(tries = 300, edgeCases = EdgeCasesMode.NONE)
  void noEdgeIsDraggedIntoAHole(@ForAll("gestures") List<Gesture> gestures) {
    Sketch sketch = Sketches.mixed();
    for (Gesture gesture : gestures) {
      if (gesture.feature() != Feature.SHANK_EDGE) {
        sketch = gesture.start(sketch).map(gesture::dragged).map(Dragged::sketch).orElse(sketch);
      }
    }
    for (Element element : sketch.joint().elements()) {
      assertTrue(element.hole() < 2 * element.outline().leftReach());
      assertTrue(element.hole() < 2 * element.outline().rightReach());
    }
  }
}

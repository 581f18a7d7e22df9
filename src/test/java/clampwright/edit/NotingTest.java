package clampwright.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Feature;
import clampwright.joint.Note;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Notes cling to their parts. */
class NotingTest {
  private final Sketch stack =
      Sketches.of(
          Sketches.layer("Upper", 20), Sketches.layer("Middle", 10), Sketches.layer("Lower", 20));
  private final Sketch noted =
      stack.withNotes(
          List.of(new Note("ground", Part.element(1), 30, 0), new Note("oil", Part.HEAD, 12, -5)));

  private static List<Part> parts(Sketch sketch) {
    return sketch.notes().stream().map(Note::part).toList();
  }

  @Test
  void aNoteGoesWithItsElement() {
    assertEquals(List.of(Part.element(2), Part.HEAD), parts(Stacking.inserted(noted, 0).sketch()));
    assertEquals(List.of(Part.element(0), Part.HEAD), parts(Stacking.moved(noted, 1, 0).sketch()));
    assertEquals(List.of(Part.element(2), Part.HEAD), parts(Stacking.moved(noted, 1, 2).sketch()));
  }

  @Test
  void theNoteOfADeletedElementGoesWithIt() {
    assertEquals(List.of(Part.HEAD), parts(Stacking.deleted(noted, 1).sketch()));
    assertEquals(List.of(Part.element(0), Part.HEAD), parts(Stacking.deleted(noted, 0).sketch()));
  }

  @Test
  void aNewNoteIsSelectedAndPointsAtThePart() {
    Change added = Noting.added(noted, Part.element(2));
    assertEquals(Part.note(2), added.then());
    assertEquals(Part.element(2), added.sketch().notes().get(2).part());
    assertEquals(Part.HEAD, Noting.added(noted, Part.LOAD).sketch().notes().get(2).part());
  }

  @Test
  void aNoteIsDraggedAndDeleted() {
    Drag drag = Drag.start(noted, Part.note(0), Feature.NOTE, 31, 26).orElseThrow();
    Note moved = drag.at(41, 20, Snap.FREE).sketch().notes().get(0);
    assertEquals(new Note("ground", Part.element(1), 40, -6), moved);
    assertTrue(drag.problem(3).isPresent());
    assertEquals(List.of(Part.HEAD), parts(Noting.deleted(noted, 0).sketch()));
  }

  @Test
  void aNotePointsAtAPartOnly() {
    assertThrows(IllegalArgumentException.class, () -> new Note("", Part.HEAD_CONE, 0, 0));
    assertThrows(IllegalArgumentException.class, () -> new Note("", Part.HEAD, Double.NaN, 0));
  }
}

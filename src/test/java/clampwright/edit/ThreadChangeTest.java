package clampwright.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;

import clampwright.catalog.Catalogue;
import clampwright.catalog.Entry;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.ScrewThread;
import org.junit.jupiter.api.Test;

class ThreadChangeTest {
  private final Joint joint =
      Sketches.of(
              Sketches.washer("Washer"),
              Sketches.layer("Normal", 10),
              Sketches.layer("Close", 10).withHole(10.5),
              Sketches.layer("Own", 10).withHole(11.4),
              Sketches.washer("Own").withThickness(5))
          .joint();

  private static ScrewThread thread(String designation) {
    return Catalogue.standard().threads().stream()
        .map(Entry::value)
        .filter(thread -> thread.designation().equals(designation))
        .findFirst()
        .orElseThrow();
  }

  private Element changed(int index) {
    return ThreadChange.of(joint, thread("M12")).elements().get(index);
  }

  @Test
  void clearanceHolesFollowTheThread() {
    // ISO 273, M12: fine 13, medium 13.5
    assertEquals(13.5, changed(1).hole());
    assertEquals(13, changed(2).hole());
  }

  @Test
  void holesOfTheirOwnSizeStay() {
    assertEquals(joint.elements().get(3), changed(3));
  }

  @Test
  void washersOfTheTableFollowTheThread() {
    Element washer = changed(0);
    // ISO 7089, M12: 13 × 24 × 2.5
    assertEquals(13, washer.hole());
    assertEquals(new Outline.Round(24), washer.outline());
    assertEquals(2.5, washer.thickness());
  }

  @Test
  void washersOfTheirOwnSizeStay() {
    assertEquals(joint.elements().get(4), changed(4));
  }

  @Test
  void thereAndBackAgainRestoresTheStack() {
    Joint there = ThreadChange.of(joint, thread("M12"));
    assertEquals(joint.elements(), ThreadChange.of(there, thread("M10")).elements());
    assertSame(joint, ThreadChange.of(joint, joint.fastener().thread()));
  }
}

package clampwright.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import clampwright.joint.AngleRule;
import clampwright.joint.Feature;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Swinging the flank of a cone, on two wide plates of 20 under a head face of 14.6. */
class FlankDragTest {
  private static final Snap SNAP = new Snap(0.5);
  private static final double FACE = 14.6 / 2;
  private final Sketch start =
      Sketches.of(Sketches.layer("Upper", 20), Sketches.layer("Lower", 20));

  private Drag head() {
    return Drag.start(start, Part.HEAD_CONE, Feature.FLANK, -(FACE + 10), 10).orElseThrow();
  }

  private static AngleRule rule(Dragged dragged) {
    return dragged.sketch().joint().method().angle();
  }

  /** A pointer 10 mm below the face where a cone of this half-angle passes. */
  private static double passing(double degrees) {
    return -(FACE + 10 * Math.tan(Math.toRadians(degrees)));
  }

  @ParameterizedTest
  @CsvSource({
    "38, 38",
    "38.2, 38",
    "38.3, 38.5",
    "45.7, 45",
    "44.3, 45",
    "30.7, 30",
    "31, 31",
    "70, 60",
    "2, 5",
    "-40, 5"
  })
  void theAngleFollowsThePointerAndCatches(double pointed, double degrees) {
    Dragged dragged = head().at(passing(pointed), 10, SNAP);
    assertEquals(degrees, Math.toDegrees(dragged.value()), 1e-9);
  }

  @Test
  void theUsualAnglesBecomeTheirRules() {
    assertEquals(AngleRule.FIXED_45, rule(head().at(passing(45.5), 10, SNAP)));
    assertEquals(AngleRule.FIXED_30, rule(head().at(passing(29.5), 10, SNAP)));
    assertEquals(new AngleRule.Typed(38, 38), rule(head().at(passing(38), 10, SNAP)));
  }

  @Test
  void oneConeCanSwingAlone() {
    assertEquals(new AngleRule.Typed(38, 45), rule(head().alone(true).at(passing(38), 10, SNAP)));
    assertEquals(
        new AngleRule.Typed(45, 38),
        rule(
            Drag.start(start, Part.NUT_CONE, Feature.FLANK, FACE + 10, 30)
                .orElseThrow()
                .alone(true)
                .at(-passing(38), 30, SNAP)));
  }

  @Test
  void withoutSnappingNothingCatches() {
    Dragged dragged = head().at(passing(44.9), 10, Snap.FREE);
    assertEquals(44.9, ((AngleRule.Typed) rule(dragged)).headDegrees(), 1e-5);
  }

  @ParameterizedTest
  @CsvSource({"30, 30", "'27,5', 27.5", "33°, 33", "60, 60"})
  void typedDegreesAreTakenExactly(String text, double degrees) {
    Typed.Value typed = assertInstanceOf(Typed.Value.class, head().typed(text));
    AngleRule rule = rule(typed.dragged());
    AngleRule expected = degrees == 30 ? AngleRule.FIXED_30 : new AngleRule.Typed(degrees, degrees);
    assertEquals(expected, rule);
  }

  @ParameterizedTest
  @CsvSource({"61", "4.9", "-30"})
  void typedDegreesOutOfRangeSayWhy(String text) {
    Typed.Wrong wrong = assertInstanceOf(Typed.Wrong.class, head().typed(text));
    assertEquals("The half-angle must lie between 5° and 60°.", wrong.problem());
  }

  @Test
  void behindANarrowPartTheFlankSwingsAboutThatPartsEdge() {
    Sketch narrow =
        Sketches.of(
            Sketches.layer("Upper", 10),
            Sketches.layer("Spacer", 10, new Outline.Round(20)),
            Sketches.layer("Lower", 30));
    // behind the spacer the cone starts again at radius 10, z 20; 45° passes radius 15 at z 25
    Drag drag = Drag.start(narrow, Part.HEAD_CONE, Feature.FLANK, 15, 25).orElseThrow();
    double radius = 10 + 5 * Math.tan(Math.toRadians(36));
    Dragged dragged = drag.at(radius, 25, SNAP);
    assertEquals(36, Math.toDegrees(dragged.value()), 1e-9);
  }
}

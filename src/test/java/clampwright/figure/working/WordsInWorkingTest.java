package clampwright.figure.working;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Anchor;
import clampwright.joint.AngleRule;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Service;
import clampwright.joint.WasherRule;
import clampwright.mechanics.Assessment;
import clampwright.quantity.UnitSystem;
import org.junit.jupiter.api.Test;

/** How a working lays out the cases that need words. Numbers: own arithmetic at 45°. */
class WordsInWorkingTest {
  private static final Element COVER = Examples.layer("Cover", 9, 11, Outline.WIDE, 71_000);
  private static final Element RING = Examples.layer("Ring", 6, 11, new Outline.Round(22), 206_000);
  private static final Element BASE = Examples.layer("Base", 20, 11, Outline.WIDE, 100_000);

  private static Working of(Joint joint, Part part) {
    return Working.of(part, joint, Assessment.of(joint), UnitSystem.METRIC, 0);
  }

  private static Joint joint(Element... elements) {
    return Examples.joint(Examples.m10(), AngleRule.FIXED_45, elements);
  }

  private static void checkStep(
      Working working, String label, String formula, String numbers, String result) {
    Step step = Follow.step(working, label);
    assertEquals(formula, step.formula());
    assertEquals(numbers, step.numbers());
    assertEquals(result, step.result());
  }

  @Test
  void depthsNameTheThicknessesThatAreSummed() {
    Working working = of(joint(COVER, RING, BASE), Part.element(1));
    checkStep(working, "Depth from the head's face", "Cover + Ring / 2", "9 + 6 / 2", "12.00 mm");
    checkStep(working, "Depth from the nut's face", "Base + Ring / 2", "20 + 6 / 2", "23.00 mm");
  }

  @Test
  void aFreeConeHasOneStep() {
    Working working = of(joint(COVER, RING, BASE), Part.element(0));
    checkStep(working, "Head's cone", "D_head + 2·z·tan α", "16 + 2 × 4.5 × tan 45°", "25.00 mm");
    assertEquals(
        "straight cones at one half-angle; common practice, no source",
        Follow.step(working, "Head's cone").source());
  }

  @Test
  void aConeIsHeldToTheEdgeOfARoundPart() {
    Working working = of(joint(COVER, RING, BASE), Part.element(1));
    checkStep(
        working,
        "Head's cone",
        "held to the edge of Ring: min(D, D_edge)",
        "min(40, 22)",
        "22.00 mm");
    Step governs = Follow.step(working, "Governs: both");
    assertTrue(governs.formula().contains("both are equally wide; an edge holds it"));
  }

  @Test
  void afterANarrowPartAConeStartsAgainFromItsEdge() {
    Working working = of(joint(COVER, RING, BASE), Part.element(2));
    checkStep(
        working,
        "Head's cone",
        "starts again from the edge of Ring: D_edge + 2·Δz·tan α",
        "22 + 2 × 10 × tan 45°",
        "42.00 mm");
    checkStep(
        working,
        "Governs: nut",
        "the narrower cone: min(D_head, D_nut)",
        "min(42, 36)",
        "36.00 mm");
  }

  @Test
  void aWholeWasherHasNoCone() {
    Element washer = Examples.washer("", 3, 10.5, 18);
    Working working = of(joint(washer, COVER), Part.element(0));
    assertEquals("Washer 1, STEEL", working.title());
    checkStep(working, "Overhang of the washer", "u = (D − d_w)/2", "(18 − 16) / 2", "1.00 mm");
    checkStep(working, "Limit for a whole washer", "t·tan α", "3 × tan 45°", "3.00 mm");
    Step counts = Follow.step(working, "Washer counts");
    assertEquals("whole washer: overhang 1 mm ≤ t·tan α 3 mm", counts.formula());
    assertEquals("common practice, no source", counts.source());
    assertTrue(working.steps().stream().noneMatch(step -> step.label().contains("cone")));
  }

  @Test
  void aWasherThatAConePassesSaysWhy() {
    Element washer = Examples.washer("Wide washer", 1.5, 10.5, 30);
    Working working = of(joint(washer, COVER), Part.element(0));
    assertEquals(
        "from the head's edge: overhang 7 mm > t·tan α 1.5 mm",
        Follow.step(working, "Washer counts").formula());
    checkStep(working, "Head's cone", "D_head + 2·z·tan α", "16 + 2 × 0.75 × tan 45°", "17.50 mm");
  }

  @Test
  void aWasherSetByHandSaysSo() {
    Element washer = Examples.washer("Wide washer", 1.5, 10.5, 30);
    Joint set = joint(washer, COVER).withHeadWasherRule(WasherRule.WHOLE_WASHER);
    Step counts = Follow.step(of(set, Part.HEAD), "Washer counts");
    assertEquals("whole washer, as set", counts.formula());
    assertEquals("as chosen", counts.source());
    checkStep(
        of(set, Part.HEAD), "Head's clamp face", "the washer's outside diameter", "30", "30.00 mm");
  }

  @Test
  void aTappedLayerIsClampedDownToTheLowerFace() {
    Joint tapped = joint(COVER, BASE).withFastener(Examples.m10().withAnchor(new Anchor.Tapped()));
    Working working = of(tapped, Part.element(1));
    checkStep(
        working,
        "Lower face, depth in the tapped layer",
        "min(t, d)/2",
        "min(20, 10) / 2",
        "5.00 mm");
    checkStep(working, "Hole", "d of the thread", "10", "10.00 mm");
    checkStep(working, "Depth from the lower face", "Base / 2", "5 / 2", "2.50 mm");
  }

  @Test
  void methodsThatDoNotApplySayWhy() {
    Joint joint = joint(COVER, BASE);
    Working working =
        Working.of(Headline.MEMBERS, joint, Assessment.of(joint), UnitSystem.METRIC, 0);
    Step vdi = Follow.step(working, "Beside it, VDI 2230");
    assertTrue(vdi.isRemark());
    assertEquals("not applicable: needs the body's outside diameter", vdi.formula());
  }

  @Test
  void noticesStandBelowTheWorkingOfTheirPart() {
    Joint parted = joint(COVER, BASE).withService(Service.of(LoadCase.steady("Load", 60_000, 1)));
    Step note = Follow.step(of(parted, Part.LOAD), "Note: Load");
    assertEquals("The axial load parts the joint; the bolt alone carries it.", note.formula());
    Working strip = of(Examples.strip(), Part.element(0));
    assertTrue(Follow.step(strip, "Note: Flange").formula().contains("unconservative"));
  }

  @Test
  void withoutASolutionThereAreReasonsAndNoNumbers() {
    Joint wide = joint(COVER.withHole(17), BASE);
    Working working = of(wide, Part.element(0));
    assertEquals("No solution yet", working.title());
    Step reason = working.steps().get(0);
    assertEquals("Cover", reason.label());
    assertEquals("Hole 17 mm is not smaller than the clamp face 16 mm.", reason.formula());
    assertFalse(working.steps().stream().anyMatch(step -> !step.isRemark()));
  }
}

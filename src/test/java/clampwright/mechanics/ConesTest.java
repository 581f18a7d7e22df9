package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.AngleRule;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.ScrewThread;
import clampwright.joint.StiffnessMethod;
import clampwright.joint.WasherRule;
import clampwright.mechanics.Zone.WasherDecision.Taken;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The geometry of the pressure zone by hand-drawn cases at 45°, faces 16, holes 11. */
class ConesTest {
  private static final ScrewThread M10 = new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5);
  private static final Fastener BOLT = Stacks.bolt(M10, 16, 16, 206_000);

  @Test
  void theNearerFaceGoverns() {
    Joint joint = wide(6, 10, 4);
    List<ElementFinding> found = Stacks.solved(joint).elements();
    checkElement(found.get(0), Side.HEAD, 16 + 2 * 3);
    checkElement(found.get(1), Side.NUT, 16 + 2 * 9);
    checkElement(found.get(2), Side.NUT, 16 + 2 * 2);
    assertEquals(11, found.get(1).depthFromHead());
    assertEquals(9, found.get(1).depthFromNut());
  }

  @Test
  void bothGovernInTheMiddle() {
    List<ElementFinding> found = Stacks.solved(wide(5, 8, 5)).elements();
    checkElement(found.get(1), Side.BOTH, 16 + 2 * 9);
  }

  @Test
  void aNarrowPartHoldsTheConeAndItStartsAgainFromThere() {
    Joint joint =
        Stacks.joint(
            BOLT,
            AngleRule.FIXED_45,
            Stacks.layer(10, 11, 206_000),
            Stacks.layer(6, 11, 206_000, new Outline.Round(20)),
            Stacks.layer(12, 11, 206_000));
    List<ElementFinding> found = Stacks.solved(joint).elements();
    // From the nut: 8 + 12 = 20 at the spacer's lower face, held to 10, then 10 + 5 in layer 1.
    checkElement(found.get(0), Side.HEAD, 16 + 2 * 5);
    checkElement(found.get(1), Side.BOTH, 20);
    checkElement(found.get(2), Side.NUT, 16 + 2 * 6);
    assertEquals(2 * (10 + 5), found.get(0).nutDiameter(), 1e-12);
    assertEquals(2 * (10 + 6), found.get(2).headDiameter(), 1e-12);
    assertTrue(found.get(1).edgeLimited());
    assertFalse(found.get(0).edgeLimited());
  }

  @Test
  void edgeLimitedBehindTheNarrowPart() {
    Joint joint =
        Stacks.joint(
            BOLT,
            AngleRule.FIXED_45,
            Stacks.layer(4, 11, 206_000, new Outline.Round(18)),
            Stacks.layer(4, 11, 206_000),
            Stacks.layer(30, 11, 206_000));
    ElementFinding second = Stacks.solved(joint).elements().get(1);
    // The head's cone has 9 left of 12 and grows from there: 9 + 2.
    checkElement(second, Side.HEAD, 22);
    assertTrue(second.edgeLimited());
  }

  @Test
  void anOutlineInsideTheClampFaceIsASleeve() {
    // VDI 2230-1: a sleeve, E·π/4·(D² − d_h²)/t, exact.
    Joint joint =
        Stacks.joint(
            BOLT, AngleRule.FIXED_45, Stacks.layer(20, 11, 206_000, new Outline.Round(15)));
    double sleeve = 206_000 * Math.PI / 4 * (15 * 15 - 11 * 11) / 20;
    assertEquals(sleeve, Stacks.stiffness(joint, StiffnessMethod.FULL_FRUSTA), 1e-6);
    assertEquals(sleeve, Stacks.stiffness(joint, StiffnessMethod.MID_PLANE_CYLINDERS), 1e-6);
  }

  @ParameterizedTest
  @CsvSource({
    // OD 20, t 2: overhang 2 is just t·tan 45°, whole; OD 30, t 2.5: overhang 7, from the edge.
    "20, 2,   AUTOMATIC,           WHOLE_WASHER",
    "30, 2.5, AUTOMATIC,           FROM_THE_HEADS_EDGE",
    "30, 2.5, WHOLE_WASHER,        WHOLE_WASHER",
    "20, 2,   FROM_THE_HEADS_EDGE, FROM_THE_HEADS_EDGE",
    "15, 2,   AUTOMATIC,           WHOLE_WASHER",
  })
  void washerRule(double diameter, double thickness, WasherRule rule, Taken taken) {
    Joint joint =
        Stacks.joint(
                BOLT,
                AngleRule.FIXED_45,
                Stacks.washer(thickness, 10.5, diameter, 206_000),
                Stacks.layer(20, 11, 71_000))
            .withHeadWasherRule(rule);
    Zone zone = Stacks.solved(joint).zone();
    boolean whole = taken == Taken.WHOLE_WASHER;
    assertAll(
        () -> assertEquals(taken, zone.headWasher().taken()),
        () -> assertEquals(rule == WasherRule.AUTOMATIC, zone.headWasher().automatic()),
        () -> assertEquals(whole ? diameter : 16, zone.headFaceDiameter()),
        () -> assertEquals(whole ? thickness : 0, zone.headFacePosition()),
        () -> assertEquals(whole ? 20 : 20 + thickness, zone.length(), 1e-12));
  }

  @Test
  void aWholeWasherGivesByItself() {
    Joint joint =
        Stacks.joint(
            BOLT,
            AngleRule.FIXED_45,
            Stacks.layer(20, 11, 71_000),
            Stacks.washer(3, 10.5, 18, 206_000));
    ElementFinding washer = Stacks.solved(joint).elements().get(1);
    checkElement(washer, Side.NUT, 18);
    double expected = 206_000 * Math.PI / 4 * (18 * 18 - 10.5 * 10.5) / 3;
    assertEquals(expected, washer.stiffness(), 1e-6);
    assertEquals(expected, washer.frustaStiffness(), 1e-6);
    assertTrue(washer.wholeWasher());
  }

  @Test
  void ofTwoWashersOnlyTheTouchingOneFollowsTheRule() {
    Joint joint =
        Stacks.joint(
            BOLT,
            AngleRule.FIXED_45,
            Stacks.washer(3, 11, 20, 206_000),
            Stacks.washer(3, 11, 24, 206_000),
            Stacks.layer(20, 11, 71_000));
    Zone zone = Stacks.solved(joint).zone();
    assertEquals(20, zone.headFaceDiameter());
    assertEquals(3, zone.headFacePosition());
    assertEquals(23, zone.length(), 1e-12);
  }

  @Test
  void tappedLayerHasAVirtualFace() {
    // Shigley's effective grip: min(t/2, d/2) inside the tapped layer, face of the head's side.
    Joint joint =
        Stacks.joint(
            Stacks.tapped(BOLT),
            AngleRule.FIXED_30,
            Stacks.layer(12, 11, 71_000),
            Stacks.layer(30, 11, 100_000));
    Assessment.Solved solved = Stacks.solved(joint);
    assertEquals(17, solved.zone().length(), 1e-12);
    assertEquals(16, solved.zone().nutFaceDiameter());
    assertEquals(10, solved.elements().get(1).hole());
    assertEquals(5, solved.elements().get(1).clampedThickness(), 1e-12);
    Joint thin = joint.withElement(1, Stacks.layer(8, 11, 100_000));
    assertEquals(16, Stacks.solved(thin).zone().length(), 1e-12);
  }

  @Test
  void piecesFollowEachOtherWithoutGaps() {
    Joint joint =
        Stacks.joint(
            BOLT,
            AngleRule.FIXED_45,
            Stacks.layer(10, 11, 206_000, new Outline.Round(26)),
            Stacks.layer(6, 11, 206_000, new Outline.Round(20)),
            Stacks.layer(12, 11, 206_000, new Outline.Round(30)));
    Zone zone = Stacks.solved(joint).zone();
    double reached = zone.headFacePosition();
    for (Zone.Piece piece : zone.pieces()) {
      assertEquals(reached, piece.from(), 1e-12);
      reached = piece.to();
    }
    assertEquals(zone.nutFacePosition(), reached, 1e-12);
  }

  private static Joint wide(double... thicknesses) {
    var layers = new clampwright.joint.Element[thicknesses.length];
    for (int i = 0; i < layers.length; i++) {
      layers[i] = Stacks.layer(thicknesses[i], 11, 206_000);
    }
    return Stacks.joint(BOLT, AngleRule.FIXED_45, layers);
  }

  private static void checkElement(ElementFinding found, Side side, double diameter) {
    assertEquals(side, found.governing());
    assertEquals(diameter, found.effectiveDiameter(), 1e-9);
  }
}

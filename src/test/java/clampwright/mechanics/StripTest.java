package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.AngleRule;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.ScrewThread;
import clampwright.joint.StiffnessMethod;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * A flange whose edges cut the zone. Values: own arithmetic by two routes (closed form and
 * quadrature in another language), not published.
 */
class StripTest {
  private static final Fastener BOLT =
      Stacks.bolt(new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5), 16, 16, 206_000);
  private static final Joint JOINT =
      Stacks.joint(
          BOLT,
          AngleRule.FIXED_45,
          Stacks.layer(14, 11, 71_000, new Outline.Strip(9, 12)),
          Stacks.layer(10, 11, 206_000));

  @Test
  void segments() {
    assertEquals(100.6414, ZoneArea.segment(15, 9), 5e-5);
    assertEquals(36.7877, ZoneArea.segment(15, 12), 5e-5);
    assertEquals(0, ZoneArea.segment(8, 9));
  }

  @Test
  void midPlane() {
    List<ElementFinding> elements = Stacks.solved(JOINT).elements();
    ElementFinding strip = elements.get(0);
    assertEquals(30, strip.headDiameter(), 1e-9);
    assertEquals(474.3960, strip.area(), 5e-5);
    assertEquals(26.9262, strip.effectiveDiameter(), 5e-5);
    assertEquals(2405.87e3, strip.stiffness(), 5);
    assertTrue(strip.edgeClipped());
    ElementFinding wide = elements.get(1);
    assertEquals(26, wide.nutDiameter(), 1e-9);
    assertEquals(435.8960, wide.area(), 5e-5);
    assertEquals(8979.46e3, wide.stiffness(), 5);
    assertFalse(wide.edgeClipped());
    assertEquals(1897.48e3, Stacks.stiffness(JOINT, StiffnessMethod.MID_PLANE_CYLINDERS), 5);
  }

  @Test
  void fullFrusta() {
    List<ElementFinding> elements = Stacks.solved(JOINT).elements();
    assertEquals(1782.23e3, elements.get(0).frustaStiffness(), 5);
    assertEquals(6746.91e3, elements.get(1).frustaStiffness(), 5);
    assertEquals(1409.82e3, Stacks.stiffness(JOINT, StiffnessMethod.FULL_FRUSTA), 5);
  }

  @Test
  void saysThatTheConeBehindIsNotReduced() {
    assertTrue(
        Stacks.solved(JOINT)
            .notices()
            .contains(new Notice(Part.element(0), Notice.Kind.CONE_NOT_REDUCED_BEHIND_STRIP)));
  }
}

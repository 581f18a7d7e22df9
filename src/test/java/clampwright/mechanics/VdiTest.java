package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import clampwright.joint.AngleRule;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Method;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.ScrewThread;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness.NotApplicable;
import clampwright.mechanics.MemberStiffness.Why;
import clampwright.mechanics.Reason.Cause;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

/** VDI 2230-1, formulas from memory; identities with Shigley's frusta are algebra. */
class VdiTest {
  private static final double D_W = 16;
  private static final double HOLE = 11;
  private static final double STEEL = 206_000;
  private static final Fastener BOLT =
      Stacks.bolt(new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5), D_W, D_W, STEEL);

  /**
   * The closed cone form of VDI 2230-1 for one cone, δ = 2 ln[...]/(w E π d_h tan φ) with w = 2:
   * equal to one Shigley frustum.
   */
  @Test
  void tappedConeIsTheClosedForm() {
    Joint joint = tapped(60);
    double tan = 0.348 + 0.013 * Math.log(20 / D_W) + 0.193 * Math.log(60 / D_W);
    double closed = coneGive(2, 20, tan);
    double found = 1 / Stacks.stiffness(joint, StiffnessMethod.VDI_2230);
    assertEquals(1, found / closed, 1e-10);
  }

  /** The same with w = 1: equal to a symmetric pair of frusta. */
  @Test
  void throughConesAreTheClosedForm() {
    Joint joint = through(80);
    double tan = 0.362 + 0.032 * Math.log(30 / D_W / 2) + 0.153 * Math.log(80 / D_W);
    double found = 1 / Stacks.stiffness(joint, StiffnessMethod.VDI_2230);
    assertEquals(1, found / coneGive(1, 30, tan), 1e-10);
  }

  /**
   * VDI 2230-1 with D_A below the limit diameter: two cones and a sleeve between them, {@code 2/(w
   * d_h tan φ) ln[...] + 4/(D_A² − d_h²)·[l_K − (D_A − d_w)/(w tan φ)]}, over E π.
   */
  @Test
  void coneAndSleeve() {
    double body = 24;
    Joint joint = through(body);
    double tan = 0.362 + 0.032 * Math.log(30 / D_W / 2) + 0.153 * Math.log(body / D_W);
    double cone =
        2 / (HOLE * tan) * Math.log((D_W + HOLE) * (body - HOLE) / ((D_W - HOLE) * (body + HOLE)));
    double sleeve = 4 / (body * body - HOLE * HOLE) * (30 - (body - D_W) / tan);
    double expected = (cone + sleeve) / (STEEL * Math.PI);
    double found = 1 / Stacks.stiffness(joint, StiffnessMethod.VDI_2230);
    assertEquals(1, found / expected, 1e-10);
  }

  @Test
  void wideLayersNeedTheBodyDiameter() {
    Joint joint = Stacks.joint(BOLT, AngleRule.FIXED_45, Stacks.layer(30, HOLE, STEEL));
    NotApplicable not =
        (NotApplicable) Stacks.solved(joint).members().get(StiffnessMethod.VDI_2230);
    assertEquals(Why.BODY_DIAMETER_NEEDED, not.why());
    Joint given = joint.withMethod(Method.USUAL.withBodyDiameter(OptionalDouble.of(80)));
    double found = Stacks.stiffness(given, StiffnessMethod.VDI_2230);
    assertEquals(1, found / Stacks.stiffness(through(80), StiffnessMethod.VDI_2230), 1e-12);
  }

  @Test
  void asTheAngleRuleItNeedsTheBodyDiameterToo() {
    Joint joint = Stacks.joint(BOLT, AngleRule.VDI_2230, Stacks.layer(30, HOLE, STEEL));
    Reason reason = Stacks.reasons(joint).get(0);
    assertEquals(Cause.BODY_DIAMETER_NEEDED, reason.cause());
    assertEquals(Part.JOINT, reason.part());
  }

  @Test
  void asTheAngleRuleItGivesFullFrustaTheSameStiffness() {
    Joint joint = through(80).withMethod(Method.USUAL.withAngle(AngleRule.VDI_2230));
    assertEquals(
        Stacks.stiffness(joint, StiffnessMethod.VDI_2230),
        Stacks.stiffness(joint, StiffnessMethod.FULL_FRUSTA),
        1e-6);
  }

  @Test
  void tappedLayerAloneHasNoVdiResult() {
    Joint joint =
        Stacks.joint(
            Stacks.tapped(BOLT),
            AngleRule.FIXED_45,
            Stacks.layer(40, HOLE, STEEL, new Outline.Round(60)));
    NotApplicable not =
        (NotApplicable) Stacks.solved(joint).members().get(StiffnessMethod.VDI_2230);
    assertEquals(Why.NOTHING_ABOVE_THE_TAPPED_LAYER, not.why());
  }

  private static Joint through(double body) {
    return Stacks.joint(
        BOLT, AngleRule.FIXED_45, Stacks.layer(30, HOLE, STEEL, new Outline.Round(body)));
  }

  private static Joint tapped(double body) {
    return Stacks.joint(
        Stacks.tapped(BOLT),
        AngleRule.FIXED_45,
        Stacks.layer(20, HOLE, STEEL, new Outline.Round(body)),
        Stacks.layer(40, HOLE, STEEL));
  }

  private static double coneGive(int w, double length, double tan) {
    double upper = (D_W + HOLE) * (D_W + w * length * tan - HOLE);
    double lower = (D_W - HOLE) * (D_W + w * length * tan + HOLE);
    return 2 * Math.log(upper / lower) / (w * STEEL * Math.PI * HOLE * tan);
  }
}

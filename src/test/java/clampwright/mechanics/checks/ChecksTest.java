package clampwright.mechanics.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.AngleRule;
import clampwright.joint.Criteria;
import clampwright.joint.Element;
import clampwright.joint.Factors;
import clampwright.joint.Introduction;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.ScrewThread;
import clampwright.joint.Service;
import clampwright.joint.StiffnessMethod;
import clampwright.joint.Tightening;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.LoadSharing;
import clampwright.mechanics.Preload;
import clampwright.mechanics.Stacks;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** Every check on a whole joint: M12 8.8 through two steel plates, 30 kN. */
class ChecksTest {
  private static final ScrewThread M12 = new ScrewThread("M12", ScrewThread.Form.METRIC, 12, 1.75);
  private static final double AREA = M12.stressArea();

  private static Joint joint(LoadCase... loads) {
    return Stacks.joint(
            Stacks.bolt(M12, 16.6, 16.6, 206_000),
            AngleRule.FIXED_45,
            Stacks.layer(20, 13, 206_000, new Outline.Round(60)),
            Stacks.layer(20, 13, 206_000, new Outline.Round(60)))
        .withService(new Service(20, List.of(), List.of(loads)))
        .withTightening(Tightening.force(30_000).withThreadFriction(OptionalDouble.of(0.12)));
  }

  private static LoadCase pull(double axial) {
    return LoadCase.steady("Pull", axial, 1);
  }

  private static Verdict verdict(Joint joint, CheckKind kind) {
    return Checks.of(joint, Stacks.solved(joint)).get(kind.ordinal());
  }

  private static Verdict.Judged judged(Joint joint, CheckKind kind) {
    return assertInstanceOf(Verdict.Judged.class, verdict(joint, kind));
  }

  private static void checkNotApplicable(Joint joint, CheckKind kind, Verdict.Why why) {
    Verdict verdict = verdict(joint, kind);
    assertEquals(why, assertInstanceOf(Verdict.NotApplicable.class, verdict).why());
  }

  @ParameterizedTest
  @EnumSource(CheckKind.class)
  void everyKindHasOneVerdictInItsPlace(CheckKind kind) {
    assertEquals(kind, verdict(joint(pull(10_000)), kind).kind());
  }

  /** F_p/(FF·FS·F_A) − 1 (NASA-STD-5020 eq. 6-23). */
  @ParameterizedTest
  @CsvSource({
    "10000, 1, 1, 2",
    "20000, 1.15, 1, 0.30434783",
    "30000, 1, 1, 0",
    "40000, 1, 1.2, -0.375"
  })
  void parting(double axial, double fitting, double safety, double margin) {
    Factors factors = Factors.NONE.withFitting(fitting).withParting(safety);
    Joint joint = joint(pull(axial)).withCriteria(Criteria.USUAL.withFactors(factors));
    assertEquals(margin, judged(joint, CheckKind.PARTING).margin(), 1e-8);
  }

  /**
   * Parting is exactly where the load is the preload: then the margin is 0, whatever the method.
   */
  @Test
  void withoutAPullNothingParts() {
    checkNotApplicable(joint(pull(-5_000)), CheckKind.PARTING, Verdict.Why.NO_PULL);
    checkNotApplicable(joint(pull(0)), CheckKind.RUPTURE, Verdict.Why.NO_PULL);
  }

  /**
   * VDI 2230-1: at the preload that uses 90 % of R_p0.2 by its table (M12 8.8, μ 0.12: 43.0 kN,
   * from memory) the equivalent stress is 0.9·640 MPa.
   */
  @Test
  void yieldAtTighteningByTheTableOfVdi() {
    Joint joint =
        joint(pull(0))
            .withTightening(Tightening.force(43_000).withThreadFriction(OptionalDouble.of(0.12)));
    assertEquals(0.9 * 640, judged(joint, CheckKind.YIELD_AT_TIGHTENING).demand(), 0.005 * 576);
  }

  @Test
  void torsionNeedsTheFriction() {
    Joint joint = joint(pull(0)).withTightening(Tightening.force(30_000));
    checkNotApplicable(joint, CheckKind.YIELD_AT_TIGHTENING, Verdict.Why.NO_THREAD_FRICTION);
    checkNotApplicable(joint, CheckKind.STRESS_IN_SERVICE, Verdict.Why.NO_THREAD_FRICTION);
    Joint loose =
        joint(pull(0))
            .withTightening(Tightening.force(0).withThreadFriction(OptionalDouble.of(0.1)));
    checkNotApplicable(loose, CheckKind.YIELD_AT_TIGHTENING, Verdict.Why.NO_PRELOAD);
  }

  /** μ·n_f·[F_p − (1 − Φ)·F_A]/V − 1, by the least Φ of all methods. */
  @Test
  void slipTakesTheSmallestLoadFactor() {
    LoadCase load = pull(10_000).withShear(2_000).withFriction(0.2).withSlipFaces(2);
    Joint joint = joint(load);
    Solved solved = Stacks.solved(joint);
    double least = Double.POSITIVE_INFINITY;
    for (StiffnessMethod method : StiffnessMethod.values()) {
      if (solved.members().get(method)
          instanceof clampwright.mechanics.MemberStiffness.Value value) {
        least = Math.min(least, value.share());
      }
    }
    double clamp = 30_000 - (1 - least) * 10_000;
    Verdict.Judged slip = judged(joint, CheckKind.SLIP);
    assertEquals(0.2 * 2 * clamp / 2_000 - 1, slip.margin(), 1e-9);
    assertEquals(Optional.of(StiffnessMethod.MID_PLANE_CYLINDERS), slip.where().method());
  }

  /** A parted joint holds no shear by friction: nothing is left of the capacity. */
  @Test
  void aPartedJointSlips() {
    Verdict.Judged slip = judged(joint(pull(60_000).withShear(1_000)), CheckKind.SLIP);
    assertEquals(-1, slip.margin());
    assertEquals(0, slip.capacity());
  }

  @Test
  void pressingTheJointTogetherEarnsNoCredit() {
    double alone = judged(joint(pull(0).withShear(1_000)), CheckKind.SLIP).margin();
    double pressed = judged(joint(pull(-20_000).withShear(1_000)), CheckKind.SLIP).margin();
    assertEquals(alone, pressed, 1e-12);
  }

  @Test
  void theWorstLoadCaseIsNamed() {
    Verdict.Judged parting =
        judged(joint(pull(4_000), pull(12_000), pull(8_000)), CheckKind.PARTING);
    assertEquals(1, parting.where().loadCase());
    assertEquals(Preload.ROOM, parting.where().temperature());
  }

  @Test
  void theLeastFavourableMethodForTheBoltHasTheLargestLoadFactor() {
    Joint joint = joint(pull(10_000));
    Verdict.Judged stress = judged(joint, CheckKind.STRESS_IN_SERVICE);
    Joint chosen = joint.withCriteria(Criteria.USUAL.withBasis(Criteria.Basis.CHOSEN));
    Verdict.Judged milder = judged(chosen, CheckKind.STRESS_IN_SERVICE);
    assertTrue(stress.margin() < milder.margin());
    assertEquals(Optional.of(StiffnessMethod.MID_PLANE_CYLINDERS), milder.where().method());
  }

  /** VDI 2230-1 amplitude against half the range of bolt load over A_s. */
  @Test
  void fatigue() {
    LoadCase load = pull(0).withAxial(0, 12_000);
    Joint joint = joint(load).withCriteria(Criteria.USUAL.withBasis(Criteria.Basis.CHOSEN));
    double phi = Stacks.solved(joint).sharing().loadFactor();
    Verdict.Judged fatigue = judged(joint, CheckKind.FATIGUE);
    assertEquals(phi * 12_000 / 2 / AREA, fatigue.demand(), 1e-9);
    assertEquals(48.875, fatigue.capacity(), 1e-9);
    checkNotApplicable(joint(pull(5_000)), CheckKind.FATIGUE, Verdict.Why.STEADY_LOAD);
  }

  /** n = 0: the bolt never feels the load. */
  @Test
  void withoutIntroductionTheBoltKeepsItsPreload() {
    LoadCase load = pull(0).withAxial(0, 12_000).withIntroduction(new Introduction.Factor(0));
    Solved solved = Stacks.solved(joint(load));
    assertEquals(30_000, solved.sharing().boltLoad());
    assertEquals(18_000, solved.sharing().clampLoad());
    checkNotApplicable(joint(load), CheckKind.FATIGUE, Verdict.Why.STEADY_LOAD);
  }

  /**
   * Both threads at least as strong as the stress area: a nut of one diameter holds an 8.8 bolt.
   */
  @Test
  void threadStripping() {
    Verdict.Judged stripping = judged(joint(pull(0)), CheckKind.THREAD_STRIPPING);
    assertEquals(800 * AREA, stripping.demand(), 1e-6);
    assertTrue(stripping.passes());
    Joint tapped = joint(pull(0)).withFastener(Stacks.tapped(joint(pull(0)).fastener()));
    checkNotApplicable(tapped, CheckKind.THREAD_STRIPPING, Verdict.Why.NO_TAPPED_STRENGTH);
    Element base = tapped.elements().get(1);
    Joint weak =
        tapped.withElement(
            1, base.withMaterial(base.material().withTensile(OptionalDouble.of(200))));
    assertTrue(judged(weak, CheckKind.THREAD_STRIPPING).margin() < stripping.margin());
  }

  /** F over π/4·(16.6² − 13²): 30 000/83.692 = 358.46 MPa against 500. */
  @Test
  void bearingPressure() {
    checkNotApplicable(joint(pull(0)), CheckKind.BEARING_PRESSURE, Verdict.Why.NO_PRESSURE_LIMIT);
    Joint joint = joint(pull(0));
    Element first = joint.elements().get(0);
    Joint limited =
        joint.withElement(
            0, first.withMaterial(first.material().withPressureLimit(OptionalDouble.of(500))));
    Verdict.Judged bearing = judged(limited, CheckKind.BEARING_PRESSURE);
    assertEquals(30_000 / (Math.PI / 4 * (16.6 * 16.6 - 169)), bearing.demand(), 1e-9);
    assertEquals(Part.element(0), bearing.part());
  }

  /**
   * EN 1993-1-8 table 3.4 without γ_M2, from memory: 60 wide is 30 to the edge, 2.8·30/13 − 1.7 =
   * 4.76 above 2.5, α_b = 30/39; f_u 360, d 12, t 20.
   */
  @Test
  void holeBearing() {
    Joint joint = joint(pull(0).withShear(5_000));
    checkNotApplicable(joint, CheckKind.HOLE_BEARING, Verdict.Why.NO_PART_STRENGTH);
    Element first = joint.elements().get(0);
    Joint known =
        joint.withElement(
            0, first.withMaterial(first.material().withTensile(OptionalDouble.of(360))));
    double capacity = 2.5 * (30.0 / 39) * 360 * 12 * 20;
    assertEquals(capacity, judged(known, CheckKind.HOLE_BEARING).capacity(), 1e-6);
  }

  /** A load at the mid-planes of both plates, which give alike: half of all gives lies between. */
  @Test
  void planesOfTheLoadDecideN() {
    LoadCase load = pull(10_000).withIntroduction(new Introduction.Planes(0, 1));
    LoadSharing sharing = Stacks.solved(joint(load)).sharing();
    assertEquals(0.5, sharing.introduction(), 1e-9);
    LoadCase same = pull(10_000).withIntroduction(new Introduction.Planes(1, 1));
    assertEquals(0, Stacks.solved(joint(same)).sharing().introduction());
  }
}

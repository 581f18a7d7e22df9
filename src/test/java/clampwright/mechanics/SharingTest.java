package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.AngleRule;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.ScrewThread;
import clampwright.joint.Service;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Sharing an outside load; values are own arithmetic by two routes, not published. */
class SharingTest {
  /** k_b 400, k_m 1600 kN/mm, n 0.6: Φ = 0.6·400/2000 = 0.12. */
  private static LoadSharing sharing(double preload, double axial) {
    return new LoadSharing(1.6e6, 0.6, 0.12, Band.exact(preload), axial, axial);
  }

  @ParameterizedTest
  @CsvSource({
    "22000, 20000, 24400, 4400",
    "45000, 20000, 47400, 27400",
    "22000, 30000, 30000, 0",
    "22000, 0,     22000, 22000", // no load: the preload
    "22000, -5000, 21400, 26400", // pushed together: the bolt sheds load
    "22000, -200000, 0, 200000", // pushed so hard that the bolt is slack
  })
  void boltAndClampLoad(double preload, double axial, double bolt, double clamp) {
    assertEquals(bolt, sharing(preload, axial).boltLoad(), 1e-9);
    assertEquals(clamp, sharing(preload, axial).clampLoad(), 1e-9);
  }

  @ParameterizedTest
  @CsvSource({"22000, 25000", "45000, 51136.363636"})
  void partingLoad(double preload, double expected) {
    assertEquals(expected, sharing(preload, 0).partingLoad(), 1e-6);
  }

  @Test
  void boltLoadIsContinuousWhereTheJointParts() {
    LoadSharing sharing = sharing(22_000, 0);
    double parting = sharing.partingLoad();
    assertEquals(parting, sharing.boltLoad(22_000, parting), 1e-9);
    assertEquals(
        sharing.boltLoad(22_000, parting - 1e-6), sharing.boltLoad(22_000, parting + 1e-6), 1e-5);
  }

  @Test
  void loadFactorIsIntroductionTimesTheBoltsShare() {
    ScrewThread thread = new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5);
    Joint joint =
        Stacks.joint(
                Stacks.bolt(thread, 16, 16, 206_000),
                AngleRule.FIXED_45,
                Stacks.layer(30, 11, 71_000))
            .withService(Service.of(LoadCase.steady("Load", 12_000, 0.6)));
    Assessment.Solved solved = Stacks.solved(joint);
    double bolt = solved.bolt().stiffness();
    double members = solved.sharing().memberStiffness();
    assertEquals(0.6 * bolt / (bolt + members), solved.sharing().loadFactor(), 1e-15);
    Joint none = joint.withService(Service.of(LoadCase.steady("Load", 12_000, 0)));
    assertEquals(0, Stacks.solved(none).sharing().loadFactor());
    assertEquals(30_000, Stacks.solved(none).sharing().boltLoad());
  }

  @Test
  void saysWhenTheJointParts() {
    ScrewThread thread = new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5);
    Joint joint =
        Stacks.joint(
                Stacks.bolt(thread, 16, 16, 206_000),
                AngleRule.FIXED_45,
                Stacks.layer(30, 11, 71_000))
            .withService(Service.of(LoadCase.steady("Load", 60_000, 1)));
    assertTrue(
        Stacks.solved(joint).notices().stream()
            .anyMatch(notice -> notice.kind() == Notice.Kind.PARTED));
  }
}

package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.AngleRule;
import clampwright.joint.Embedment;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Material;
import clampwright.joint.Scatter;
import clampwright.joint.ScrewThread;
import clampwright.joint.Service;
import clampwright.joint.Target;
import clampwright.joint.TemperatureCase;
import clampwright.joint.Tightening;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** From tightening to the preload in service. */
class PreloadTest {
  private static final ScrewThread M10 = new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5);

  /** k_b 400, k_m 1600 kN/mm in series [N/mm]. */
  private static final double SERIES = 320_000;

  private static Joint joint() {
    return Stacks.joint(
        Stacks.bolt(M10, 16, 16, 206_000), AngleRule.FIXED_45, Stacks.layer(30, 11, 206_000));
  }

  /**
   * Worked by two routes, not published: F_nom 40 000 N, s 0.25, f_Z 11 µm, ρ 5 %; members 12 mm at
   * 11.5e-6 and 18 mm at 23e-6, bolt 30 mm at 11.5e-6; members +80 K with bolt +70 K, both −60 K.
   */
  private static Preload worked() {
    double members = 12 * 11.5e-6 + 18 * 23e-6;
    double bolt = 30 * 11.5e-6;
    return new Preload(
        40_000,
        0.25,
        0.011,
        0.05,
        List.of(
            new Preload.Mismatch("warm", members * 80 - bolt * 70),
            new Preload.Mismatch("cold", (members - bolt) * -60)));
  }

  @ParameterizedTest
  @CsvSource({
    "0, 31383.2, 41383.2, 56403.2",
    "1, 21005.6, 31005.6, 46025.6",
    "-2, 24980, 34980, 50000",
    "-1, 21005.6, 34980, 56403.2",
  })
  void inService(int state, double min, double nominal, double max) {
    Band band = worked().inService(SERIES, state);
    assertEquals(min, band.min(), 1e-6);
    assertEquals(nominal, band.nominal(), 1e-6);
    assertEquals(max, band.max(), 1e-6);
  }

  @Test
  void theLossesAlone() {
    assertEquals(30_000, worked().assemblyMin(), 1e-9);
    assertEquals(50_000, worked().assemblyMax(), 1e-9);
    assertEquals(3_520, worked().settling(SERIES), 1e-9);
    assertEquals(1_500, worked().relaxed(), 1e-9);
    assertEquals(6_403.2, worked().thermal(SERIES, 0), 1e-9);
    assertEquals(-3_974.4, worked().thermal(SERIES, 1), 1e-9);
  }

  @Test
  void withoutScatterAndLossesTheBandIsOneForce() {
    Band band = new Preload(40_000, 0, 0, 0, List.of()).inService(SERIES, Preload.ANY);
    assertEquals(Band.exact(40_000), band);
  }

  /** Members and bolt of one expansion at one temperature: nothing changes. */
  @Test
  void withoutMismatchTheTemperatureChangesNothing() {
    Material steel =
        new Material(
            "steel",
            Material.Family.STEEL,
            206_000,
            OptionalDouble.empty(),
            OptionalDouble.of(11.7e-6));
    Joint joint = joint();
    Joint warm =
        joint
            .withElement(0, joint.elements().get(0).withMaterial(steel))
            .withFastener(joint.fastener().withMaterial(steel))
            .withService(
                Service.of(LoadCase.steady("", 0, 1))
                    .withTemperatures(List.of(new TemperatureCase("warm", 120, 120))));
    Preload preload = Stacks.solved(warm).preload();
    assertEquals(0, preload.thermal(SERIES, 0), 1e-9);
  }

  /** Tightening factor for ±9 % and ±23 % (own arithmetic, (1 + s)/(1 − s)). */
  @ParameterizedTest
  @CsvSource({"1.197802, 0.09", "1.597403, 0.23", "1, 0"})
  void aTighteningFactorIsAScatter(double factor, double share) {
    assertEquals(share, new Scatter.TighteningFactor(factor).share(), 1e-6);
  }

  /** VDI 2230-1 table 5, from memory: 3 + 2·3 + interfaces·2 µm for R_z 10 … 40 µm. */
  @ParameterizedTest
  @CsvSource({
    "FINE, false, 2, 3, 12.5",
    "MEDIUM, false, 2, 5, 19",
    "COARSE, false, 1, 1, 10",
    "FINE, true, 2, 1, 11",
    "MEDIUM, true, 2, 2, 17",
    "COARSE, true, 2, 1, 19.5",
  })
  void embedmentByRoughness(
      Embedment.Roughness roughness, boolean sheared, int faces, int interfaces, double micro) {
    Embedment embedment = new Embedment.FromRoughness(roughness, sheared);
    assertEquals(micro / 1000, Embedding.amount(embedment, faces, interfaces), 1e-12);
  }

  /** Force to torque and back, by either form. */
  @ParameterizedTest
  @CsvSource({"0.12, 0.12", "0.08, 0.2", "0.3, 0.05"})
  void forceAndTorqueRoundTrip(double thread, double face) {
    Joint joint = joint();
    double torque = 25_000 * AssemblyPreload.wrenchArm(joint, thread, face);
    OptionalDouble force =
        AssemblyPreload.of(joint, new Target.FrictionTorque(torque, thread, face));
    assertEquals(25_000, force.orElseThrow(), 1e-9);
    double factor = AssemblyPreload.wrenchArm(joint, thread, face) / 10;
    OptionalDouble same = AssemblyPreload.of(joint, new Target.NutFactorTorque(torque, factor));
    assertEquals(25_000, same.orElseThrow(), 1e-9);
  }

  /** F = T/(K·d) (Shigley eq. 8-27): 50 N·m, K 0.2, d 10 mm. */
  @Test
  void theNutFactor() {
    assertEquals(
        25_000,
        AssemblyPreload.of(joint(), new Target.NutFactorTorque(50_000, 0.2)).orElseThrow(),
        1e-9);
  }

  @Test
  void aLoadCaseMeetsItsTemperature() {
    LoadCase any = LoadCase.steady("", 0, 1);
    assertEquals(Preload.ANY, worked().state(any));
    assertEquals(1, worked().state(any.withTemperature(Optional.of("cold"))));
    assertEquals(Preload.ANY, worked().state(any.withTemperature(Optional.of("gone"))));
  }

  @Test
  void whatIsLostAltogetherIsSaid() {
    Tightening little =
        Tightening.force(1_000).withEmbedment(new Embedment.Typed(0.05)).withRelaxation(0.05);
    List<Notice.Kind> kinds =
        Stacks.solved(joint().withTightening(little)).notices().stream().map(Notice::kind).toList();
    assertTrue(kinds.contains(Notice.Kind.LOOSE));
    assertTrue(kinds.contains(Notice.Kind.SETTLING_CHARGED_TWICE));
  }
}

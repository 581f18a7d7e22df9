package clampwright.mechanics.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Margins of a bolt under load. M12, A_s 84.267 mm², P_u 67 413.6 N, P_y 53 930.88 N, Φ 0.12, F_p
 * 22 000 … 45 000 N, F_A 20 000 N, FF 1.15: worked by two routes, not published.
 */
class TensionTest {
  private static final double PHI = 0.12;
  private static final double AREA = 84.267;

  /**
   * FS 1.4 on rupture, 1.25 on yield; at F_p,max 62 000 N the bolt breaks before the joint parts.
   */
  @ParameterizedTest
  @CsvSource({
    "67413.6, 45000, 1.4, 67413.6, 1.09359",
    "53930.88, 45000, 1.25, 53930.88, 0.87586",
    "67413.6, 62000, 1.4, 45113.3, 0.40104",
  })
  void loadAtTheLimit(double limit, double preload, double safety, double load, double margin) {
    double found = Tension.loadAtLimit(limit, preload, PHI);
    assertEquals(load, found, 0.05);
    assertEquals(margin, found / (1.15 * safety * 20_000) - 1, 5e-6);
  }

  /**
   * Where preload alone is beyond the limit no pull is borne; without sharing the limit itself is.
   */
  @Test
  void limitsOfTheLoadAtTheLimit() {
    assertTrue(Tension.loadAtLimit(50_000, 60_000, PHI) < 0);
    assertEquals(50_000, Tension.loadAtLimit(50_000, 40_000, 0));
  }

  /**
   * F_A −10 000 … 30 000 with F_p 22 000: (30 000 − 20 800)/2 over A_s, where ΦΔF/2 is 28.481 MPa.
   */
  @Test
  void theAmplitudeCoversParting() {
    double force = Tension.amplitude(22_000, 45_000, PHI, -10_000, 30_000);
    assertEquals(54.588, force / AREA, 5e-4);
    assertEquals(28.481, PHI * 40_000 / 2 / AREA, 5e-4);
  }

  @Property
  void theAmplitudeOfASteadyLoadIsNone(
      @ForAll @DoubleRange(min = 0, max = 1e5) double preload,
      @ForAll @DoubleRange(min = -1e5, max = 1e5) double load) {
    assertEquals(0, Tension.amplitude(preload, preload, PHI, load, load));
  }

  /** At the multiple found the interaction is 1; with hardly any pull it is shear alone. */
  @Property
  void theInteractionIsUsedUpAtItsMultiple(
      @ForAll @DoubleRange(min = 100, max = 2e4) double shear,
      @ForAll @DoubleRange(min = 0, max = 4e4) double axial,
      @ForAll @DoubleRange(min = 0, max = 6e4) double preload) {
    double m = Tension.interactionMultiple(shear, 40_000, 2.5, axial, 67_413.6, 1.5, preload, PHI);
    double at = Tension.interaction(m, shear, 40_000, 2.5, axial, 67_413.6, 1.5, preload, PHI);
    assertEquals(1, at, 1e-6);
  }

  @Test
  void shearAloneLeavesTheShearMargin() {
    double m = Tension.interactionMultiple(10_000, 40_000, 2.5, 0, 67_413.6, 1.5, 0, PHI);
    assertEquals(4, m, 1e-6);
  }

  /** VDI 2230-1 (formula from memory, values computed): M6, M8, M12, M20 [MPa]. */
  @ParameterizedTest
  @CsvSource({"6, 59.50", "8, 54.19", "12, 48.875", "20, 44.625"})
  void enduranceOfVdi(double d, double amplitude) {
    assertEquals(amplitude, Endurance.rolledBefore(d), 5e-3);
  }

  /** ∛(2e6/N): eight times as few cycles, twice the amplitude; endless life from 2e6 on. */
  @ParameterizedTest
  @CsvSource({"2.5e5, 2", "2e6, 1", "1e8, 1"})
  void fewerCyclesAreEnduredHigher(double cycles, double rise) {
    assertEquals(rise, Endurance.cyclesRise(cycles), 1e-12);
  }

  /** Shigley eq. 8-38: S_e 129, S_ut 830, σ_i 0 gives S_e·S_ut/(S_ut + S_e). */
  @ParameterizedTest
  @CsvSource({"129, 830, 0, 111.6476", "129, 830, 830, 0"})
  void goodman(double endurance, double tensile, double least, double amplitude) {
    assertEquals(amplitude, Endurance.goodman(endurance, tensile, least), 1e-4);
  }
}

package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;

import clampwright.mechanics.Assessment;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Side;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Checks;
import clampwright.mechanics.checks.Verdict;
import org.junit.jupiter.api.Test;

/**
 * One sample worked by hand from its drawing, apart from the program (own arithmetic, not
 * published): mid-plane cylinders at 45°, so that a cone's radius grows by as much as the depth.
 *
 * <p>M10, grip 2 + 10 + 1.5 + 6 + 18 + 4 = 41.5 mm, head face 14.63 mm. The head's washer overhangs
 * it by (20 − 14.63)/2 = 2.685 mm, more than its 2 mm: the head's cone starts at the head, radius
 * 7.315 mm. The nut's washer overhangs by (18 − 14.6)/2 = 1.7 mm, less than its 4 mm: it acts
 * whole, and the nut's cone starts on it 37.5 mm below the head, radius 9 mm.
 *
 * <pre>
 * part      z_mid   head's cone R         nut's cone R          D_eff    A          k = E A/t
 * washer     1      7.315 + 1   = 8.315   held to 10            16.63    130.617    13 518 873
 * lid        7      7.315 + 7   = 14.315  21.5                  28.63    548.740     3 747 891
 * shim      12.75   7.315+12.75 = 20.065  15 + 0.75  = 15.75    31.50    684.278    86 675 232
 * ring      16.5    held to 15            held to 15            30.00    611.825    10 808 911
 * flange    28.5    15 + 9      = 24      9 + 9      = 18       36.00    922.843     5 126 905
 * washer    39.5    whole                 whole                 18.00    167.879     8 687 731
 * </pre>
 */
class GearboxLidTest {
  private static final Assessment.Solved SOLVED = solved();

  private static Assessment.Solved solved() {
    Stored.Opened opened = (Stored.Opened) Samples.open(Samples.all().get(0));
    return (Assessment.Solved) Assessment.of(opened.sketch().joint());
  }

  private static void checkElement(
      int index, Side side, boolean edge, double diameter, double area, double stiffness) {
    ElementFinding finding = SOLVED.elements().get(index);
    assertEquals(side, finding.governing());
    assertEquals(edge, finding.edgeLimited());
    assertEquals(diameter, finding.effectiveDiameter(), 1e-9);
    checkNear(area, finding.area());
    checkNear(stiffness, finding.stiffness());
  }

  private static void checkNear(double expected, double found) {
    assertEquals(1, found / expected, 1e-6);
  }

  @Test
  void eachPartHasTheCylinderWorkedByHand() {
    checkElement(0, Side.HEAD, false, 16.63, 130.617134, 13_518_873.350);
    checkElement(1, Side.HEAD, false, 28.63, 548.739554, 3_747_891.154);
    checkElement(2, Side.NUT, true, 31.5, 684.278150, 86_675_232.316);
    checkElement(3, Side.BOTH, true, 30, 611.825169, 10_808_911.324);
    checkElement(4, Side.NUT, false, 36, 922.842842, 5_126_904.678);
    checkElement(5, Side.NUT, false, 18, 167.878857, 8_687_730.872);
  }

  /** 1/k_m = Σ 1/k. */
  @Test
  void thePartsInSeries() {
    checkNear(1_324_511.6126, SOLVED.sharing().memberStiffness());
  }

  /**
   * Length ≥ 41.5 + 8.4 + 2 × 1.5 = 52.9, so 55 mm; thread 2 × 10 + 6 = 26, shank 29, thread in the
   * grip 12.5 mm. A = 78.539816, A_s = 57.989597, A_d3 = 52.292318 mm². Σ l/A = (5 + 29 + 4)/A +
   * 12.5/A_s + 5/A_d3 = 0.79500327 1/mm, E = 207 000 MPa.
   */
  @Test
  void theBolt() {
    assertEquals(55, SOLVED.bolt().length());
    assertEquals(29, SOLVED.bolt().shankLength());
    checkNear(260_376.2874, SOLVED.bolt().stiffness());
  }

  /**
   * T = 36 N·m, both frictions 0.12, D_b = (14.63 + 10.5)/2 = 12.565 mm: 1.5/2π + 0.12·9.0257215/(2
   * cos 30°) + 0.12·12.565/2 = 0.23873241 + 0.62532033 + 0.7539 = 1.61795274 mm, F = 36
   * 000/1.61795274 = 22 250.3408 N; ± 23 %: 17 132.7624 … 27 367.9192 N.
   */
  @Test
  void thePreloadAtAssembly() {
    checkNear(22_250.340841, SOLVED.preload().nominal());
    checkNear(17_132.762448, SOLVED.preload().assemblyMin());
    checkNear(27_367.919235, SOLVED.preload().assemblyMax());
  }

  /**
   * Series stiffness 260 376.2874·1 324 511.6126/1 584 887.9 = 217 599.87966 N/mm. Settling, R_z 10
   * … 40 µm: thread 3, two faces 3 each, five interfaces 2 each: 19 µm, F_Z = 4134.39771 N.
   *
   * <p>Members Σ α·t = (2 + 4)·11.7 + 10·23.6 + 1.5·17.2 + 6·19.9 + 18·11.4 = 656.6 µm/K·10⁻³, bolt
   * 41.5·11.7 = 485.55. Hot oil: 656.6e-6·70 − 485.55e-6·60 = 0.016829 mm, +3661.98837 N. Cold
   * start: −40·(656.6 − 485.55)e-6 = −0.006842 mm, −1488.81838 N.
   *
   * <p>Least 17 132.7624 − 4134.3977 − 1488.8184 = 11 509.54636 N, greatest 27 367.9192 + 3661.9884
   * = 31 029.90761 N, nominal 22 250.3408 − 4134.3977 = 18 115.94313 N.
   */
  @Test
  void thePreloadInService() {
    checkNear(217_599.879655, SOLVED.series());
    checkNear(4_134.397713, SOLVED.preload().settling(SOLVED.series()));
    checkNear(3_661.988375, SOLVED.preload().thermal(SOLVED.series(), 0));
    checkNear(-1_488.818377, SOLVED.preload().thermal(SOLVED.series(), 1));
    checkNear(11_509.546358, SOLVED.sharing().preload().min());
    checkNear(18_115.943127, SOLVED.sharing().preload().nominal());
    checkNear(31_029.907609, SOLVED.sharing().preload().max());
  }

  /**
   * Φ = 0.7 k_b/(k_b + k_m). Running, 6000 N: bolt 31 029.9076 + 0.115·6000 = 31 719.9125 N, clamp
   * 11 509.5464 − 0.885·6000 = 6199.5513 N, parts at 11 509.5464/0.885 = 13 005.1491 N.
   */
  @Test
  void theLoads() {
    checkNear(0.115000816, SOLVED.sharing().loadFactor());
    checkNear(31_719.912503, SOLVED.sharing().boltLoad());
    checkNear(6_199.551251, SOLVED.sharing().clampLoad());
    checkNear(13_005.149113, SOLVED.sharing().partingLoad());
  }

  /**
   * At tightening: σ = 27 367.9192/57.989597 = 471.945326, τ = 27 367.9192·0.86405274/(π·d_s³/12)
   * with d_s = (9.0257215 + 8.1596965)/2 = 8.592709 mm: 142.371511, √(σ² + 3τ²) = 532.485993 MPa,
   * margin 640/532.485993 − 1. Parting: the pressure test pulls 9000 N at −20 °C, 11 509.5464/9000
   * − 1. Slip: 0.15·6199.5513/600 − 1.
   */
  @Test
  void theMargins() {
    checkMargin(CheckKind.YIELD_AT_TIGHTENING, 0.201909510);
    checkMargin(CheckKind.PARTING, 0.278838484);
    checkMargin(CheckKind.SLIP, 0.549887813);
  }

  private static void checkMargin(CheckKind kind, double margin) {
    Stored.Opened opened = (Stored.Opened) Samples.open(Samples.all().get(0));
    Verdict verdict = Checks.of(opened.sketch().joint(), SOLVED).get(kind.ordinal());
    assertEquals(kind, verdict.kind());
    assertEquals(margin, ((Verdict.Judged) verdict).margin(), 1e-6);
  }
}

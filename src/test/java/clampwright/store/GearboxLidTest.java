package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;

import clampwright.mechanics.Assessment;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Side;
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

  /** Φ = 0.7 k_b/(k_b + k_m); 22 000 N of preload, 6000 N of load. */
  @Test
  void theLoads() {
    checkNear(0.115000816, SOLVED.sharing().loadFactor());
    checkNear(22_690.0049, SOLVED.sharing().boltLoad());
    checkNear(16_690.0049, SOLVED.sharing().clampLoad());
    checkNear(24_858.7800, SOLVED.sharing().partingLoad());
  }
}

package clampwright.mechanics.spread;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.AngleRule;
import clampwright.joint.Criteria;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Scatter;
import clampwright.joint.ScrewThread;
import clampwright.joint.Service;
import clampwright.joint.Tightening;
import clampwright.joint.Tolerances;
import clampwright.mechanics.Stacks;
import clampwright.mechanics.checks.CheckKind;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Inputs that stray, alone and together. */
class SpreadTest {
  private static final ScrewThread M12 = new ScrewThread("M12", ScrewThread.Form.METRIC, 12, 1.75);
  private static final Margin PARTING = Margin.of(CheckKind.PARTING);

  /** 30 kN ± scatter against a pull; nothing else decides the margin against parting. */
  private static Joint joint(double pull, double scatter) {
    return Stacks.joint(
            Stacks.bolt(M12, 16.6, 16.6, 206_000),
            AngleRule.FIXED_45,
            Stacks.layer(20, 13, 206_000),
            Stacks.layer(20, 13, 206_000))
        .withService(Service.of(LoadCase.steady("Pull", pull, 1)))
        .withTightening(Tightening.force(30_000).withScatter(new Scatter.PlusMinus(scatter)))
        .withCriteria(Criteria.USUAL.withTolerances(new Tolerances(0, 0, 0, 0, 0, 45, 45)));
  }

  private static Outcome run(Joint joint, int count, long seed, int threads)
      throws InterruptedException {
    return MonteCarlo.run(joint, PARTING, count, seed, threads, outcome -> {}, () -> false);
  }

  @Test
  void onlyStatedTolerancesStray() {
    assertEquals(List.of(), Inputs.of(joint(10_000, 0)));
    Joint all =
        joint(10_000, 0.2)
            .withCriteria(
                Criteria.USUAL.withTolerances(new Tolerances(0.02, 0.05, 0.2, 0.1, 5, 30, 45)));
    // Scatter, two thicknesses, three moduli, n, angle; no friction and no temperature is given.
    assertEquals(8, Inputs.of(all).size());
  }

  /** F_p/F_A − 1: with ± 20 % the margin goes from 2 to 1.4 and 2.6. */
  @Test
  void scatterAloneMovesTheMarginAgainstParting() {
    Sensitivity sensitivity = Sensitivity.of(joint(10_000, 0.2), PARTING);
    assertEquals(2, sensitivity.given().orElseThrow().margin(), 1e-9);
    Sensitivity.Bar bar = sensitivity.bars().get(0);
    assertEquals(Input.Kind.PRELOAD, bar.input().kind());
    assertEquals(1.4, bar.low().orElseThrow().margin(), 1e-9);
    assertEquals(2.6, bar.high().orElseThrow().margin(), 1e-9);
    assertEquals(0.6, bar.reach(2), 1e-9);
  }

  @Test
  void theInputThatMattersMostComesFirst() {
    Joint joint =
        joint(10_000, 0.2)
            .withCriteria(
                Criteria.USUAL.withTolerances(new Tolerances(0.05, 0.05, 0, 0, 0, 30, 45)));
    List<Sensitivity.Bar> bars = Sensitivity.of(joint, PARTING).bars();
    for (int i = 1; i < bars.size(); i++) {
      assertTrue(bars.get(i - 1).reach(2) >= bars.get(i).reach(2));
    }
    assertEquals(Input.Kind.PRELOAD, bars.get(0).input().kind());
  }

  /**
   * The preload is normal with ± 20 % at three deviations: it falls below the pull of 29 000 N,
   * half a deviation under the mean, with probability (Φ(−0.5) − Φ(−3))/(1 − 2Φ(−3)) = 0.30802
   * (table of the normal distribution: Φ(−0.5) 0.308538, Φ(−3) 0.001350).
   */
  @Test
  void theShareThatFailsIsThatOfTheNormalDistribution() throws InterruptedException {
    Outcome outcome = run(joint(29_000, 0.2), 200_000, 7, 2);
    double expected = (0.308538 - 0.001350) / (1 - 2 * 0.001350);
    assertEquals(expected, outcome.failed(), 0.004);
    assertTrue(outcome.failedAtLeast() < expected && expected < outcome.failedAtMost());
    assertEquals(30_000 / 29_000.0 - 1, outcome.median(), 1e-3);
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 5})
  void theSameSeedGivesTheSameJointsWhateverTheThreads(int threads) throws InterruptedException {
    Outcome one = run(joint(29_000, 0.2), 5_000, 42, 1);
    Outcome many = run(joint(29_000, 0.2), 5_000, 42, threads);
    assertEquals(one.below(), many.below());
    assertEquals(one.median(), many.median());
    assertArrayEquals(one.histogram().counts(), many.histogram().counts());
  }

  @Test
  void anotherSeedGivesOtherJoints() throws InterruptedException {
    assertTrue(
        run(joint(29_000, 0.2), 5_000, 1, 1).median()
            != run(joint(29_000, 0.2), 5_000, 2, 1).median());
  }

  @Test
  void aCancelledRunEndsWithWhatThereIs() throws InterruptedException {
    AtomicInteger asked = new AtomicInteger();
    Outcome outcome =
        MonteCarlo.run(
            joint(29_000, 0.2),
            PARTING,
            1_000_000,
            3,
            1,
            shown -> {},
            () -> asked.incrementAndGet() > 3);
    assertEquals(3 * MonteCarlo.BLOCK, outcome.count());
  }

  @Test
  void everyJointLiesInTheHistogram() throws InterruptedException {
    Outcome outcome = run(joint(29_000, 0.2), 4_000, 5, 2);
    int sum = 0;
    for (int count : outcome.histogram().counts()) {
      sum += count;
    }
    assertEquals(outcome.count(), sum);
  }

  /**
   * Clopper–Pearson at 95 %: none of 100 is at most 1 − 0.025^(1/100) = 3.62 %, all of 100 at least
   * the rest (closed form).
   */
  @ParameterizedTest
  @CsvSource({"0, 0, 0.0362167", "100, 0.9637833, 1"})
  void confidenceAtTheEnds(int below, double least, double most) {
    Outcome outcome = new Outcome(100, below, 0, 0, Outcome.Histogram.EMPTY);
    assertEquals(least, outcome.failedAtLeast(), 1e-6);
    assertEquals(most, outcome.failedAtMost(), 1e-6);
  }

  /** A joint without a solution counts as failed. */
  @Test
  void withoutASolutionAJointFails() {
    Outcome outcome = Outcome.of(new double[] {0.5, -0.1, Double.NaN, Double.POSITIVE_INFINITY});
    assertEquals(3, outcome.count());
    assertEquals(1, outcome.below());
    assertEquals(1, outcome.unsolved());
    assertEquals(2.0 / 3, outcome.failed(), 1e-12);
  }
}

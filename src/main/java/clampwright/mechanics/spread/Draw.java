package clampwright.mechanics.spread;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.rng.UniformRandomProvider;
import org.apache.commons.rng.simple.RandomSource;
import org.apache.commons.statistics.distribution.ContinuousDistribution;
import org.apache.commons.statistics.distribution.TruncatedNormalDistribution;
import org.apache.commons.statistics.distribution.UniformContinuousDistribution;

/**
 * Draws inputs at random: evenly between the limits, or normally with the limits at three standard
 * deviations and nothing beyond them (common practice, no source).
 */
final class Draw {
  private static final double DEVIATIONS = 3;

  /** Sets seeds of neighbouring blocks far apart (2⁶⁴ over the golden ratio). */
  private static final long GOLDEN = 0x9E3779B97F4A7C15L;

  private final List<ContinuousDistribution.Sampler> samplers = new ArrayList<>();

  /**
   * The draws of one block.
   *
   * @param seed of the run
   * @param block number of the block, which makes its numbers its own
   */
  Draw(List<Input> inputs, long seed, int block) {
    UniformRandomProvider random =
        RandomSource.XO_SHI_RO_256_PP.create(seed + (block + 1) * GOLDEN);
    for (Input input : inputs) {
      samplers.add(distribution(input).createSampler(random));
    }
  }

  private static ContinuousDistribution distribution(Input input) {
    if (input.isEven()) {
      return UniformContinuousDistribution.of(input.low(), input.high());
    }
    double deviation = input.high() / DEVIATIONS;
    return TruncatedNormalDistribution.of(0, deviation, input.low(), input.high());
  }

  /** Fills in how far each input is off. */
  void into(double[] off) {
    for (int i = 0; i < off.length; i++) {
      off[i] = samplers.get(i).sample();
    }
  }
}

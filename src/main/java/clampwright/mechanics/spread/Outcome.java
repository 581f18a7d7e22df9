package clampwright.mechanics.spread;

import java.util.Arrays;
import org.apache.commons.statistics.distribution.BetaDistribution;

/**
 * What a Monte-Carlo run has come to, so far or in the end.
 *
 * @param count joints that have a margin or no solution
 * @param below how many of them have a margin below 0
 * @param unsolved how many have no solution; they count as failed
 * @param median the margin that half of the solved joints reach; 0 while there is none
 * @param histogram how the margins spread
 */
public record Outcome(int count, int below, int unsolved, double median, Histogram histogram) {
  private static final double CONFIDENCE = 0.95;

  /**
   * Margins in equal bins; the few at both ends that would stretch the picture count in the end
   * bins.
   *
   * @param from lower limit of the first bin
   * @param to upper limit of the last bin
   * @param counts per bin
   */
  public record Histogram(double from, double to, int[] counts) {
    private static final int BINS = 48;
    private static final double LEFT_OUT = 0.002;

    static final Histogram EMPTY = new Histogram(0, 1, new int[BINS]);

    static Histogram of(double[] sorted, int count) {
      if (count == 0) {
        return EMPTY;
      }
      int out = (int) (LEFT_OUT * count);
      double from = sorted[out];
      double to = sorted[count - 1 - out];
      if (!(to > from)) {
        from -= 0.5;
        to += 0.5;
      }
      int[] counts = new int[BINS];
      for (int i = 0; i < count; i++) {
        int bin = (int) ((sorted[i] - from) / (to - from) * BINS);
        counts[Math.max(0, Math.min(BINS - 1, bin))]++;
      }
      return new Histogram(from, to, counts);
    }
  }

  /**
   * Sums margins up.
   *
   * @param margins NaN for no solution, positive infinity for not drawn yet
   */
  static Outcome of(double[] margins) {
    double[] sorted = margins.clone();
    Arrays.sort(sorted);
    int solved = 0;
    int below = 0;
    int unsolved = 0;
    for (double margin : sorted) {
      if (Double.isNaN(margin)) {
        unsolved++;
      } else if (margin < Double.POSITIVE_INFINITY) {
        solved++;
        below += margin < 0 ? 1 : 0;
      }
    }
    double median = solved == 0 ? 0 : sorted[solved / 2];
    return new Outcome(solved + unsolved, below, unsolved, median, Histogram.of(sorted, solved));
  }

  /** Share of joints that fail, by a margin below 0 or for want of a solution [–]. */
  public double failed() {
    return count == 0 ? 0 : Math.min(1, (below + unsolved) / (double) count);
  }

  /** Lower end of the 95 % confidence interval of that share (Clopper and Pearson) [–]. */
  public double failedAtLeast() {
    int failed = Math.min(count, below + unsolved);
    return failed == 0
        ? 0
        : BetaDistribution.of(failed, count - failed + 1)
            .inverseCumulativeProbability((1 - CONFIDENCE) / 2);
  }

  /** Upper end of the 95 % confidence interval of that share (Clopper and Pearson) [–]. */
  public double failedAtMost() {
    int failed = Math.min(count, below + unsolved);
    return failed == count
        ? 1
        : BetaDistribution.of(failed + 1, count - failed)
            .inverseCumulativeProbability((1 + CONFIDENCE) / 2);
  }
}

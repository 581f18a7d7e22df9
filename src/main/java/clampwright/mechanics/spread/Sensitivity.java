package clampwright.mechanics.spread;

import clampwright.joint.Joint;
import clampwright.mechanics.checks.Verdict;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * How far a margin moves when each input goes to its limits alone, all others as given.
 *
 * @param given the verdict with everything as given; empty where there is no margin
 * @param bars one per input, the one that moves the margin most first
 */
public record Sensitivity(Optional<Verdict.Judged> given, List<Bar> bars) {

  /**
   * One input at both its limits.
   *
   * @param input which
   * @param low the verdict at its low limit; empty where the joint has none there
   * @param high the verdict at its high limit; empty where the joint has none there
   */
  public record Bar(Input input, Optional<Verdict.Judged> low, Optional<Verdict.Judged> high) {

    /** The farthest that the margin moves from a given one; infinite where it is lost. */
    public double reach(double given) {
      return Math.max(reach(low, given), reach(high, given));
    }

    private static double reach(Optional<Verdict.Judged> verdict, double given) {
      return verdict.isPresent()
          ? Math.abs(verdict.get().margin() - given)
          : Double.POSITIVE_INFINITY;
    }
  }

  public Sensitivity {
    bars = List.copyOf(bars);
  }

  /** The sensitivity of a margin of a joint. */
  public static Sensitivity of(Joint joint, Margin margin) {
    List<Input> inputs = Inputs.of(joint);
    double[] off = new double[inputs.size()];
    Optional<Verdict.Judged> given = margin.verdict(Strayed.of(joint, inputs, off));
    List<Bar> bars = new ArrayList<>();
    for (int i = 0; i < off.length; i++) {
      Input input = inputs.get(i);
      off[i] = input.low();
      Optional<Verdict.Judged> low = margin.verdict(Strayed.of(joint, inputs, off));
      off[i] = input.high();
      Optional<Verdict.Judged> high = margin.verdict(Strayed.of(joint, inputs, off));
      off[i] = 0;
      bars.add(new Bar(input, low, high));
    }
    double from = given.map(Verdict.Judged::margin).orElse(0.0);
    bars.sort(Comparator.comparingDouble((Bar bar) -> bar.reach(from)).reversed());
    return new Sensitivity(given, bars);
  }
}

package clampwright.bench;

import clampwright.joint.Joint;
import clampwright.mechanics.spread.Margin;
import clampwright.mechanics.spread.MonteCarlo;
import clampwright.mechanics.spread.Outcome;
import clampwright.store.Samples;
import clampwright.store.Stored;
import java.util.Locale;

/**
 * Joints of the first sample a second in a Monte-Carlo run, with all its tolerances, loads and
 * temperatures. House target: 200 000 a second on two cores.
 */
final class SpreadBench {
  private static final int COUNT = 400_000;

  private SpreadBench() {}

  static void run() throws InterruptedException {
    Stored.Opened opened = (Stored.Opened) Samples.open(Samples.all().get(0));
    Joint joint = opened.sketch().joint();
    int cores = Runtime.getRuntime().availableProcessors();
    run(joint, cores);
    for (int threads = 1; threads <= cores; threads *= 2) {
      long begin = System.nanoTime();
      Outcome outcome = run(joint, threads);
      double seconds = (System.nanoTime() - begin) / 1e9;
      System.out.printf(
          Locale.ROOT,
          "%d threads   %8.0f joints a second   %.3f %% fail%n",
          threads,
          outcome.count() / seconds,
          100 * outcome.failed());
    }
  }

  private static Outcome run(Joint joint, int threads) throws InterruptedException {
    return MonteCarlo.run(joint, Margin.WORST, COUNT, 1, threads, outcome -> {}, () -> false);
  }
}

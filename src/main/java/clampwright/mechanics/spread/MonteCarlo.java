package clampwright.mechanics.spread;

import clampwright.joint.Joint;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;

/**
 * Many joints with all inputs off at once, drawn at random. Joints are drawn in blocks, each from a
 * seed of its own, so that the same seed gives the same joints whatever the number of threads.
 */
public final class MonteCarlo {
  static final int BLOCK = 512;
  private static final long BETWEEN_SHOWN = 60;

  private final Joint joint;
  private final Margin margin;
  private final List<Input> inputs;
  private final long seed;
  private final double[] margins;
  private final AtomicInteger next = new AtomicInteger();
  private final AtomicReference<Throwable> failure = new AtomicReference<>();
  private final BooleanSupplier cancelled;

  private MonteCarlo(Joint joint, Margin margin, int count, long seed, BooleanSupplier cancelled) {
    this.joint = joint;
    this.margin = margin;
    this.seed = seed;
    this.cancelled = cancelled;
    inputs = Inputs.of(joint);
    margins = new double[count];
    Arrays.fill(margins, Double.POSITIVE_INFINITY);
  }

  /**
   * Runs on as many threads as asked; the caller waits, and so must not be the one that paints.
   *
   * @param count number of joints, above 0
   * @param seed of the random numbers
   * @param threads 1 or more
   * @param shown is given what there is so far, now and then; from the caller's thread
   * @param cancelled asked often; true ends the run with what there is so far
   * @return what came out
   * @throws InterruptedException when the caller is interrupted; the run has ended then
   */
  public static Outcome run(
      Joint joint,
      Margin margin,
      int count,
      long seed,
      int threads,
      Consumer<Outcome> shown,
      BooleanSupplier cancelled)
      throws InterruptedException {
    return new MonteCarlo(joint, margin, count, seed, cancelled).run(threads, shown);
  }

  private Outcome run(int threads, Consumer<Outcome> shown) throws InterruptedException {
    CountDownLatch ended = new CountDownLatch(threads);
    ExecutorService executor = Executors.newFixedThreadPool(threads);
    try {
      for (int i = 0; i < threads; i++) {
        executor.execute(() -> work(ended));
      }
      while (!ended.await(BETWEEN_SHOWN, TimeUnit.MILLISECONDS)) {
        shown.accept(soFar());
      }
    } finally {
      executor.shutdownNow();
    }
    if (failure.get() != null) {
      throw new IllegalStateException("a random joint could not be drawn", failure.get());
    }
    return soFar();
  }

  private void work(CountDownLatch ended) {
    try {
      for (int block = next.getAndIncrement();
          block * (long) BLOCK < margins.length && !isOver();
          block = next.getAndIncrement()) {
        draw(block);
      }
    } catch (RuntimeException | Error unexpected) {
      failure.compareAndSet(null, unexpected);
    } finally {
      ended.countDown();
    }
  }

  private boolean isOver() {
    return cancelled.getAsBoolean() || failure.get() != null || Thread.interrupted();
  }

  private void draw(int block) {
    Draw draw = new Draw(inputs, seed, block);
    int from = block * BLOCK;
    int to = Math.min(margins.length, from + BLOCK);
    double[] off = new double[inputs.size()];
    for (int i = from; i < to; i++) {
      draw.into(off);
      margins[i] = margin.value(Strayed.of(joint, inputs, off));
    }
  }

  /** What there is so far; positive infinity stands for what has not been drawn. */
  private Outcome soFar() {
    return Outcome.of(margins);
  }
}

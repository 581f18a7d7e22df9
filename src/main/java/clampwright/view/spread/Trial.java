package clampwright.view.spread;

import clampwright.joint.Joint;
import clampwright.mechanics.spread.Margin;
import clampwright.mechanics.spread.MonteCarlo;
import clampwright.mechanics.spread.Outcome;
import javafx.application.Platform;
import javafx.concurrent.Task;

/** A Monte-Carlo run off the thread that paints; its value is what there is so far. */
final class Trial extends Task<Outcome> {
  static final int COUNT = 100_000;

  /** So that the same sketch gives the same answer. */
  static final long SEED = 20_261_201;

  private final Joint joint;
  private final Margin margin;

  Trial(Joint joint, Margin margin) {
    this.joint = joint;
    this.margin = margin;
  }

  @Override
  protected Outcome call() throws InterruptedException {
    int threads = Math.max(1, Runtime.getRuntime().availableProcessors() - 1);
    return MonteCarlo.run(joint, margin, COUNT, SEED, threads, this::show, this::isCancelledNow);
  }

  private volatile boolean stopped;

  /** Asked from the threads that draw, where the task's own property must not be read. */
  private boolean isCancelledNow() {
    return stopped;
  }

  @Override
  public boolean cancel(boolean mayInterrupt) {
    stopped = true;
    return super.cancel(false);
  }

  private void show(Outcome outcome) {
    updateValue(outcome);
    updateProgress(outcome.count(), COUNT);
  }

  /** Starts it on a thread that does not keep the program alive. */
  void start() {
    Thread thread = new Thread(this, "monte-carlo");
    thread.setDaemon(true);
    thread.start();
    assert Platform.isFxApplicationThread();
  }
}

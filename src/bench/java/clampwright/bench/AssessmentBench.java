package clampwright.bench;

import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.checks.Checks;
import clampwright.mechanics.checks.Verdict;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Assessing a 12-layer joint by all methods. House target: at most 10 µs without strips. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 8, time = 1)
public class AssessmentBench {
  private final Joint plain = TwelveLayers.with(Outline.WIDE);
  private final Joint loaded = TwelveLayers.loaded(8, 3);
  private final Joint strips = TwelveLayers.with(new Outline.Strip(14, 18));

  /** Round and wide parts only. */
  @Benchmark
  public Assessment withoutStrips() {
    return Assessment.of(plain);
  }

  /** Eight load cases at three temperatures, all checks by all methods; target at most 50 µs. */
  @Benchmark
  public List<Verdict> allChecks() {
    return Checks.of(loaded, (Assessment.Solved) Assessment.of(loaded));
  }

  /** Every other layer cut by straight edges: quadrature instead of closed forms. */
  @Benchmark
  public Assessment withStrips() {
    return Assessment.of(strips);
  }
}

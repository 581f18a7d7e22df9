package clampwright.bench;

/**
 * Starts a benchmark by name: {@code mvn -Pbench test -Dbench=assessment}. Speed is shown here,
 * never in a timed unit test.
 */
public final class Benches {
  private Benches() {}

  /** Runs the benchmark that the first argument names. */
  public static void main(String[] arguments) throws Exception {
    String name = arguments.length == 0 ? "" : arguments[0];
    switch (name) {
      case "assessment" -> org.openjdk.jmh.Main.main(new String[] {"AssessmentBench"});
      case "frame" -> FrameBench.run();
      case "startup" -> StartupBench.run();
      case "spread" -> SpreadBench.run();
      case "picture" -> PictureBench.run();
      default ->
          throw new IllegalArgumentException(
              "no benchmark is called '"
                  + name
                  + "'; there are: assessment, frame, startup,"
                  + " spread, picture");
    }
  }
}

package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Joints;
import clampwright.joint.Sketch;
import clampwright.quantity.UnitSystem;
import clampwright.store.SketchFile;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.statistics.Statistics;

/** Whatever joint the records allow, the command line answers with readouts or with reasons. */
class WildJointTest {

  private static int exit(Sketch sketch) throws IOException {
    Path file = Files.createTempFile("wild", SketchFile.EXTENSION);
    try {
      SketchFile.write(sketch, file);
      Run run = Run.of("found", file.toString(), "--json");
      assertTrue(run.exit() == 0 || run.exit() == 3, () -> run.exit() + " " + run.err());
      assertEquals(run.exit() == 0, run.err().isEmpty());
      assertFalse(run.out().contains("NaN") || run.out().contains("Infinity"), run.out());
      return run.exit();
    } finally {
      Files.delete(file);
    }
  }

  @Property(tries = 100, edgeCases = EdgeCasesMode.NONE)
  void anyJointIsAnswered(@ForAll("wild") Sketch sketch) throws IOException {
    Statistics.collect(exit(sketch));
  }

  @Property(tries = 300, edgeCases = EdgeCasesMode.NONE)
  void jointsThatFitAreAnsweredAndMostlyFound(@ForAll("fitting") Sketch sketch) throws IOException {
    Statistics.collect(exit(sketch));
    Statistics.coverage(coverage -> coverage.check(0).percentage(share -> share > 50));
  }

  @Provide
  Arbitrary<Sketch> wild() {
    return Joints.sketches();
  }

  @Provide
  Arbitrary<Sketch> fitting() {
    return Joints.fitting().map(joint -> new Sketch("fitting", joint, UnitSystem.METRIC));
  }
}

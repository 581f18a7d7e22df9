package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;

import clampwright.joint.Joints;
import clampwright.joint.Sketch;
import java.util.List;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** What is written reads back as it was. */
class RoundTripTest {

  @Property(tries = 500, edgeCases = EdgeCasesMode.NONE)
  void anySketchReadsBackEqual(@ForAll("sketches") Sketch sketch) {
    assertEquals(new Stored.Opened(sketch, List.of()), SketchJson.read(SketchJson.of(sketch)));
  }

  /** The text of a sketch is settled by the sketch alone. */
  @Property(tries = 200, edgeCases = EdgeCasesMode.NONE)
  void writingTwiceGivesTheSameText(@ForAll("sketches") Sketch sketch) {
    String text = SketchJson.of(sketch);
    Stored.Opened opened = (Stored.Opened) SketchJson.read(text);
    assertEquals(text, SketchJson.of(opened.sketch()));
  }

  @Provide
  Arbitrary<Sketch> sketches() {
    return Joints.sketches();
  }
}

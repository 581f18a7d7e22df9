package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Joints;
import clampwright.joint.Sketch;
import java.util.List;
import java.util.Random;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Reading answers with a sketch or with problems, whatever the text. */
class WildTextTest {
  private static final List<String> PIECES =
      List.of(
          "{",
          "}",
          "[",
          "]",
          ":",
          ",",
          "\"",
          "\\",
          "\\u12",
          "null",
          "true",
          "NaN",
          "-Infinity",
          "1e999",
          "-1",
          "-0.0",
          "0",
          "1e-400",
          "\"x\": 1,",
          "\"format\": 2,",
          "\u0000",
          "\uFEFF",
          "\uD800",
          "/* */",
          "'",
          "\n",
          "99999999999999999999999999",
          "{\"a\":",
          "[[[[[[[[");

  /** A piece of a text cut out, doubled, or replaced by something that does not belong there. */
  private static String mutated(String text, long seed) {
    Random random = new Random(seed);
    StringBuilder mutated = new StringBuilder(text);
    for (int steps = 1 + random.nextInt(3); steps > 0; steps--) {
      int from = random.nextInt(mutated.length() + 1);
      int to = Math.min(mutated.length(), from + random.nextInt(12));
      String cut = mutated.substring(from, to);
      switch (random.nextInt(5)) {
        case 0 -> mutated.delete(from, to);
        case 1 -> mutated.insert(from, cut.repeat(1 + random.nextInt(3)));
        case 2 -> mutated.replace(from, to, PIECES.get(random.nextInt(PIECES.size())));
        case 3 -> mutated.insert(from, PIECES.get(random.nextInt(PIECES.size())));
        default -> mutated.setLength(Math.max(from, 1));
      }
    }
    return mutated.toString();
  }

  private static void checkAnswer(String text) {
    Stored stored = SketchJson.read(text);
    List<String> lines =
        stored instanceof Stored.Refused refused
            ? refused.problems()
            : ((Stored.Opened) stored).remarks();
    assertFalse(stored instanceof Stored.Refused && lines.isEmpty(), text);
    for (String line : lines) {
      assertTrue(!line.isBlank() && line.length() < 250 && line.lines().count() == 1, line);
      assertFalse(line.contains("gson") || line.contains("Exception"), line);
    }
    if (stored instanceof Stored.Opened opened) {
      Stored again = SketchJson.read(SketchJson.of(opened.sketch()));
      assertEquals(new Stored.Opened(opened.sketch(), List.of()), again);
    }
  }

  @Property(tries = 3000, edgeCases = EdgeCasesMode.NONE)
  void mutatedSketchesAreAnswered(@ForAll("texts") String text) {
    checkAnswer(text);
  }

  @Property(tries = 500, edgeCases = EdgeCasesMode.NONE)
  void anyTextIsAnswered(@ForAll String text) {
    checkAnswer(text);
  }

  /** Every place where a file on a failing disk could end. */
  @Example
  void aSketchCutOffAnywhereIsRefused() {
    String text = Texts.SHORTEST.strip();
    for (int end = 0; end < text.length(); end++) {
      assertEquals(1, Texts.problems(text.substring(0, end)).size());
    }
  }

  @Provide
  Arbitrary<String> texts() {
    Arbitrary<String> sound =
        Arbitraries.oneOf(
            Arbitraries.just(Texts.SHORTEST), Joints.sketches().map(WildTextTest::written));
    return Combinators.combine(sound, Arbitraries.longs()).as(WildTextTest::mutated);
  }

  private static String written(Sketch sketch) {
    return SketchJson.of(sketch);
  }
}

package clampwright.figure.working;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.Assessment;
import clampwright.quantity.UnitSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Workings of joints whose numbers somebody else has worked out. */
class PublishedWorkingTest {

  private static Working inches(Joint joint, Part part) {
    return Working.of(part, joint, Assessment.of(joint), UnitSystem.INCH, 0);
  }

  private static Working inches(Joint joint, Headline headline) {
    return Working.of(headline, joint, Assessment.of(joint), UnitSystem.INCH, 0);
  }

  /** Shigley ex. 8-2 and solutions, 8th ed.: frusta in Mlbf/in (from memory, recomputed). */
  @ParameterizedTest
  @CsvSource({
    "0, Full frusta, 97.27",
    "2, 'Full frusta, piece 1', 285.5",
    "2, 'Full frusta, piece 2', 14.15"
  })
  void frustaOfTheExample(int element, String label, double expected) {
    Step step = Follow.step(inches(Examples.shigley(14.5), Part.element(element)), label);
    assertEquals("Shigley eq. 8-19", step.source());
    assertEquals(expected, Expression.value(step.numbers()), 3e-4 * expected);
    assertTrue(step.result().endsWith(" Mlbf/in"), step.result());
  }

  /** Shigley ex. 8-2a and 8-2b, full frusta, 9.378 and 14.64 Mlbf/in (same). */
  @ParameterizedTest
  @CsvSource({"14.5, 9.378, 9.38 Mlbf/in", "30, 14.64, 14.6 Mlbf/in"})
  void membersOfTheExample(double lower, double expected, String result) {
    Joint joint = Examples.shigley(lower);
    joint = joint.withMethod(joint.method().withStiffness(StiffnessMethod.FULL_FRUSTA));
    Step step = inches(joint, Headline.MEMBERS).steps().get(0);
    assertEquals("Members k_m, full frusta", step.label());
    assertEquals(expected, Expression.value(step.numbers()), 2e-4 * expected);
    assertEquals(result, step.result());
  }

  /** Shigley ex. 8-2c, Wileman's fit for steel, 14.92 Mlbf/in (same). */
  @Test
  void wilemanOfTheExample() {
    Working working = inches(Examples.shigley(30), Headline.MEMBERS);
    Step step = Follow.step(working, "Beside it, Wileman 1991");
    assertEquals("30 × 0.5 × 0.78715 × exp(0.62873 × 0.5 / 1.345)", step.numbers());
    assertEquals(14.92, Expression.value(step.numbers()), 0.005);
  }

  /**
   * Shigley ex. 8-2d: bolt 3.69 Mlbf/in (same; recomputed 3.694 with the table's stress area 0.1599
   * in², where the formula gives 0.15995); lengths of shank and thread as printed.
   */
  @Test
  void boltOfTheExample() {
    Working working = inches(Examples.shigley(30), Headline.BOLT);
    assertEquals("30 × π / 4 × 0.5² / 0.25", Follow.step(working, "Shank").numbers());
    assertEquals(
        "30 × π / 4 × (0.5 − 0.974279 × 0.05)² / 1.095",
        Follow.step(working, "Thread in the grip").numbers());
    Step bolt = Follow.step(working, "Bolt k_b");
    assertEquals(3.694, Expression.value(bolt.numbers()), 0.0015);
    assertEquals("Shigley eq. 8-17", bolt.source());
  }

  /** Edges 9 and 12 mm cut a disc of radius 15 mm: own arithmetic by two routes, not published. */
  @ParameterizedTest
  @CsvSource({
    "Cut off by the left edge, 100.6414",
    "Cut off by the right edge, 36.7877",
    "Area, 474.3960",
    "Effective diameter, 26.9262",
    "Stiffness, 2405.87"
  })
  void edgesCutTheDisc(String label, double expected) {
    Joint joint = Examples.strip();
    Working working =
        Working.of(Part.element(0), joint, Assessment.of(joint), UnitSystem.METRIC, 0);
    double followed = Expression.value(Follow.step(working, label).numbers());
    assertEquals(expected, followed, 1e-5 * expected);
  }
}

package clampwright.figure.working;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.checks.Checks;
import clampwright.quantity.UnitSystem;
import java.util.ArrayList;
import java.util.List;

/** Follows workings: what the numbers put in come to must be the result that stands there. */
final class Follow {
  private Follow() {}

  /** The workings of every part and every readout. */
  static List<Working> all(Joint joint, Assessment assessment, UnitSystem units) {
    List<Working> workings = new ArrayList<>();
    for (Headline headline : Headline.values()) {
      workings.add(Working.of(headline, joint, assessment, units, 0));
    }
    if (assessment instanceof Assessment.Solved solved) {
      Checks.of(joint, solved)
          .forEach(verdict -> workings.add(Working.of(verdict, joint, assessment, units)));
    }
    List<Part> parts =
        new ArrayList<>(
            List.of(
                Part.JOINT,
                Part.HEAD,
                Part.SHANK,
                Part.ANCHOR,
                Part.LOAD,
                Part.PRELOAD,
                Part.HEAD_CONE));
    parts.add(Part.NUT_CONE);
    for (int i = 0; i < joint.elements().size(); i++) {
      parts.add(Part.element(i));
    }
    parts.forEach(part -> workings.add(Working.of(part, joint, assessment, units, 0)));
    return workings;
  }

  static void check(Working working) {
    assertFalse(working.title().isBlank());
    assertFalse(working.steps().isEmpty(), working::title);
    working.steps().forEach(Follow::check);
  }

  /** Half of the result's last place, and a little of what six figures leave open. */
  static void check(Step step) {
    assertFalse(step.label().isBlank() || step.formula().isBlank(), step::toString);
    if (step.isRemark() || step.numbers().isEmpty()) {
      return;
    }
    assertFalse(step.source().isBlank(), step::toString);
    boolean least = step.numbers().startsWith("≥ ");
    String numbers = least ? step.numbers().substring(2) : step.numbers();
    double followed = Expression.value(numbers);
    double stands = number(step.result());
    if (least) {
      assertTrue(stands >= followed * (1 - 1e-5), step::toString);
      return;
    }
    double open =
        0.51 * lastPlace(step.result())
            + 1e-3 * Math.abs(stands)
            + 1e-5 * Expression.largest(numbers);
    assertEquals(stands, followed, open, step::toString);
  }

  static double number(String result) {
    return Double.parseDouble(digits(result));
  }

  private static double lastPlace(String result) {
    String digits = digits(result);
    int point = digits.indexOf('.');
    return point < 0 ? 1 : Math.pow(10, point + 1 - digits.length());
  }

  private static String digits(String result) {
    return result.replace("\u2009", "").replace('\u2212', '-').split("[ °]")[0];
  }

  /** The step of this label. */
  static Step step(Working working, String label) {
    return working.steps().stream()
        .filter(step -> step.label().equals(label))
        .findFirst()
        .orElseThrow(() -> new AssertionError("no '" + label + "' in " + working));
  }
}

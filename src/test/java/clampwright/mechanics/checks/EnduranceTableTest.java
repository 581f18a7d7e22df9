package clampwright.mechanics.checks;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Strength;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Shigley table 8-17: SAE classes in ksi, ISO classes in MPa. */
class EnduranceTableTest {
  private static final double KSI = 6.894757293168361;

  private static Strength strength(String grade) {
    return new Strength("", grade, OptionalDouble.empty(), OptionalDouble.empty(), 800);
  }

  @ParameterizedTest
  @CsvSource({"8.8, 129", "9.8, 140", "10.9, 162", "12.9, 190"})
  void metric(String grade, double expected) {
    assertEquals(expected, Endurance.shigley(strength(grade), 12).orElseThrow(), 1e-9);
  }

  @ParameterizedTest
  @CsvSource({"5, 25.4, 18.6", "5, 28.575, 16.3", "8, 12.7, 23.2"})
  void inch(String grade, double diameter, double expected) {
    double found = Endurance.shigley(strength(grade), diameter).orElseThrow();
    assertEquals(expected, found / KSI, 1e-9);
  }

  @Test
  void anotherClassHasNone() {
    assertTrue(Endurance.shigley(strength("4.6"), 12).isEmpty());
  }
}

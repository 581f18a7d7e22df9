package clampwright.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Conversions: 25.4 mm/in and 4.4482216152605 N/lbf exactly (NIST SP 811, appendix B). */
class QuantityTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "6        | LENGTH | METRIC | 6",
        "6,5      | LENGTH | METRIC | 6.5",
        "6.5 mm   | LENGTH | METRIC | 6.5",
        "6.5 mm   | LENGTH | INCH   | 6.5",
        "1/4 in   | LENGTH | METRIC | 6.35",
        "0.25in   | LENGTH | METRIC | 6.35",
        "0.25     | LENGTH | INCH   | 6.35",
        "1 1/4\"  | LENGTH | METRIC | 31.75",
        ",5       | LENGTH | METRIC | 0.5",
        "−2       | LENGTH | METRIC | -2",
        "-2       | LENGTH | METRIC | -2",
        "8 µm     | LENGTH | METRIC | 0.008",
        "0.007    | LENGTH | INCH   | 0.1778",
        "3/16     | LENGTH | INCH   | 4.7625",
        "2700 lbf | FORCE  | METRIC | 12010.19836120335",
        "12 kN    | FORCE  | METRIC | 12000",
        "12       | FORCE  | METRIC | 12000",
        "450 N    | FORCE  | INCH   | 450",
        "100 lbf  | FORCE  | METRIC | 444.82216152605",
        "30°      | ANGLE  | METRIC | 0.5235987755982988",
        "30 deg   | ANGLE  | INCH   | 0.5235987755982988",
        "1e3 N    | FORCE  | METRIC | 1000",
        "1234.5   | LENGTH | METRIC | 1234.5",
        "60 %     | RATIO  | METRIC | 0.6",
        "30 Mpsi  | MODULUS| METRIC | 206842.71879505084",
      })
  void understood(String text, Dimension dimension, UnitSystem system, double expected) {
    Reading.Value value =
        assertInstanceOf(Reading.Value.class, Reading.of(text, dimension, system));
    assertEquals(expected, value.value());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "  ",
        "abc",
        "3.14abc",
        "1.234,5",
        "1,234.5",
        "1/0",
        "6 lbf",
        "--2",
        "1e999",
        "mm",
        "1//2",
        "NaN",
        "Infinity",
        "6 5",
        "0x10",
        "6.5.5"
      })
  void notUnderstood(String text) {
    Reading.Wrong wrong =
        assertInstanceOf(
            Reading.Wrong.class, Reading.of(text, Dimension.LENGTH, UnitSystem.METRIC));
    assertTrue(wrong.problem().length() > 10, wrong::problem);
  }

  /** Each sentence names what was not understood, and gives an example where that helps. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "3.14abc | 'abc' is no unit here; such as 6.5 or 1/4 in.",
        "6 lbf   | 'lbf' is no unit here; such as 6.5 or 1/4 in.",
        "1/0     | '1/0' divides by 0; such as 1/4.",
        "1e999   | '1e999' is too large; such as 6.5 or 1/4 in.",
        "1.234,5 | One decimal mark only, and none between thousands: 1234.5",
        "--2     | '--2' is not a number; such as 6.5 or 1/4 in.",
      })
  void whatIsWrongIsNamed(String text, String problem) {
    assertEquals(new Reading.Wrong(problem), Reading.of(text, Dimension.LENGTH, UnitSystem.METRIC));
  }

  @ParameterizedTest
  @CsvSource({
    "LENGTH, METRIC, 16.634, 16.63",
    "LENGTH, INCH, 6.35, 0.250",
    "STIFFNESS, METRIC, 1325400, 1325",
    "STIFFNESS, METRIC, 13388000, 13\u2009388",
    "STIFFNESS, INCH, 1642e3, 9.38",
    "FORCE, METRIC, 20940, 20.9",
    "FORCE, INCH, 20950, 4710",
    "RATIO, METRIC, 0.0983, 0.098",
    "FORCE, METRIC, -1500, \u22121.50",
    "FORCE, METRIC, -0.1, 0.000",
  })
  void readout(Dimension dimension, UnitSystem system, double value, String expected) {
    assertEquals(expected, Quantities.number(dimension, system, value));
  }

  @ParameterizedTest
  @CsvSource({
    "LENGTH, METRIC, 16, 16",
    "LENGTH, METRIC, 2.5, 2.5",
    "LENGTH, METRIC, 100, 100",
    "LENGTH, INCH, 25.4, 1",
  })
  void trimmed(Dimension dimension, UnitSystem system, double value, String expected) {
    assertEquals(expected, Quantities.trimmed(dimension, system, value));
  }

  @ParameterizedTest
  @CsvSource({
    "LENGTH, METRIC, 6.5, 6.5",
    "LENGTH, INCH, 6.35, 0.25",
    "FORCE, METRIC, 25000, 25",
    "LENGTH, INCH, 2.54, 0.1",
    "RATIO, METRIC, 0, 0",
    "LENGTH, METRIC, 100, 100",
    "LENGTH, INCH, 0.1778, 0.007",
    "ANGLE, METRIC, 0.5235987755982988, 30",
    "LENGTH, METRIC, -2.5, -2.5",
    "STRESS, INCH, 634.3176709714893, 92",
  })
  void field(Dimension dimension, UnitSystem system, double value, String expected) {
    assertEquals(expected, Quantities.field(dimension, system, value));
  }

  @Property
  void unitsRoundTrip(
      @ForAll Dimension dimension,
      @ForAll UnitSystem system,
      @ForAll @DoubleRange(min = -1e6, max = 1e6) double value) {
    double there = Quantities.shown(dimension, system, value);
    // The zeros of °F and °C lie apart, which costs the last bits of small temperatures.
    double size = Math.max(Math.abs(value), dimension == Dimension.TEMPERATURE ? 50 : 0);
    assertEquals(value, Quantities.inside(dimension, system, there), 1e-15 * size);
  }

  @Property
  void whatAFieldShowsReadsBack(
      @ForAll Dimension dimension,
      @ForAll UnitSystem system,
      @ForAll @DoubleRange(min = -1e6, max = 1e6) double value) {
    String text = Quantities.field(dimension, system, value);
    Reading.Value read = assertInstanceOf(Reading.Value.class, Reading.of(text, dimension, system));
    assertEquals(value, read.value());
  }
}

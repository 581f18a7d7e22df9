package clampwright.joint;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

/** What the records say to values that can never be right: the value, its unit and the limit. */
class RefusalTest {
  private static final Material STEEL =
      new Material(
          "steel", Material.Family.STEEL, 206_000, OptionalDouble.empty(), OptionalDouble.empty());

  private static void checkRefused(String words, Executable making) {
    assertEquals(words, assertThrows(IllegalArgumentException.class, making).getMessage());
  }

  private static Element layer(double thickness) {
    return new Element("", Element.Kind.LAYER, thickness, 11, Outline.WIDE, STEEL);
  }

  @Test
  void aValueIsNamedWithItsUnitAndATrueMinus() {
    checkRefused("thickness −2 mm must be above 0", () -> layer(-2));
    checkRefused("thickness 0 mm must be above 0", () -> layer(0));
    checkRefused("thickness −0.25 mm must be above 0", () -> layer(-0.25));
    checkRefused("preload −1000 N must be 0 or more", () -> new Target.Force(-1000));
  }

  @Test
  void whatIsNoFiniteNumberIsRefused() {
    checkRefused("thickness NaN mm must be above 0", () -> layer(Double.NaN));
    checkRefused("thickness Infinity mm must be above 0", () -> layer(Double.POSITIVE_INFINITY));
    checkRefused(
        "least axial load NaN N must be a finite number", () -> LoadCase.steady("", Double.NaN, 1));
  }

  @Test
  void aValueOutsideItsRangeIsNamedWithTheRange() {
    checkRefused(
        "load-introduction factor 1.5 must lie between 0 and 1", () -> LoadCase.steady("", 0, 1.5));
    checkRefused(
        "pitch 6 mm must be at most half the thread diameter",
        () -> new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 6));
  }

  /** Twelve figures are enough to know a value again; noise behind them is not for a reader. */
  @Test
  void longNumbersAreCutToWhatAReaderCanUse() {
    checkRefused("thickness −0.1 mm must be above 0", () -> layer(-0.1));
    checkRefused("thickness −0.333333333333 mm must be above 0", () -> layer(-1.0 / 3));
    checkRefused("thickness −1E+30 mm must be above 0", () -> layer(-1e30));
  }
}

package clampwright.quantity;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * A unit. Its size is kept in decimal, so that what is typed becomes the nearest number to what was
 * meant: 0.007 in is 0.1778 mm, not 0.17779999999999999.
 *
 * @param symbol as shown and typed
 * @param exact how much of the inside unit it is
 * @param size the same, for display
 * @param offset what 0 of this unit is in the inside unit; 0 but for degrees Fahrenheit
 */
record Unit(String symbol, BigDecimal exact, double size, BigDecimal offset) {
  /** Inch [mm] and pound-force [N], exact by definition (NIST SP 811, appendix B). */
  static final String INCH = "25.4";

  static final String POUND = "4.4482216152605";

  /** As {@link Math#toRadians} has it, so that degrees typed and degrees computed meet. */
  static final String DEGREE = new BigDecimal(Math.toRadians(1)).toString();

  private static final MathContext FIGURES = new MathContext(40);

  /** °F as °C, (F − 32)·5/9. */
  static final Unit FAHRENHEIT =
      new Unit("°F", ninths("5"), ninths("5").doubleValue(), ninths("-160"));

  private Unit(String symbol, BigDecimal exact) {
    this(symbol, exact, exact.doubleValue(), BigDecimal.ZERO);
  }

  private static BigDecimal ninths(String count) {
    return new BigDecimal(count).divide(new BigDecimal(9), FIGURES);
  }

  static Unit of(String symbol, String size) {
    return new Unit(symbol, new BigDecimal(size));
  }

  /** So many pounds-force per square inch. */
  static Unit psi(String symbol, String times) {
    return of(symbol, times).times(POUND).per(INCH).per(INCH);
  }

  Unit times(String factor) {
    return new Unit(symbol, exact.multiply(new BigDecimal(factor), FIGURES));
  }

  Unit per(String divisor) {
    return new Unit(symbol, exact.divide(new BigDecimal(divisor), FIGURES));
  }

  /** A number of this unit in the unit inside the program: the double nearest to it. */
  double inside(BigDecimal number) {
    return number.multiply(exact, FIGURES).add(offset).doubleValue();
  }

  /** A finite value inside the program in this unit. */
  BigDecimal shown(double value) {
    return new BigDecimal(value).subtract(offset).divide(exact, FIGURES);
  }
}

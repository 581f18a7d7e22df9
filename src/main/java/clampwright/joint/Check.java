package clampwright.joint;

import java.math.BigDecimal;
import java.math.MathContext;

/**
 * The checks that the records of this package share. Messages name the value and the limit, such as
 * "thickness −2 mm must be above 0".
 */
final class Check {
  private Check() {}

  static double positive(String what, String unit, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw refused(what, unit, value, "must be above 0");
    }
    return value;
  }

  static double notNegative(String what, String unit, double value) {
    if (!(value >= 0) || Double.isInfinite(value)) {
      throw refused(what, unit, value, "must be 0 or more");
    }
    return value;
  }

  static double finite(String what, String unit, double value) {
    if (!Double.isFinite(value)) {
      throw refused(what, unit, value, "must be a finite number");
    }
    return value;
  }

  /** Absolute zero is −273.15 °C. */
  static double temperature(String what, double celsius) {
    if (!(celsius >= -273.15) || Double.isInfinite(celsius)) {
      throw refused(what, "°C", celsius, "must not be below absolute zero, −273.15 °C");
    }
    return celsius;
  }

  static double between(String what, double low, double value, double high) {
    if (!(value >= low && value <= high)) {
      throw refused(what, "", value, "must lie between " + text(low) + " and " + text(high));
    }
    return value;
  }

  static IllegalArgumentException refused(String what, String unit, double value, String rule) {
    String measured = unit.isEmpty() ? text(value) : text(value) + " " + unit;
    return new IllegalArgumentException(what + " " + measured + " " + rule);
  }

  private static String text(double value) {
    if (!Double.isFinite(value)) {
      return Double.toString(value);
    }
    BigDecimal number = new BigDecimal(value).round(new MathContext(12)).stripTrailingZeros();
    boolean plain = Math.abs(number.precision() - number.scale()) < 16;
    return (plain ? number.toPlainString() : number.toString()).replace('-', '\u2212');
  }
}

package clampwright.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;

/** Formats values for a reader. All methods are locale-independent: a dot is the decimal mark. */
public final class Quantities {
  private static final char MINUS = '\u2212';
  private static final char THIN_SPACE = '\u2009';

  /** One more than a double needs, for the way through a conversion. */
  private static final int MOST_FIGURES = 18;

  private Quantities() {}

  /** The unit as shown, such as {@code kN/mm}; empty for a ratio. */
  public static String unit(Dimension dimension, UnitSystem system) {
    return dimension.shown(system).symbol();
  }

  /** Value in the shown unit. */
  public static double shown(Dimension dimension, UnitSystem system, double value) {
    Unit unit = dimension.shown(system);
    return unit.offset().signum() == 0 ? value / unit.size() : unit.shown(value).doubleValue();
  }

  /**
   * Value inside the program from one in the shown unit, taken for the decimal that it prints as:
   * 0.007 in is 0.1778 mm.
   */
  public static double inside(Dimension dimension, UnitSystem system, double shown) {
    Unit unit = dimension.shown(system);
    return Double.isFinite(shown) ? unit.inside(BigDecimal.valueOf(shown)) : shown;
  }

  /**
   * A readout without its unit, to the digits a reader can use: lengths to 0.01 mm or 0.001 in, the
   * rest to three figures, thousands parted by a thin space, a true minus.
   */
  public static String number(Dimension dimension, UnitSystem system, double value) {
    double shown = shown(dimension, system, value);
    return grouped(
        String.format(Locale.ROOT, "%." + decimals(dimension, system, shown) + "f", shown));
  }

  /** A number of a column: as many decimals as its neighbours have. */
  public static String number(Dimension dimension, UnitSystem system, double value, int decimals) {
    double shown = shown(dimension, system, value);
    return grouped(String.format(Locale.ROOT, "%." + decimals + "f", shown));
  }

  /** A readout with its unit. */
  public static String text(Dimension dimension, UnitSystem system, double value) {
    return withUnit(number(dimension, system, value), dimension, system);
  }

  /** Like number, without the zeros that end it: 16, 2.5. */
  public static String trimmed(Dimension dimension, UnitSystem system, double value) {
    String number = number(dimension, system, value);
    return number.contains(".") ? number.replaceAll("\\.?0+$", "") : number;
  }

  /** Like trimmed, with its unit. */
  public static String trimmedText(Dimension dimension, UnitSystem system, double value) {
    return withUnit(trimmed(dimension, system, value), dimension, system);
  }

  /**
   * The shortest text, no unit, that reads back as exactly the same value: 6.5, and for 6.35 mm
   * 0.25 in inches. A number that is not finite has no such text and is shown as it is.
   */
  public static String field(Dimension dimension, UnitSystem system, double value) {
    if (!Double.isFinite(value)) {
      return Double.toString(value);
    }
    Unit unit = dimension.shown(system);
    BigDecimal shown = unit.shown(value);
    BigDecimal text = shown;
    for (int figures = 1; figures <= MOST_FIGURES; figures++) {
      text = shown.round(new MathContext(figures));
      if (unit.inside(text) == value) {
        break;
      }
    }
    return text.signum() == 0 ? "0" : text.stripTrailingZeros().toPlainString();
  }

  private static String withUnit(String number, Dimension dimension, UnitSystem system) {
    String unit = unit(dimension, system);
    return unit.isEmpty() ? number : unit.equals("°") ? number + unit : number + " " + unit;
  }

  private static int decimals(Dimension dimension, UnitSystem system, double shown) {
    boolean metric = system == UnitSystem.METRIC;
    double size = Math.abs(shown);
    return switch (dimension) {
      case LENGTH -> metric ? 2 : 3;
      case AREA -> metric ? 1 : 4;
      case ANGLE -> 1;
      case TEMPERATURE, TEMPERATURE_CHANGE -> 0;
      case SHARE -> size < 9.95 ? 1 : 0;
      case FORCE -> metric ? significant(size) : 0;
      default -> significant(size);
    };
  }

  private static int significant(double size) {
    return size >= 99.95 ? 0 : size >= 9.995 ? 1 : size >= 0.9995 ? 2 : 3;
  }

  private static String grouped(String plain) {
    boolean negative = plain.startsWith("-") && plain.chars().anyMatch(c -> c >= '1' && c <= '9');
    String digits = plain.startsWith("-") ? plain.substring(1) : plain;
    int point = digits.indexOf('.');
    int whole = point < 0 ? digits.length() : point;
    StringBuilder text = new StringBuilder(digits);
    if (whole > 4) {
      for (int i = whole - 3; i > 0; i -= 3) {
        text.insert(i, THIN_SPACE);
      }
    }
    return negative ? MINUS + text.toString() : text.toString();
  }
}

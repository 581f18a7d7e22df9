package clampwright.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Reads a typed number with an optional unit. */
final class TypedNumber {
  private static final Pattern FORM =
      Pattern.compile(
          "(?<sign>[-+\\u2212])?\\s*"
              + "(?:(?:(?<whole>\\d{1,9})[ \\u00a0]+)?(?<over>\\d{1,9})\\s*/\\s*(?<under>\\d{1,9})"
              + "|(?<decimal>\\d+(?:[.,]\\d*)?|[.,]\\d+)(?<power>[eE][-+]?\\d{1,3})?)"
              + "\\s*(?<unit>[^\\d\\s].*)?");

  private TypedNumber() {}

  static Reading read(String text, Dimension dimension, UnitSystem system) {
    String trimmed = text.strip();
    if (trimmed.isEmpty()) {
      return new Reading.Wrong("Type a number, such as " + example(dimension, system) + ".");
    }
    Matcher form = FORM.matcher(trimmed);
    if (!form.matches()) {
      return notUnderstood(trimmed, dimension, system);
    }
    String unit = form.group("unit");
    if (unit != null && unit.matches("[.,].*")) {
      return new Reading.Wrong("One decimal mark only, and none between thousands: 1234.5");
    }
    Optional<Unit> known = unit(unit, dimension, system);
    if (known.isEmpty()) {
      return new Reading.Wrong(
          "'" + unit + "' is no unit here; such as " + example(dimension, system) + ".");
    }
    if (form.group("under") != null && new BigDecimal(form.group("under")).signum() == 0) {
      return new Reading.Wrong("'" + trimmed + "' divides by 0; such as 1/4.");
    }
    BigDecimal magnitude = magnitude(form);
    double value = known.get().inside(negative(form) ? magnitude.negate() : magnitude);
    if (!Double.isFinite(value)) {
      return new Reading.Wrong(
          "'" + trimmed + "' is too large; such as " + example(dimension, system) + ".");
    }
    return new Reading.Value(value);
  }

  private static boolean negative(Matcher form) {
    String sign = form.group("sign");
    return sign != null && !sign.equals("+");
  }

  private static BigDecimal magnitude(Matcher form) {
    if (form.group("over") != null) {
      String whole = form.group("whole") == null ? "0" : form.group("whole");
      BigDecimal part =
          new BigDecimal(form.group("over"))
              .divide(new BigDecimal(form.group("under")), MathContext.DECIMAL128);
      return new BigDecimal(whole).add(part);
    }
    String power = form.group("power") == null ? "" : form.group("power");
    return new BigDecimal(form.group("decimal").replace(',', '.') + power);
  }

  /** The unit meant: the reader's system first, so that a symbol known to both stays in it. */
  private static Optional<Unit> unit(String typed, Dimension dimension, UnitSystem system) {
    if (typed == null) {
      return Optional.of(dimension.shown(system));
    }
    String symbol = plain(typed);
    UnitSystem other = system == UnitSystem.METRIC ? UnitSystem.INCH : UnitSystem.METRIC;
    return find(symbol, dimension, system).or(() -> find(symbol, dimension, other));
  }

  private static Optional<Unit> find(String symbol, Dimension dimension, UnitSystem system) {
    return dimension.units(system).stream()
        .filter(unit -> !unit.symbol().isEmpty() && plain(unit.symbol()).equals(symbol))
        .findFirst();
  }

  /** Units as people type them: case of letters and raised numbers do not matter. */
  private static String plain(String symbol) {
    return symbol
        .strip()
        .toLowerCase(Locale.ROOT)
        .replace("²", "2")
        .replace("^2", "2")
        .replace("\u03bc", "µ")
        .replace("um", "µm")
        .replace("''", "\"")
        .replace("\u2033", "\"")
        .replace("inch", "in")
        .replace("·", "")
        .replace(" ", "");
  }

  private static Reading notUnderstood(String text, Dimension dimension, UnitSystem system) {
    return new Reading.Wrong(
        "'" + text + "' is not a number; such as " + example(dimension, system) + ".");
  }

  private static String example(Dimension dimension, UnitSystem system) {
    boolean metric = system == UnitSystem.METRIC;
    return switch (dimension) {
      case LENGTH -> metric ? "6.5 or 1/4 in" : "1/4 or 6.5 mm";
      case FORCE -> metric ? "12.5 or 2800 lbf" : "2800 or 12.5 kN";
      case ANGLE -> "30";
      case TORQUE -> metric ? "48 or 35 lbf·ft" : "35 or 48 N·m";
      case TEMPERATURE -> metric ? "80 or 176 °F" : "176 or 80 °C";
      case SHARE -> "25";
      case COUNT -> "2";
      default -> "2.5";
    };
  }
}

package clampwright.view.field;

import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** How a number stands in a field, and by how much the arrow keys step it. */
final class FieldText {
  /** Enough for any number a person types. */
  private static final MathContext TYPED = new MathContext(7);

  /** Enough for one that comes out of a conversion, such as 25 mm in inches. */
  private static final MathContext CONVERTED = new MathContext(5);

  private static final MathContext EXACT = new MathContext(13);

  private FieldText() {}

  /**
   * The text of a field: all figures of a number as people type them, five of one that would go on
   * and on. Only text that has been edited is ever read back, so nothing is lost by looking.
   */
  static String of(Dimension dimension, UnitSystem units, double value) {
    BigDecimal exact = new BigDecimal(Quantities.shown(dimension, units, value)).round(EXACT);
    BigDecimal typed = exact.round(TYPED);
    BigDecimal shown = typed.compareTo(exact) == 0 ? typed : exact.round(CONVERTED);
    return shown.signum() == 0 ? "0" : shown.stripTrailingZeros().toPlainString();
  }

  /**
   * The next multiple of the step above or below a value [units inside the program].
   *
   * @param steps how many, negative for down
   */
  static double stepped(Dimension dimension, UnitSystem units, double value, int steps) {
    BigDecimal step = step(dimension, units);
    BigDecimal shown =
        new BigDecimal(Quantities.shown(dimension, units, value)).round(new MathContext(12));
    RoundingMode towards = steps > 0 ? RoundingMode.FLOOR : RoundingMode.CEILING;
    BigDecimal multiple = shown.divide(step, 0, towards).add(BigDecimal.valueOf(steps));
    return Quantities.inside(dimension, units, multiple.multiply(step).doubleValue());
  }

  private static BigDecimal step(Dimension dimension, UnitSystem units) {
    boolean metric = units == UnitSystem.METRIC;
    return new BigDecimal(
        switch (dimension) {
          case LENGTH -> metric ? "0.5" : "0.0625";
          case FORCE -> metric ? "0.5" : "100";
          case RATIO -> "0.05";
          case TEMPERATURE, TEMPERATURE_CHANGE -> "5";
          default -> "1";
        });
  }

  /**
   * A record's refusal as a sentence at the field: the value it names stands in the field already,
   * and there in the reader's units. Limits of a share are said in per cent, as it is read.
   */
  static String refusal(Dimension dimension, IllegalArgumentException refused) {
    String sentence = refused.getMessage().replaceFirst(" \\S*\\d\\S*( \\S+)? must ", " must ");
    if (dimension == Dimension.SHARE) {
      sentence = sentence.replaceFirst("\\b1$", "100 %");
    }
    return Character.toUpperCase(sentence.charAt(0)) + sentence.substring(1) + ".";
  }
}

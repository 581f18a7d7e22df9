package clampwright.figure;

import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Verdict;
import clampwright.quantity.Dimension;
import java.util.Locale;

/** Verdicts as they are read: signed margins, and a word beside every colour. */
public final class Verdicts {
  /** A margin below this is worth a second look (common practice, no source). */
  public static final double NARROW = 0.1;

  /** Beyond this a margin is only said to be large. */
  private static final double LARGE = 99.5;

  /** How a verdict is shown. */
  public enum Standing {
    PASSES,
    /** Passes with little left. */
    NARROWLY,
    FAILS,
    NOT_APPLICABLE
  }

  private Verdicts() {}

  /** How a verdict is shown. */
  public static Standing standing(Verdict verdict) {
    if (!(verdict instanceof Verdict.Judged judged)) {
      return Standing.NOT_APPLICABLE;
    }
    if (!judged.passes()) {
      return Standing.FAILS;
    }
    return judged.margin() < NARROW ? Standing.NARROWLY : Standing.PASSES;
  }

  /** A margin with its sign and two decimals; one that is large is only said to be so. */
  public static String margin(double margin) {
    return margin > LARGE ? "> +99" : signed(margin);
  }

  /**
   * With two decimals; four where it fails by less than a hundredth, and never rounded to 0 from
   * below: +0.00 holds, −0.0001 fails.
   */
  public static String signed(double margin) {
    if (margin < 0 && margin > -0.01) {
      return String.format(Locale.ROOT, "\u2212%.4f", Math.max(0.0001, -margin));
    }
    if (margin < 0) {
      return String.format(Locale.ROOT, "\u2212%.2f", -margin);
    }
    return String.format(Locale.ROOT, "+%.2f", margin);
  }

  /** What demand and capacity are measured in. */
  public static Dimension dimension(CheckKind kind) {
    return kind.measure() == CheckKind.Measure.FORCE ? Dimension.FORCE : Dimension.STRESS;
  }
}

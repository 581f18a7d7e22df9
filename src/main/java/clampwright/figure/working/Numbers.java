package clampwright.figure.working;

import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;

/**
 * Numbers in the reader's units. Put into a formula they have up to six figures, more than a
 * readout shows, so that whoever follows the arithmetic arrives at the readout. GPa·mm²/mm is kN/mm
 * and Mpsi·in²/in is Mlbf/in: no factors of ten come in between.
 *
 * @param units the reader's
 */
record Numbers(UnitSystem units) {
  private static final int FIGURES = 6;
  private static final int MOST_FIGURES = 15;
  private static final int LONGEST = 12;

  /** What a number too large or too small to compute with looks like. */
  private static final String BEYOND = "–";

  String length(double millimetres) {
    return put(Dimension.LENGTH, millimetres);
  }

  String area(double squareMillimetres) {
    return put(Dimension.AREA, squareMillimetres);
  }

  String modulus(double megapascals) {
    return put(Dimension.MODULUS, megapascals);
  }

  String stiffness(double newtonsPerMillimetre) {
    return put(Dimension.STIFFNESS, newtonsPerMillimetre);
  }

  String force(double newtons) {
    return put(Dimension.FORCE, newtons);
  }

  String ratio(double value) {
    return put(Dimension.RATIO, value);
  }

  String angle(double radians) {
    return put(Dimension.ANGLE, radians) + "°";
  }

  String stress(double megapascals) {
    return put(Dimension.STRESS, megapascals);
  }

  /** A torque such that divided by a length it is a force: N·m over mm, lbf·in over in. */
  String torque(double newtonMillimetres) {
    double inch = Quantities.inside(Dimension.LENGTH, UnitSystem.INCH, 1);
    double shown =
        units == UnitSystem.METRIC
            ? newtonMillimetres / 1000
            : newtonMillimetres / inch / Quantities.inside(Dimension.FORCE, UnitSystem.INCH, 1);
    return plain(shown);
  }

  /** A stiffness such that times a length it is a force: kN/mm, lbf/in. */
  String stiffnessOfForce(double newtonsPerMillimetre) {
    double shown = Quantities.shown(Dimension.STIFFNESS, units, newtonsPerMillimetre);
    return plain(units == UnitSystem.METRIC ? shown : 1e6 * shown);
  }

  /** A coefficient of expansion [1/K] in 10⁻⁶/K. */
  String expansion(double perKelvin) {
    return plain(1e6 * perKelvin);
  }

  /** A force over an area such that a stress comes out: kN over mm² is GPa, lbf over in² is psi. */
  String stressOf(String force, String area) {
    return units == UnitSystem.METRIC
        ? "1000 × " + force + " / " + area
        : force + " / (1000 × " + area + ")";
  }

  /** A number that has no unit to be converted. */
  String plain(double value) {
    return put(Dimension.RATIO, value);
  }

  String stressResult(double megapascals) {
    return result(Dimension.STRESS, megapascals);
  }

  /** A length with as many more figures as it takes when one so near is taken from it. */
  String length(double millimetres, double gap) {
    return put(Dimension.LENGTH, millimetres, figures(millimetres, gap));
  }

  /** The same for a ratio. */
  String ratio(double value, double gap) {
    return put(Dimension.RATIO, value, figures(value, gap));
  }

  private static int figures(double value, double gap) {
    int more = (int) Math.ceil(Math.log10(value / gap));
    return FIGURES + Math.max(0, Math.min(more - 2, MOST_FIGURES - FIGURES));
  }

  private String put(Dimension dimension, double value) {
    return put(dimension, value, FIGURES);
  }

  private String put(Dimension dimension, double value, int figures) {
    if (!Double.isFinite(value)) {
      return BEYOND;
    }
    BigDecimal shown =
        new BigDecimal(Quantities.shown(dimension, units, value)).round(new MathContext(figures));
    if (shown.signum() == 0) {
      return "0";
    }
    int wholeDigits = shown.precision() - shown.scale();
    boolean plain = Math.abs(wholeDigits) <= LONGEST;
    BigDecimal trimmed = shown.stripTrailingZeros();
    String text = plain ? trimmed.abs().toPlainString() : trimmed.abs().toString();
    return shown.signum() < 0 ? "(\u2212" + text + ")" : text;
  }

  /** A result as it is read elsewhere, with its unit. */
  String result(Dimension dimension, double value) {
    return Double.isFinite(value) ? Quantities.text(dimension, units, value) : BEYOND;
  }

  String lengthResult(double millimetres) {
    return result(Dimension.LENGTH, millimetres);
  }

  String areaResult(double squareMillimetres) {
    return result(Dimension.AREA, squareMillimetres);
  }

  String stiffnessResult(double newtonsPerMillimetre) {
    return result(Dimension.STIFFNESS, newtonsPerMillimetre);
  }

  String forceResult(double newtons) {
    return result(Dimension.FORCE, newtons);
  }

  /** A share in per cent, to a tenth. */
  String percent(double share) {
    return Double.isFinite(share) ? String.format(Locale.ROOT, "%.1f %%", 100 * share) : BEYOND;
  }

  /** Springs in series, 1/(1/k₁ + 1/k₂ + …). */
  String inSeries(double... stiffnesses) {
    if (stiffnesses.length == 1) {
      return stiffness(stiffnesses[0]);
    }
    StringBuilder sum = new StringBuilder();
    for (double stiffness : stiffnesses) {
      sum.append(sum.isEmpty() ? "" : " + ").append("1 / ").append(stiffness(stiffness));
    }
    return "1 / (" + sum + ")";
  }
}

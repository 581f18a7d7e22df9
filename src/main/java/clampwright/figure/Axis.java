package clampwright.figure;

import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * A scale with round ticks in the reader's units.
 *
 * @param dimension of the values
 * @param units the reader's
 * @param from lowest value [units inside the program]
 * @param to highest value; a tick lies on it
 * @param step between ticks [shown unit]
 */
record Axis(Dimension dimension, UnitSystem units, double from, double to, double step) {

  /** A scale that holds both values, from a tick to a tick, with about so many ticks. */
  static Axis holding(Dimension dimension, UnitSystem units, double low, double high, int ticks) {
    double shownLow = Quantities.shown(dimension, units, low);
    double shownHigh = Quantities.shown(dimension, units, high);
    double step = roundStep(Math.max(shownHigh - shownLow, 1e-12) / ticks);
    double from = Math.floor(shownLow / step + 1e-9) * step;
    double to = Math.max(Math.ceil(shownHigh / step - 1e-9) * step, from + step);
    return new Axis(
        dimension,
        units,
        Quantities.inside(dimension, units, from),
        Quantities.inside(dimension, units, to),
        step);
  }

  /** The next 1, 2 or 5 in its decade. */
  private static double roundStep(double least) {
    double decade = Math.pow(10, Math.floor(Math.log10(least)));
    for (double times : new double[] {1, 2, 5}) {
      if (times * decade >= least * (1 - 1e-9)) {
        return times * decade;
      }
    }
    return 10 * decade;
  }

  /** The ticks [units inside the program], rising. */
  List<Double> ticks() {
    double first = Quantities.shown(dimension, units, from);
    double last = Quantities.shown(dimension, units, to);
    List<Double> ticks = new ArrayList<>();
    for (int i = 0; first + i * step <= last * (1 + 1e-9) + 1e-9 * step; i++) {
      ticks.add(Quantities.inside(dimension, units, first + i * step));
    }
    return ticks;
  }

  /** A tick's number, with as many decimals as the step has. */
  String label(double tick) {
    int decimals = Math.max(0, (int) Math.ceil(-Math.log10(step) - 1e-9));
    double shown = Quantities.shown(dimension, units, tick);
    String text = String.format(Locale.ROOT, "%." + decimals + "f", shown);
    return text.matches("-0(\\.0*)?") ? text.substring(1) : text.replace('-', '\u2212');
  }

  /** Share of the way from the lowest to the highest value [–]. */
  double share(double value) {
    return (value - from) / (to - from);
  }
}

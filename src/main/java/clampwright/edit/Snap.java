package clampwright.edit;

import clampwright.quantity.UnitSystem;

/**
 * The steps that a drag goes by.
 *
 * @param step of lengths [mm]; 0 = no steps, and no catches either
 */
public record Snap(double step) {
  /** No snapping at all. */
  public static final Snap FREE = new Snap(0);

  private static final double INCH = 25.4;
  private static final double[] METRIC = {0.1, 0.5, 1, 5};
  private static final double[] INCHES = {INCH / 64, INCH / 32, INCH / 16, INCH / 8};

  /** A step shorter than this on the sheet cannot be hit with the hand [sheet mm]. */
  private static final double SHORTEST = 0.75;

  private static final double ANGLE_STEP = 0.5;
  private static final double CATCH = 0.8;

  public Snap {
    if (!(step >= 0) || Double.isInfinite(step)) {
      throw new IllegalArgumentException("a step is 0 or more");
    }
  }

  /**
   * The finest usual step of a system of units that the hand can still hit: 0.1, 0.5, 1 or 5 mm;
   * 1/64 … 1/8 in.
   *
   * @param scale sheet mm per mm of the joint
   */
  public static Snap of(UnitSystem units, double scale) {
    double[] steps = units == UnitSystem.METRIC ? METRIC : INCHES;
    for (double step : steps) {
      if (step * scale >= SHORTEST) {
        return new Snap(step);
      }
    }
    return new Snap(steps[steps.length - 1]);
  }

  public boolean isFree() {
    return step == 0;
  }

  /**
   * The step nearest to a length that lies between two limits; the nearer limit where no step does.
   */
  public double length(double value, double low, double high) {
    double within = Math.max(low, Math.min(high, value));
    if (isFree()) {
      return within;
    }
    double lowest = Math.ceil(low / step - 1e-9);
    double highest = Math.floor(high / step + 1e-9);
    if (lowest > highest) {
      return within;
    }
    return exact(Math.max(lowest, Math.min(highest, Math.rint(value / step))) * step);
  }

  /** The next step above a length, or below it where the steps are negative; at least one step. */
  public double next(double value, int steps) {
    double from = steps > 0 ? Math.floor(value / step + 1e-9) : Math.ceil(value / step - 1e-9);
    return exact(Math.max(1, from + steps) * step);
  }

  /** An angle in half degrees that catches at 30° and 45°. */
  double degrees(double value) {
    if (isFree()) {
      return exact(value);
    }
    for (double at : new double[] {30, 45}) {
      if (Math.abs(value - at) <= CATCH) {
        return at;
      }
    }
    return Math.rint(value / ANGLE_STEP) * ANGLE_STEP;
  }

  /** Without the last digits that multiplying has spoilt; every step above is exact so. */
  private static double exact(double value) {
    return Double.isInfinite(value) ? value : Math.rint(value * 1e6) / 1e6;
  }
}

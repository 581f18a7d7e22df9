package clampwright.mechanics;

import java.util.function.DoubleUnaryOperator;

/** Gauss–Legendre quadrature with 24 points. */
final class GaussLegendre {
  private static final int POINTS = 24;
  private static final double[] NODE = new double[POINTS];
  private static final double[] WEIGHT = new double[POINTS];

  static {
    for (int i = 0; i < POINTS; i++) {
      // Newton on the Legendre polynomial from the usual asymptotic guess; converges in a few
      // steps.
      double x = Math.cos(Math.PI * (i + 0.75) / (POINTS + 0.5));
      double slope = 0;
      for (int step = 0; step < 20; step++) {
        double before = 1;
        double value = x;
        for (int n = 2; n <= POINTS; n++) {
          double next = ((2 * n - 1) * x * value - (n - 1) * before) / n;
          before = value;
          value = next;
        }
        slope = POINTS * (x * value - before) / (x * x - 1);
        x -= value / slope;
      }
      NODE[i] = (x + 1) / 2;
      WEIGHT[i] = 1 / ((1 - x * x) * slope * slope);
    }
  }

  private GaussLegendre() {}

  /** ∫ f over 0 … 1. */
  static double onUnit(DoubleUnaryOperator f) {
    double sum = 0;
    for (int i = 0; i < POINTS; i++) {
      sum += WEIGHT[i] * f.applyAsDouble(NODE[i]);
    }
    return sum;
  }
}

package clampwright.mechanics;

import clampwright.joint.ScrewThread;

/**
 * The limits of size that decide how much of two threads overlaps in the worst case: 6g/6H (ISO
 * 965-1) or 2A/2B (ASME B1.1). Tolerance formulas from memory.
 *
 * @param boltMajorMin D_s,min [mm]
 * @param boltPitchMin E_s,min [mm]
 * @param nutMinorMax K_n,max [mm]
 * @param nutPitchMax E_n,max [mm]
 */
record ThreadLimits(
    double boltMajorMin, double boltPitchMin, double nutMinorMax, double nutPitchMax) {
  private static final double INCH = 25.4;

  /** Tolerances of ISO 965-1 are rounded to the R 40 series of preferred numbers. */
  private static final double[] R40 = {
    100, 106, 112, 118, 125, 132, 140, 150, 160, 170, 180, 190, 200, 212, 224, 236, 250, 265, 280,
    300, 315, 335, 355, 375, 400, 425, 450, 475, 500, 530, 560, 600, 630, 670, 710, 750, 800, 850,
    900, 950, 1000
  };

  /** Limits of the diameter groups of ISO 965-1 [mm]; its formulas take their geometric mean. */
  private static final double[] GROUPS = {0.99, 1.4, 2.8, 5.6, 11.2, 22.4, 45, 90, 180, 355};

  static ThreadLimits of(ScrewThread thread) {
    return thread.form() == ScrewThread.Form.METRIC ? metric(thread) : unified(thread);
  }

  private static ThreadLimits metric(ScrewThread thread) {
    double p = thread.pitch();
    double deviation = deviation(p);
    double mean = groupMean(thread.diameter());
    double pitchFormula = 90 * Math.pow(p, 0.4) * Math.pow(mean, 0.1);
    double boltPitch = rounded(pitchFormula);
    double nutPitch = rounded(1.32 * pitchFormula);
    double boltMajor = rounded(180 * Math.cbrt(p * p) - 3.15 / Math.sqrt(p));
    double nutMinor = rounded(p < 1 ? 433 * p - 190 * Math.pow(p, 1.22) : 230 * Math.pow(p, 0.7));
    return new ThreadLimits(
        thread.diameter() - (deviation + boltMajor) / 1000,
        thread.pitchDiameter() - (deviation + boltPitch) / 1000,
        minorBasic(thread) + nutMinor / 1000,
        thread.pitchDiameter() + nutPitch / 1000);
  }

  /** Basic minor diameter of the internal thread D1 = D − 1.082532 P [mm] (ISO 724). */
  static double minorBasic(ScrewThread thread) {
    return thread.diameter() - 1.082532 * thread.pitch();
  }

  /** Fundamental deviation g, 15 + 11 P [µm], with the standard's rounding for usual pitches. */
  private static double deviation(double pitch) {
    double[][] table = {
      {0.35, 19},
      {0.4, 19},
      {0.45, 20},
      {0.5, 20},
      {0.6, 21},
      {0.7, 22},
      {0.75, 22},
      {0.8, 24},
      {1, 26},
      {1.25, 28},
      {1.5, 32},
      {1.75, 34},
      {2, 38},
      {2.5, 42},
      {3, 48},
      {3.5, 53},
      {4, 60}
    };
    for (double[] row : table) {
      if (Math.abs(row[0] - pitch) < 1e-9) {
        return row[1];
      }
    }
    return 15 + 11 * pitch;
  }

  private static double groupMean(double diameter) {
    for (int i = 1; i < GROUPS.length; i++) {
      if (diameter <= GROUPS[i]) {
        return Math.sqrt(GROUPS[i - 1] * GROUPS[i]);
      }
    }
    return diameter;
  }

  /**
   * The nearest preferred number; of two equally near the larger [µm]. Of a thread so far from any
   * standard that the formula gives none, what the formula gives.
   */
  private static double rounded(double value) {
    if (!(value > 0 && value < Double.MAX_VALUE)) {
      return value;
    }
    double decade = Math.pow(10, Math.floor(Math.log10(value / R40[0])));
    double best = R40[0] * decade;
    for (double number : R40) {
      if (Math.abs(number * decade - value) <= Math.abs(best - value)) {
        best = number * decade;
      }
    }
    return best;
  }

  /**
   * ASME B1.1 (from memory), inch: T_d2 = 0.0015 ∛D + 0.0015 √L_E + 0.015 ∛P² with L_E = D,
   * allowance 0.3 T_d2, T_d 0.06 ∛P², T_D2 = 1.3 T_d2, T_D1 = 0.25 P − 0.4 P² (from 1/4 in).
   */
  private static ThreadLimits unified(ScrewThread thread) {
    double d = thread.diameter() / INCH;
    double p = thread.pitch() / INCH;
    double twoThirds = Math.cbrt(p * p);
    double pitchTolerance = 0.0015 * Math.cbrt(d) + 0.0015 * Math.sqrt(d) + 0.015 * twoThirds;
    double allowance = 0.3 * pitchTolerance;
    double nutMinor = 0.25 * p - 0.4 * p * p;
    if (d < 0.25 - 1e-9) {
      double small = 0.05 * twoThirds + 0.03 * p / d - 0.002;
      nutMinor = Math.min(Math.max(small, nutMinor), 0.394 * p);
    }
    return new ThreadLimits(
        thread.diameter() - (allowance + 0.06 * twoThirds) * INCH,
        thread.pitchDiameter() - (allowance + pitchTolerance) * INCH,
        minorBasic(thread) + nutMinor * INCH,
        thread.pitchDiameter() + 1.3 * pitchTolerance * INCH);
  }
}

package clampwright.joint;

/** The checks that the records of this package share. Messages name the value and the limit. */
final class Check {
  private Check() {}

  static double positive(String what, double value) {
    if (!(value > 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " must be above 0, not " + value);
    }
    return value;
  }

  static double notNegative(String what, double value) {
    if (!(value >= 0) || Double.isInfinite(value)) {
      throw new IllegalArgumentException(what + " must be 0 or more, not " + value);
    }
    return value;
  }

  static double finite(String what, double value) {
    if (!Double.isFinite(value)) {
      throw new IllegalArgumentException(what + " must be a number, not " + value);
    }
    return value;
  }

  static double between(String what, double low, double value, double high) {
    if (!(value >= low && value <= high)) {
      throw new IllegalArgumentException(
          what + " must lie between " + low + " and " + high + ", not " + value);
    }
    return value;
  }
}

package clampwright.bench;

import java.util.Arrays;
import java.util.Locale;

/** Measured times [ns]. */
final class Times {
  private final long[] sorted;

  Times(long[] times) {
    sorted = times.clone();
    Arrays.sort(sorted);
  }

  /** The time that this share of the times does not pass [ms]. */
  double at(double share) {
    int index = (int) Math.ceil(share * sorted.length) - 1;
    return sorted[Math.max(0, index)] / 1e6;
  }

  String line(String name) {
    return String.format(
        Locale.ROOT,
        "%-28s median %6.2f ms   95th percentile %6.2f ms   longest %6.2f ms",
        name,
        at(0.5),
        at(0.95),
        at(1));
  }
}

package clampwright.catalog;

import clampwright.joint.ScrewThread;
import clampwright.joint.Strength;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVRecord;

/** Reads the strength classes and tells which hold for a thread. */
final class Strengths {
  /** A class with the range of sizes it holds for. */
  private record Ranged(Entry<Strength> entry, String range) {}

  private final List<Ranged> classes = new ArrayList<>();

  Strengths() {
    for (CSVRecord row : Table.read("property-classes")) {
      classes.add(new Ranged(entry(row), row.get("size_range")));
    }
  }

  List<Entry<Strength>> all() {
    return classes.stream().map(Ranged::entry).toList();
  }

  /** Classes that hold for this thread: metric standards for metric threads. */
  List<Entry<Strength>> fitting(ScrewThread thread) {
    boolean metric = thread.form() == ScrewThread.Form.METRIC;
    return classes.stream()
        .filter(ranged -> ranged.entry.value().standard().startsWith("ISO") == metric)
        .filter(ranged -> holds(ranged.range, thread.diameter()))
        .map(Ranged::entry)
        .toList();
  }

  /** Whether a size range such as "d<=16 mm" or "over 1 to 1 1/2 in" holds for a diameter [mm]. */
  static boolean holds(String range, double diameter) {
    double rounding = 1e-6;
    if (range.startsWith("d<=")) {
      return diameter <= metric(range, "d<=") + rounding;
    }
    if (range.startsWith("d>")) {
      return diameter > metric(range, "d>") + rounding;
    }
    int to = range.indexOf(" to ");
    if (to < 0 || !range.endsWith(" in")) {
      return true;
    }
    boolean over = range.startsWith("over ");
    double low = 25.4 * Size.inches(range.substring(over ? 5 : 0, to).strip());
    double high = 25.4 * Size.inches(range.substring(to + 4, range.length() - 3).strip());
    boolean above = over ? diameter > low + rounding : diameter >= low - rounding;
    return above && diameter <= high + rounding;
  }

  private static double metric(String range, String sign) {
    return Double.parseDouble(range.substring(sign.length()).replace("mm", "").strip());
  }

  private static Entry<Strength> entry(CSVRecord row) {
    Strength strength =
        new Strength(
            row.get("standard"),
            row.get("class"),
            Table.stress(row, "proof_strength"),
            Table.stress(row, "yield_or_Rp02_min"),
            Table.stress(row, "tensile_min").orElseThrow());
    return new Entry<>(
        row.get("class"), row.get("standard"), strength, row.get("source"), row.get("provenance"));
  }
}

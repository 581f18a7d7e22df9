package clampwright.catalog;

import clampwright.joint.ScrewThread;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.apache.commons.csv.CSVRecord;

/** Reads the thread tables. */
final class Threads {
  private Threads() {}

  static List<Entry<ScrewThread>> read() {
    List<Entry<ScrewThread>> threads = new ArrayList<>();
    for (CSVRecord row : Table.read("threads-iso")) {
      threads.add(metric(row));
    }
    for (CSVRecord row : Table.read("threads-unified")) {
      threads.add(unified(row));
    }
    List<String> groups = List.of("ISO coarse", "ISO fine", "UNC", "UNF");
    threads.sort(
        Comparator.<Entry<ScrewThread>>comparingInt(entry -> groups.indexOf(entry.group()))
            .thenComparingDouble(entry -> entry.value().diameter())
            .thenComparingDouble(entry -> -entry.value().pitch()));
    return List.copyOf(threads);
  }

  private static Entry<ScrewThread> metric(CSVRecord row) {
    double pitch = Double.parseDouble(row.get("pitch_mm"));
    ScrewThread thread =
        new ScrewThread(
            row.get("designation"),
            ScrewThread.Form.METRIC,
            Double.parseDouble(row.get("d_mm")),
            pitch);
    boolean fine = row.get("series").equals("fine");
    String label = fine ? row.get("designation").replace("x", " × ") : row.get("designation");
    return new Entry<>(
        label, fine ? "ISO fine" : "ISO coarse", thread, row.get("source"), row.get("provenance"));
  }

  private static Entry<ScrewThread> unified(CSVRecord row) {
    ScrewThread thread =
        new ScrewThread(
            row.get("designation"),
            ScrewThread.Form.UNIFIED,
            Table.scaled(row, "D_in", Table.INCH).orElseThrow(),
            Table.INCH.doubleValue() / Double.parseDouble(row.get("tpi")));
    return new Entry<>(
        row.get("designation"),
        row.get("series"),
        thread,
        row.get("source"),
        row.get("provenance"));
  }
}

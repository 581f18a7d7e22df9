package clampwright.catalog;

import clampwright.joint.Anchor;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Material;
import clampwright.joint.ScrewThread;
import clampwright.joint.Strength;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVRecord;

/** The tables, read once. */
public final class Catalogue {

  /** Read when first asked for, so that a window can be up before. */
  private static final class Holder {
    static final Catalogue STANDARD = new Catalogue();
  }

  private final List<Entry<ScrewThread>> threads = Threads.read();
  private final Map<String, List<Entry<Head>>> heads = Heads.read();
  private final List<Entry<Material>> materials = Materials.read();
  private final Strengths strengths = new Strengths();
  private final List<CSVRecord> nutRows = Table.read("nuts");
  private final List<CSVRecord> washerRows = Table.read("washers");
  private final List<CSVRecord> holeRows = Table.read("clearance-holes");

  private Catalogue() {}

  public static Catalogue standard() {
    return Holder.STANDARD;
  }

  /** How much room a clearance hole leaves. */
  public enum Fit {
    CLOSE("fine_or_close"),
    NORMAL("medium_or_normal"),
    LOOSE("coarse_or_loose");

    private final String column;

    Fit(String column) {
      this.column = column;
    }
  }

  /** All threads by series (ISO coarse, ISO fine, UNC, UNF), small to large within each. */
  public List<Entry<ScrewThread>> threads() {
    return threads;
  }

  /** Heads that fit this thread. */
  public List<Entry<Head>> heads(ScrewThread thread) {
    return heads.getOrDefault(Size.of(thread), List.of());
  }

  /** Nuts that fit this thread. */
  public List<Entry<Anchor.Nut>> nuts(ScrewThread thread) {
    return rows(nutRows, thread).map(Catalogue::nut).toList();
  }

  private static Entry<Anchor.Nut> nut(CSVRecord row) {
    Anchor.Nut nut =
        new Anchor.Nut(
            row.get("standard"),
            Table.length(row, "bearing_face_dia_min").orElseThrow(),
            Table.length(row, "height_max").orElseThrow(),
            Table.length(row, "across_flats_max").orElseThrow());
    return new Entry<>(row.get("standard"), "", nut, row.get("source"), row.get("provenance"));
  }

  /** Washers that fit this thread; rows with a gap are left out. */
  public List<Entry<Washer>> washers(ScrewThread thread) {
    return rows(washerRows, thread).flatMap(Catalogue::washer).toList();
  }

  private static Stream<Entry<Washer>> washer(CSVRecord row) {
    OptionalDouble hole = Table.length(row, "inside_dia");
    OptionalDouble thickness = Table.length(row, "thickness");
    if (hole.isEmpty() || thickness.isEmpty()) {
      return Stream.empty();
    }
    double diameter = Table.length(row, "outside_dia").orElseThrow();
    Washer washer = new Washer(hole.getAsDouble(), diameter, thickness.getAsDouble());
    String label = row.get("standard") + ", " + row.get("series");
    return Stream.of(
        new Entry<>(label, row.get("standard"), washer, row.get("source"), row.get("provenance")));
  }

  /** Clearance hole diameter [mm]; empty where the table has none. */
  public Optional<Entry<Double>> clearanceHole(ScrewThread thread, Fit fit) {
    return rows(holeRows, thread)
        .findFirst()
        .map(
            row ->
                new Entry<>(
                    fit.name(),
                    row.get("standard"),
                    Table.length(row, fit.column).orElseThrow(),
                    row.get("source"),
                    row.get("provenance")));
  }

  /** Hole for a new layer [mm]: the normal clearance hole, else 1.1 d (common practice). */
  public double usualHole(ScrewThread thread) {
    return clearanceHole(thread, Fit.NORMAL).map(Entry::value).orElse(1.1 * thread.diameter());
  }

  /** Washer to start with: the first of the table, else in proportion to the thread. */
  public Washer usualWasher(ScrewThread thread) {
    double d = thread.diameter();
    return washers(thread).stream()
        .findFirst()
        .map(Entry::value)
        .orElse(new Washer(1.05 * d, 2 * d, 0.2 * d));
  }

  private static Stream<CSVRecord> rows(List<CSVRecord> rows, ScrewThread thread) {
    String size = Size.of(thread);
    return rows.stream().filter(row -> row.get("size").equals(size));
  }

  public List<Entry<Material>> materials() {
    return materials;
  }

  /** The material of this name, by its label. */
  public Optional<Entry<Material>> material(String label) {
    return materials.stream().filter(entry -> entry.label().equals(label)).findFirst();
  }

  /** Material to start with: generic carbon steel. */
  public Material usualMaterial() {
    return materials.get(0).value();
  }

  /** Strength classes that hold for this thread size. */
  public List<Entry<Strength>> strengths(ScrewThread thread) {
    return strengths.fitting(thread);
  }

  /** Where a value came from, for the tooltip of a field; empty for a typed one. */
  public Optional<String> originOf(ScrewThread thread, Object value) {
    List<Entry<?>> all = new ArrayList<>(threads);
    all.addAll(heads(thread));
    all.addAll(nuts(thread));
    all.addAll(washers(thread));
    all.addAll(materials);
    all.addAll(strengths.all());
    Object listed =
        value instanceof Material material
            ? material.withTensile(OptionalDouble.empty()).withPressureLimit(OptionalDouble.empty())
            : value;
    return all.stream()
        .filter(entry -> entry.value().equals(listed))
        .findFirst()
        .map(Entry::origin);
  }

  /**
   * The fastener with another thread: head, nut and strength follow it in kind where the tables
   * have them, else in proportion to the diameter. Typed lengths stay.
   */
  public Fastener resized(Fastener fastener, ScrewThread thread) {
    return new Resizing(this, fastener, thread).resized();
  }

  /** The thread so many steps larger within its series, or smaller; kept at the ends. */
  public ScrewThread stepped(ScrewThread thread, int steps) {
    List<ScrewThread> series = series(thread);
    int at = series.indexOf(thread);
    if (at < 0) {
      return thread;
    }
    return series.get(Math.max(0, Math.min(series.size() - 1, at + steps)));
  }

  /** The threads of the same series that have a hexagon head in the tables, small to large. */
  public List<ScrewThread> series(ScrewThread thread) {
    String group =
        threads.stream()
            .filter(entry -> entry.value().equals(thread))
            .findFirst()
            .map(Entry::group)
            .orElse("");
    return threads.stream()
        .filter(entry -> entry.group().equals(group))
        .map(Entry::value)
        .filter(value -> value.equals(thread) || !heads(value).isEmpty())
        .toList();
  }

  /** A usual fastener to start with: M10, hexagon head, nut, class 8.8, steel. */
  public Fastener usualFastener() {
    ScrewThread thread =
        threads.stream()
            .map(Entry::value)
            .filter(value -> value.designation().equals("M10"))
            .findFirst()
            .orElseThrow();
    Strength strength =
        strengths(thread).stream()
            .map(Entry::value)
            .filter(value -> value.grade().equals("8.8"))
            .findFirst()
            .orElseThrow();
    return new Fastener(
        thread,
        heads(thread).get(0).value(),
        nuts(thread).get(0).value(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0,
        strength,
        usualMaterial());
  }
}

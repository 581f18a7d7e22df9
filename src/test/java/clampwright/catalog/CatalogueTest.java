package clampwright.catalog;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Anchor;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Joint;
import clampwright.joint.Material;
import clampwright.joint.ScrewThread;
import clampwright.store.Samples;
import clampwright.store.Stored;
import java.util.stream.Stream;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

class CatalogueTest {
  private final Catalogue catalogue = Catalogue.standard();

  static Stream<CSVRecord> isoThreads() {
    return Table.read("threads-iso").stream()
        .filter(row -> Table.number(row, "As_published_mm2").isPresent());
  }

  static Stream<CSVRecord> unifiedThreads() {
    return Table.read("threads-unified").stream();
  }

  /** ISO 898-1 stress areas against π/4·(d − 0.938194 P)², diameters against ISO 724. */
  @ParameterizedTest
  @MethodSource("isoThreads")
  void isoThreadsAgreeWithTheirTable(CSVRecord row) {
    ScrewThread thread = thread(row.get("designation"));
    double published = Double.parseDouble(row.get("As_published_mm2"));
    assertEquals(1, thread.stressArea() / published, 0.004);
    double pitchDiameter = Double.parseDouble(row.get("pitch_dia_d2_mm"));
    assertEquals(pitchDiameter, thread.pitchDiameter(), 6e-4);
    double minor = Double.parseDouble(row.get("minor_dia_ext_d3_mm"));
    assertEquals(minor, thread.minorDiameter(), 6e-4);
  }

  /** Shigley 9th ed. table 8-2 stress areas against 0.7854·(D − 0.974279/n)² (ASME B1.1). */
  @ParameterizedTest
  @MethodSource("unifiedThreads")
  void unifiedThreadsAgreeWithTheirTable(CSVRecord row) {
    ScrewThread thread = thread(row.get("designation"));
    double published = Double.parseDouble(row.get("At_published_in2"));
    double inches = thread.stressArea() / (25.4 * 25.4);
    // The table prints three to four figures: half a unit of its last place comes on top.
    double lastPlace = Math.pow(10, -new java.math.BigDecimal(row.get("At_published_in2")).scale());
    assertEquals(published, inches, 0.002 * published + 0.5 * lastPlace);
  }

  /** ASME B1.1 basic pitch diameters, to half of the table's last place. */
  @ParameterizedTest
  @MethodSource("unifiedThreads")
  void unifiedPitchDiametersAgreeWithTheirTable(CSVRecord row) {
    ScrewThread thread = thread(row.get("designation"));
    double published = Double.parseDouble(row.get("pitch_dia_in"));
    assertEquals(published, thread.pitchDiameter() / 25.4, 6e-5);
  }

  /** Inch sizes come over without the dust of binary multiplication. */
  @ParameterizedTest
  @CsvSource({"3/8-16 UNC, 9.525", "3/4-10 UNC, 19.05", "#4-40 UNC, 2.8448"})
  void inchSizesAreExact(String size, double expected) {
    assertEquals(expected, thread(size).diameter());
  }

  /** The constants of ISO 898-1 and ASME B1.1 are not interchangeable: 0.4 to 1.8 % apart. */
  @Test
  void swappedConstantsWouldShow() {
    ScrewThread metric = thread("M10");
    ScrewThread swapped =
        new ScrewThread("M10", ScrewThread.Form.UNIFIED, metric.diameter(), metric.pitch());
    double error = 1 - swapped.stressArea() / metric.stressArea();
    assertTrue(error > 0.004 && error < 0.018, () -> "error " + error);
  }

  /** Shigley's table prints 0.0088 in² for #5-44 UNF; ASME B1.1 gives 0.0083. */
  @Test
  void aMisprintIsNotCopied() {
    assertEquals(0.0083, thread("#5-44 UNF").stressArea() / (25.4 * 25.4), 5e-5);
  }

  /** Across flats by ISO 4014 (not the older DIN values 17, 19, 22, 32). */
  @ParameterizedTest
  @CsvSource({"M10, 16", "M12, 18", "M14, 21", "M22, 34"})
  void isoAcrossFlats(String size, double expected) {
    assertEquals(expected, head(size, Head.Style.HEXAGON).width());
  }

  /** ASME B18.2.1 cap screws and B18.2.2 nuts differ at 7/16 and 9/16. */
  @ParameterizedTest
  @CsvSource({"7/16-14 UNC, 0.625, 0.688", "9/16-12 UNC, 0.812, 0.875"})
  void inchHeadsAndNutsDiffer(String size, double head, double nut) {
    assertEquals(head, head(size, Head.Style.HEXAGON).width() / 25.4, 1e-9);
    Anchor.Nut found = catalogue.nuts(thread(size)).get(0).value();
    assertEquals(nut, found.width() / 25.4, 1e-9);
  }

  /** ISO 273 normal holes. */
  @ParameterizedTest
  @CsvSource({"M6, 6.6", "M8, 9", "M10, 11", "M12, 13.5", "M16x1.5, 17.5"})
  void clearanceHoles(String size, double expected) {
    assertEquals(expected, catalogue.usualHole(thread(size)));
  }

  /** ISO 7089 washers. */
  @ParameterizedTest
  @CsvSource({"M8, 8.4, 16, 1.6", "M10, 10.5, 20, 2", "M10x1.25, 10.5, 20, 2"})
  void washers(String size, double hole, double diameter, double thickness) {
    assertEquals(new Washer(hole, diameter, thickness), catalogue.usualWasher(thread(size)));
  }

  @Test
  void everyEntryKeepsItsOrigin() {
    for (Entry<ScrewThread> entry : catalogue.threads()) {
      assertFalse(entry.source().isBlank() || entry.provenance().isBlank(), entry::label);
      for (Entry<Head> head : catalogue.heads(entry.value())) {
        assertFalse(head.source().isBlank() || head.provenance().isBlank(), head::label);
      }
    }
    Head flange = head("M10", Head.Style.FLANGE);
    String origin = catalogue.originOf(thread("M10"), flange).orElseThrow();
    assertTrue(origin.contains("estimated"), origin);
  }

  @Test
  void materialsWithoutAModulusAreLeftOut() {
    assertTrue(catalogue.material("ductile iron 60-40-18").isEmpty());
    Material iron = catalogue.material("grey cast iron (generic)").orElseThrow().value();
    assertEquals(Material.Family.GREY_IRON, iron.family());
    assertEquals(100_000, iron.modulus());
  }

  @ParameterizedTest
  @CsvSource({
    "M16, 8.8, 640", "M18, 8.8, 660", "M16, 9.8, 720", "M12, 10.9, 940",
    "1-8 UNC, 5, 634.3", "1 1/8-7 UNC, 5, 558.5", "3/4-10 UNC, 2, 393", "7/8-9 UNC, 2, 248.2",
  })
  void strengthFollowsTheSize(String size, String grade, double yield) {
    double found =
        catalogue.strengths(thread(size)).stream()
            .map(Entry::value)
            .filter(strength -> strength.grade().equals(grade))
            .findFirst()
            .orElseThrow()
            .yield()
            .orElseThrow();
    assertEquals(yield, found, 0.1);
  }

  @Test
  void noClass98AboveM16() {
    assertTrue(
        catalogue.strengths(thread("M20")).stream()
            .noneMatch(entry -> entry.value().grade().equals("9.8")));
  }

  @Test
  void steppingStaysInTheSeries() {
    assertEquals("M12", catalogue.stepped(thread("M10"), 1).designation());
    assertEquals("M8", catalogue.stepped(thread("M10"), -1).designation());
    assertEquals("M12x1.5", catalogue.stepped(thread("M10x1"), 1).designation());
    assertEquals(thread("M1.6"), catalogue.stepped(thread("M1.6"), -5));
  }

  @Test
  void resizingTakesHeadAndNutAlong() {
    Fastener larger = catalogue.resized(catalogue.usualFastener(), thread("M16"));
    assertEquals(24, larger.head().width());
    assertEquals(24, ((Anchor.Nut) larger.anchor()).width());
    assertEquals(640, larger.strength().yield().orElseThrow());
    Fastener beyond = catalogue.resized(larger, thread("M39"));
    assertEquals("own size", beyond.head().standard());
    assertNotEquals(24, beyond.head().width());
  }

  /** M30 heads come in product grade B only; back at M16 the usual grade A is meant. */
  @Test
  void resizingThereAndBackKeepsTheUsualHead() {
    Fastener start = catalogue.resized(catalogue.usualFastener(), thread("M16"));
    Fastener larger = catalogue.resized(start, thread("M30"));
    assertTrue(larger.head().standard().endsWith("grade B"));
    assertEquals(start, catalogue.resized(larger, thread("M16")));
  }

  /** A typed value has no origin; one that equals a table's has that table's. */
  @Test
  void originsAreThoseOfTheTables() {
    ScrewThread m10 = thread("M10");
    Head hexagon = head("M10", Head.Style.HEXAGON);
    assertEquals(
        "ISO 4014/4017 hex · published table", catalogue.originOf(m10, hexagon).orElseThrow());
    assertTrue(catalogue.originOf(m10, hexagon.withBearingDiameter(14)).isEmpty());
    assertTrue(catalogue.originOf(m10, new Washer(10.5, 20, 2)).isPresent());
    assertTrue(catalogue.originOf(m10, new Washer(10.5, 21, 2)).isEmpty());
  }

  @ParameterizedTest
  @MethodSource("samples")
  void samplesUseTheTables(Joint joint) {
    ScrewThread thread = joint.fastener().thread();
    checkOrigin(thread, thread);
    checkOrigin(thread, joint.fastener().head());
    checkOrigin(thread, joint.fastener().strength());
    if (joint.fastener().anchor() instanceof Anchor.Nut nut) {
      checkOrigin(thread, nut);
    }
    for (Element element : joint.elements()) {
      Material material = element.material();
      catalogue.material(material.name()).ifPresent(entry -> assertEquals(entry.value(), material));
    }
  }

  static Stream<Joint> samples() {
    return Samples.all().stream()
        .map(sample -> ((Stored.Opened) Samples.open(sample)).sketch().joint());
  }

  private void checkOrigin(ScrewThread thread, Object value) {
    assertTrue(catalogue.originOf(thread, value).isPresent(), value::toString);
  }

  private Head head(String size, Head.Style style) {
    return catalogue.heads(thread(size)).stream()
        .map(Entry::value)
        .filter(head -> head.style() == style)
        .findFirst()
        .orElseThrow();
  }

  private ScrewThread thread(String designation) {
    return catalogue.threads().stream()
        .map(Entry::value)
        .filter(thread -> thread.designation().equals(designation))
        .findFirst()
        .orElseThrow();
  }
}

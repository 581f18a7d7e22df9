package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.catalog.Catalogue;
import clampwright.catalog.Washer;
import clampwright.joint.Anchor;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import clampwright.store.Samples.Sample;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Every sample opens, has a solution, is made of catalogue parts, and keeps its numbers. */
class SamplesTest {
  private static final Path FOLDER = Path.of("samples");
  private static final Catalogue CATALOGUE = Catalogue.standard();

  static List<Sample> samples() {
    return Samples.all();
  }

  private static Sketch sketch(Sample sample) {
    Stored.Opened opened = (Stored.Opened) Samples.open(sample);
    assertEquals(List.of(), opened.remarks());
    return opened.sketch();
  }

  private static Solved solved(Sample sample) {
    return (Solved) Assessment.of(sketch(sample).joint());
  }

  private static Sample named(String name) {
    Optional<Sample> sample =
        samples().stream().filter(each -> each.file().startsWith(name + ".")).findFirst();
    return sample.orElseThrow();
  }

  @Test
  void theListHoldsEveryFileOfTheFolderAndNoOther() throws IOException {
    try (Stream<Path> files = Files.list(FOLDER)) {
      assertEquals(
          files
              .map(file -> file.getFileName().toString())
              .filter(file -> file.endsWith(SketchFile.EXTENSION))
              .sorted()
              .toList(),
          samples().stream().map(Sample::file).sorted().toList());
    }
  }

  @Test
  void titlesAndNamesTellSamplesApart() {
    assertEquals(samples().size(), samples().stream().map(Sample::title).distinct().count());
    assertEquals(
        samples().size(),
        samples().stream().map(sample -> sketch(sample).name()).distinct().count());
  }

  @ParameterizedTest
  @MethodSource("samples")
  void aSampleIsWrittenAsTheProgramWritesIt(Sample sample) throws IOException {
    assertEquals(SketchJson.of(sketch(sample)), Files.readString(FOLDER.resolve(sample.file())));
  }

  /** Common practice, no source: 60 to 75 % of the proof load, on the smallest section. */
  @ParameterizedTest
  @MethodSource("samples")
  void aSampleIsTightenedAsUsualAndFarFromParting(Sample sample) {
    Fastener bolt = sketch(sample).joint().fastener();
    double plain = Math.PI / 4 * bolt.plainDiameter() * bolt.plainDiameter();
    double bore = Math.PI / 4 * bolt.bore() * bolt.bore();
    double section = Math.min(bolt.thread().stressArea(), plain) - bore;
    Solved solved = solved(sample);
    double share = solved.preload().nominal() / (bolt.strength().proof().orElseThrow() * section);
    assertTrue(share >= 0.6 && share <= 0.75, sample.file() + " " + share);
    assertTrue(solved.sharing().axialMax() < 0.6 * solved.sharing().partingLoad(), sample.file());
  }

  /** So that the editor can say where the numbers come from. */
  @ParameterizedTest
  @MethodSource("samples")
  void aSampleIsMadeOfCatalogueParts(Sample sample) {
    Joint joint = sketch(sample).joint();
    Fastener bolt = joint.fastener();
    checkListed(bolt, bolt.thread());
    checkListed(bolt, bolt.head());
    checkListed(bolt, bolt.strength());
    checkListed(bolt, bolt.material());
    if (bolt.anchor() instanceof Anchor.Nut nut) {
      checkListed(bolt, nut);
    }
    for (Element element : joint.elements()) {
      boolean own = element.name().equals("Thick washer") || element.name().equals("Insulator");
      if (element.isWasher() && !own && element.outline() instanceof Outline.Round round) {
        checkListed(bolt, new Washer(element.hole(), round.diameter(), element.thickness()));
      }
      if (!own) {
        checkListed(bolt, element.material());
      }
    }
  }

  private static void checkListed(Fastener bolt, Object value) {
    assertTrue(CATALOGUE.originOf(bolt.thread(), value).isPresent(), value::toString);
  }

  @Test
  void theSamplesShowEveryOutlineAndBothUnitSystems() {
    List<Sketch> sketches = samples().stream().map(SamplesTest::sketch).toList();
    assertEquals(2, sketches.stream().map(Sketch::units).distinct().count());
    assertEquals(
        3,
        sketches.stream()
            .flatMap(sketch -> sketch.joint().elements().stream())
            .map(element -> element.outline().getClass())
            .distinct()
            .count());
    assertTrue(sketches.stream().anyMatch(sketch -> sketch.joint().fastener().isTapped()));
  }

  /**
   * Own numbers, regression only: k_m and k_b [N/mm], load factor, parting load under the preload
   * aimed at [N].
   */
  @ParameterizedTest
  @CsvSource({
    "gearbox-lid, 1324512, 260376.3, 0.1150008, 25141.66",
    "canopy-bracket, 1658949, 262958.2, 0.1368215, 15639.87",
    "conveyor-standoff, 970622.1, 324489.8, 0.1252748, 34296.49",
    "bearing-block, 2342909, 330640.6, 0.07420262, 48606.75",
    "sensor-housing, 1888696, 219783.6, 0.1042380, 8372.760",
    "insulated-busbar, 1365250, 328631.9, 0.1940111, 25434.59",
    "winch-foot, 2163166, 381217.9, 0.1198617, 37905.02",
    "pillar-cap, 1025441, 390794.7, 0.2759390, 36860.61",
    "press-tie, 1908238, 191129.7, 0.08193740, 65355.02",
    "gate-hinge, 2812833, 692423.6, 0.1580309, 112830.7",
  })
  void aSampleKeepsItsNumbers(
      String name, double members, double bolt, double loadFactor, double parting) {
    Solved solved = solved(named(name));
    checkNear(members, solved.sharing().memberStiffness());
    checkNear(bolt, solved.bolt().stiffness());
    checkNear(loadFactor, solved.sharing().loadFactor());
    checkNear(parting, solved.sharing().partingLoad(solved.preload().nominal()));
  }

  private static void checkNear(double expected, double found) {
    assertEquals(1, found / expected, 1e-6);
  }

  /** Every sample has its line among the pinned numbers: a new one without fails here. */
  @Test
  void thereAreTenSamples() {
    assertEquals(10, samples().size());
  }
}

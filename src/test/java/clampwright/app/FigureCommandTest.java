package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Sketch;
import clampwright.store.SketchFile;
import clampwright.store.Stored;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Pictures without a display. */
class FigureCommandTest {
  private static final String LID = "samples/gearbox-lid.joint.json";

  @TempDir Path folder;

  private String in(String name) {
    return folder.resolve(name).toString();
  }

  @ParameterizedTest
  @CsvSource({"a.png, 89 50 4e 47", "a.svg, 3c 3f 78 6d", "a.pdf, 25 50 44 46"})
  void theEndingSaysWhichKind(String name, String begins) throws IOException {
    Run run = Run.of("figure", LID, "-o", in(name), "--dpi", "60");
    assertEquals(0, run.exit(), run.err());
    byte[] bytes = Files.readAllBytes(folder.resolve(name));
    StringBuilder found = new StringBuilder();
    for (int i = 0; i < 4; i++) {
      found.append(String.format("%02x ", bytes[i]));
    }
    assertEquals(begins, found.toString().strip());
  }

  /** Every kind of picture opens again as the sketch it shows, unless that was left out. */
  @ParameterizedTest
  @ValueSource(strings = {"png", "svg", "pdf"})
  void thePictureIsTheFile(String kind) throws IOException {
    Path picture = folder.resolve("a." + kind);
    assertEquals(0, Run.of("figure", LID, "-o", picture.toString(), "--dpi", "60").exit());
    Sketch sketch = ((Stored.Opened) SketchFile.read(Path.of(LID))).sketch();
    assertEquals(sketch, ((Stored.Opened) SketchFile.read(picture)).sketch());
    Run.of("figure", LID, "-o", picture.toString(), "--dpi", "60", "--without-sketch");
    assertEquals(
        List.of("This picture holds no sketch."),
        ((Stored.Refused) SketchFile.read(picture)).problems());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "--preset | poster | 'poster' is not known here; there are: slide, column, page, sheet",
        "--theme | sepia | 'sepia' is not known here; there are: light, dark, bw",
        "--show | cones,bolts | 'bolts' is not known here; there are: cones, cylinders, governing,"
            + " dimensions, names, forces, readouts, ladder, diagram",
        "--units | furlongs | 'furlongs' is not known here; there are: mm-N, in-lbf",
        "--dpi | 1 | --dpi must lie between 10 and 2400",
      })
  void aWrongOptionNamesTheRightOnes(String option, String value, String said) {
    Run run = Run.of("figure", LID, "-o", in("a.svg"), option, value);
    assertEquals(2, run.exit());
    assertEquals(said, run.err().strip());
    assertTrue(Files.notExists(folder.resolve("a.svg")));
  }

  @Test
  void anUnknownEndingIsRefused() {
    Run run = Run.of("figure", LID, "-o", in("a.gif"));
    assertEquals(2, run.exit());
    assertEquals("'gif' is not known here; there are: png, svg, pdf", run.err().strip());
  }

  /** 10 mm are 0.394 in; the sketch inside keeps its own units. */
  @Test
  void aPictureCanBeInOtherUnits() throws IOException {
    Path picture = folder.resolve("a.svg");
    assertEquals(0, Run.of("figure", LID, "-o", picture.toString(), "--units", "in-lbf").exit());
    assertTrue(Files.readString(picture).contains(">0.394<"));
    assertEquals(
        SketchFile.read(Path.of(LID)) instanceof Stored.Opened lid ? lid.sketch() : null,
        ((Stored.Opened) SketchFile.read(picture)).sketch());
  }

  @Test
  void aPngIsAsWideAsAsked() throws IOException {
    Path picture = folder.resolve("a.png");
    Run run = Run.of("figure", LID, "-o", picture.toString(), "--width", "1234");
    assertEquals(0, run.exit(), run.err());
    assertEquals(1234, ImageIO.read(picture.toFile()).getWidth());
    Run tiny = Run.of("figure", LID, "-o", picture.toString(), "--width", "3");
    assertEquals("--width comes to a resolution outside 10 to 2400 dpi", tiny.err().strip());
  }

  @Test
  void manySketchesGoToAFolder() throws IOException {
    List<String> arguments = new ArrayList<>(List.of("figure"));
    try (Stream<Path> samples = Files.list(Path.of("samples"))) {
      samples
          .map(Path::toString)
          .filter(name -> name.endsWith(".json"))
          .sorted()
          .forEach(arguments::add);
    }
    int count = arguments.size() - 1;
    arguments.addAll(List.of("-o", folder.toString(), "--kind", "svg"));
    Run run = Run.of(arguments.toArray(String[]::new));
    assertEquals(0, run.exit(), run.err());
    assertTrue(run.out().contains(count + " of " + count), run.out());
    try (Stream<Path> written = Files.list(folder)) {
      assertEquals(count, written.filter(file -> file.toString().endsWith(".svg")).count());
    }
    assertTrue(Files.exists(folder.resolve("gearbox-lid.svg")));
  }

  @Test
  void aFileThatCannotBeReadIsNamedAndTheOthersAreWritten() {
    Run run = Run.of("figure", "missing.joint.json", LID, "-o", folder.toString());
    assertEquals(2, run.exit());
    assertTrue(run.err().startsWith("missing.joint.json: "), run.err());
    assertTrue(Files.exists(folder.resolve("gearbox-lid.png")));
  }
}

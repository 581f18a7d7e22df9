package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.store.Samples;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Exit codes, and what goes to which stream. */
class FoundCommandTest {
  private static final Path SAMPLE = Path.of("samples", "gearbox-lid.joint.json");

  @TempDir private Path folder;

  /** The gearbox lid with one piece of its text replaced, in a file. */
  private String file(String piece, String other) throws IOException {
    String text = Files.readString(SAMPLE);
    assertTrue(text.contains(piece), piece);
    return Files.writeString(folder.resolve("a.joint.json"), text.replace(piece, other)).toString();
  }

  private static void checkRefused(int exit, String file, String... lines) {
    List<String> told = Stream.of(lines).map(line -> file + ": " + line).toList();
    for (Run run : List.of(Run.of("found", file), Run.of("found", file, "--json"))) {
      assertEquals(exit, run.exit());
      assertEquals("", run.out());
      assertEquals(told, run.err().lines().toList());
    }
  }

  @Test
  void aMissingFileIsOneLineAndExit2() {
    checkRefused(2, folder.resolve("none").toString(), "There is no such file.");
  }

  @Test
  void aFileWithProblemsIsOneLineAndExit2() throws IOException {
    checkRefused(
        2,
        file("\"thickness\": 1.5", "\"thickness\": -2, \"thickness\": 3"),
        "line 80, column 35: key 'thickness' appears twice; "
            + "layer 3 'Shim': thickness −2 mm must be above 0");
  }

  @Test
  void aNewerFormatIsOneLineAndExit2() throws IOException {
    checkRefused(
        2,
        file("\"format\": 2", "\"format\": 3"),
        "This sketch was written by a newer Clampwright (format 3); this one reads up to format 2;"
            + " nothing was changed.");
  }

  @Test
  void aJointWithoutSolutionIsItsReasonsAndExit3() throws IOException {
    checkRefused(
        3,
        file(
            "\"hole\": 11,\n      \"outline\": {\n        \"shape\": \"round\"",
            "\"hole\": 31,\n      \"outline\": {\n        \"shape\": \"round\""),
        "layer 4 'Locating ring': Outside diameter 30 mm is not larger than the hole 31 mm.");
  }

  @Test
  void reasonsComeInTheSketchsUnits() throws IOException {
    Path sketch = Path.of(file("\"bore\": 0", "\"bore\": 9.525"));
    Files.writeString(sketch, Files.readString(sketch).replace("mm-N", "in-lbf"));
    checkRefused(3, sketch.toString(), "bolt: Bore 0.375 in leaves no wall in the bolt, 0.321 in.");
  }

  @Test
  void anUnknownKeyIsRemarkedOnAndTheReadoutsArePrinted() throws IOException {
    String file = file("\"units\": \"mm-N\"", "\"units\": \"mm-N\", \"author\": \"me\"");
    Run run = Run.of("found", file);
    assertEquals(0, run.exit());
    assertEquals(file + ": sketch: unknown key 'author' was ignored\n", run.err());
    assertEquals(Run.of("found", SAMPLE.toString()).out(), run.out());
  }

  @Test
  void aCommandThatIsNotUnderstoodIsExit2() {
    for (String[] arguments :
        List.of(
            new String[] {"found"},
            new String[] {"found", SAMPLE.toString(), "--xml"},
            new String[] {"lost"})) {
      Run run = Run.of(arguments);
      assertEquals(2, run.exit());
      assertEquals("", run.out());
      assertTrue(run.err().contains("clampwright"), run.err());
    }
  }

  @Test
  void helpAndVersionAreExit0() {
    Run help = Run.of("--help");
    assertEquals(0, help.exit());
    assertTrue(help.out().contains("clampwright found FILE [--json]"), help.out());
    Run found = Run.of("found", "--help");
    assertEquals(0, found.exit());
    assertTrue(found.out().contains("the joint has no solution"), found.out());
    Run version = Run.of("--version");
    assertEquals(0, version.exit());
    assertTrue(version.out().startsWith("Clampwright "), version.out());
  }

  @ParameterizedTest
  @MethodSource("samples")
  void everySampleIsFound(String file) {
    Run run = Run.of("found", file);
    assertEquals(0, run.exit());
    assertEquals("", run.err());
    assertFalse(run.out().contains("NaN") || run.out().contains("Infinity"), run.out());
    assertTrue(run.out().lines().noneMatch(line -> line.endsWith(" ")), run.out());
  }

  static List<String> samples() {
    return Samples.all().stream()
        .map(sample -> Path.of("samples", sample.file()).toString())
        .toList();
  }

  @Test
  void theTableIsAlignedAndEndsWithTheCaution() {
    List<String> lines = Run.of("found", SAMPLE.toString()).out().lines().toList();
    assertEquals("Gearbox lid, drain side", lines.get(0));
    int header = 1;
    while (!lines.get(header).contains("from head  ")) {
      header++;
    }
    int end = lines.get(header).indexOf("from head") + "from head".length();
    for (int i = 1; i <= 6; i++) {
      String line = lines.get(header + i);
      assertTrue(Character.isDigit(line.charAt(end - 1)) && line.charAt(end) == ' ', line);
    }
    assertTrue(lines.get(lines.size() - 1).startsWith("Early sizing aid"), lines::toString);
  }

  @Test
  void theTableSpeaksInTheSketchsUnits() {
    String inch = Run.of("found", Path.of("samples", "winch-foot.joint.json").toString()).out();
    assertTrue(inch.contains("k Mlbf/in") && inch.contains("lbf") && !inch.contains(" mm"), inch);
  }

  /** A name may hold what would break a line. */
  @Test
  void aNameStaysOnItsLine() throws IOException {
    String file = file("\"name\": \"Shim\"", "\"name\": \"Shim\\nthin\"");
    String out = Run.of("found", file).out();
    assertTrue(out.contains("3  Shim thin"), out);
  }
}

package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.google.gson.Gson;
import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.IOException;
import java.io.PrintStream;
import java.net.URISyntaxException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import picocli.CommandLine;

/** Which way the program goes, and that the command line goes it without a screen. */
class LauncherTest {
  private static final String SAMPLE = Path.of("samples", "bearing-block.joint.json").toString();

  @TempDir private Path folder;

  @ParameterizedTest
  @CsvSource({
    "'', true",
    "cover.joint.json, true",
    "drawings/cover, true",
    "samples, true",
    "found, false",
    "fuond, false",
    "--help, false",
    "-V, false",
    "found a.json, false",
    "found a.json --json, false",
    "a.json b.json, false",
  })
  void theEditorOpensForNothingOrForAFile(String arguments, boolean editor) {
    String[] parts = arguments.isEmpty() ? new String[0] : arguments.split(" ");
    assertEquals(editor, CommandLineTool.isForEditor(parts));
  }

  /**
   * Runs the program in a process of its own that has no class of the toolkit to load: only the
   * program and the two libraries that the command line needs.
   */
  private Run start(List<String> options, boolean bare, String... arguments) throws Exception {
    String path =
        Stream.of(Launcher.class, Gson.class, CommandLine.class)
            .map(LauncherTest::home)
            .collect(Collectors.joining(File.pathSeparator));
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    command.addAll(options);
    command.addAll(List.of("-cp", path, Launcher.class.getName()));
    command.addAll(List.of(arguments));
    Path out = folder.resolve("out");
    Path err = folder.resolve("err");
    ProcessBuilder builder =
        new ProcessBuilder(command).redirectOutput(out.toFile()).redirectError(err.toFile());
    builder.environment().remove("DISPLAY");
    if (bare) {
      builder.environment().put("LC_ALL", "C");
    }
    int exit = builder.start().waitFor();
    return new Run(exit, Files.readString(out), Files.readString(err));
  }

  private static String home(Class<?> type) {
    try {
      return Path.of(type.getProtectionDomain().getCodeSource().getLocation().toURI()).toString();
    } catch (URISyntaxException e) {
      throw new IllegalStateException(e);
    }
  }

  private static final List<String> GERMAN =
      List.of("-Duser.language=de", "-Duser.country=DE", "-Dfile.encoding=UTF-8");

  @Test
  void foundNeedsNoScreenAndIsTheSameInAnyLocale() throws Exception {
    Run here = Run.of("found", SAMPLE);
    assertEquals(here, start(GERMAN, false, "found", SAMPLE));
    // No language at all: still readable.
    assertEquals(here, start(List.of(), true, "found", SAMPLE));
  }

  @Test
  void jsonIsTheSameInAnyLocaleAndEncoding() throws Exception {
    Run here = Run.of("found", SAMPLE, "--json");
    assertEquals(here, start(GERMAN, false, "found", SAMPLE, "--json"));
    List<String> western = List.of("-Dfile.encoding=ISO-8859-1");
    assertEquals(here, start(western, false, "found", SAMPLE, "--json"));
  }

  @Test
  void theExitCodeReachesTheShell() throws Exception {
    Run run = start(List.of(), false, "found", folder.resolve("none").toString());
    assertEquals(new Run(2, "", folder.resolve("none") + ": There is no such file.\n"), run);
    assertEquals(0, start(List.of(), false, "--version").exit());
  }

  @Test
  void aMissingDisplayIsToldInALine() throws IOException {
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    EditorStart.tell(
        new UnsupportedOperationException("Unable to open DISPLAY"),
        new PrintStream(err, true, StandardCharsets.UTF_8));
    assertEquals(
        "The editor needs a display. Without one: clampwright found FILE",
        err.toString(StandardCharsets.UTF_8).strip());
  }
}

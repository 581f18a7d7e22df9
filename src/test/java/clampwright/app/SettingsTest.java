package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What is remembered between runs, and that a broken memory does no harm. */
class SettingsTest {
  @TempDir Path folder;

  @Test
  void oneBrokenEntryCostsNoOther() throws IOException {
    Path file = folder.resolve("settings.properties");
    Files.writeString(file, "window.width = NaN\ndark = true\n");

    assertEquals(1440, Settings.of(file).values().width);
    assertTrue(Settings.of(file).values().dark);
  }

  private Path sketch(String name) throws IOException {
    return Files.createFile(folder.resolve(name));
  }

  @Test
  void remembersBetweenRuns() throws IOException {
    Path file = folder.resolve("deep/settings.properties");
    Settings settings = Settings.of(file);
    settings.values().dark = true;
    settings.values().drawerHeight = 300;
    settings.addRecent(sketch("a.joint.json"));

    Settings again = Settings.of(file);

    assertTrue(again.values().dark);
    assertEquals(300, again.values().drawerHeight);
    assertEquals(List.of(folder.resolve("a.joint.json")), again.recent());
  }

  @Test
  void keepsTheEightLastFilesNewestFirstAndOnce() throws IOException {
    Settings settings = Settings.of(folder.resolve("settings.properties"));
    List<Path> paths = new ArrayList<>();
    for (int i = 0; i < 10; i++) {
      paths.add(sketch(i + ".joint.json"));
      settings.addRecent(paths.get(i));
    }
    settings.addRecent(paths.get(5));

    assertEquals(8, settings.recent().size());
    assertEquals(paths.get(5), settings.recent().get(0));
    assertEquals(paths.get(9), settings.recent().get(1));
    assertFalse(settings.recent().contains(paths.get(0)));
  }

  @Test
  void leavesOutFilesThatAreGone() throws IOException {
    Settings settings = Settings.of(folder.resolve("settings.properties"));
    Path gone = sketch("gone.joint.json");
    settings.addRecent(gone);

    Files.delete(gone);

    assertEquals(List.of(), settings.recent());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"", "{", "dark = \\\\u12", "window.width = wide", "window.width = -3", "dark"})
  void anUnreadableMemoryMeansTheUsualSettings(String text) throws IOException {
    Path file = folder.resolve("settings.properties");
    Files.writeString(file, text);

    Settings settings = Settings.of(file);

    assertFalse(settings.values().dark);
    assertEquals(1440, settings.values().width);
    assertEquals(List.of(), settings.recent());
  }
}

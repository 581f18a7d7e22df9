package clampwright.app;

import com.google.gson.Gson;
import com.google.gson.GsonBuilder;
import com.google.gson.JsonParseException;
import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * What the program remembers between runs, in a small file of the user's configuration folder. An
 * unreadable file means the usual settings; a folder that cannot be written costs the memory only,
 * never the work.
 */
final class Settings {
  private static final int MOST_RECENT = 8;
  private static final Gson GSON = new GsonBuilder().setPrettyPrinting().create();

  /** As written in the file. */
  static final class Values {
    boolean dark;
    boolean drawerOpen = true;
    double drawerHeight = 206;
    double width = 1440;
    double height = 900;
    boolean maximized;
    List<String> recent = new ArrayList<>();
  }

  private final Path file;
  private final Values values;

  private Settings(Path file, Values values) {
    this.file = file;
    this.values = values;
  }

  /** The settings of this user. */
  static Settings ofUser() {
    return of(folder().resolve("settings.json"));
  }

  static Settings of(Path file) {
    return new Settings(file, read(file));
  }

  private static Values read(Path file) {
    if (Files.isRegularFile(file)) {
      try (Reader reader = Files.newBufferedReader(file)) {
        Values values = GSON.fromJson(reader, Values.class);
        return values == null || values.recent == null ? new Values() : values;
      } catch (IOException | JsonParseException unreadable) {
        return new Values();
      }
    }
    return new Values();
  }

  private static Path folder() {
    String system = System.getProperty("os.name").toLowerCase(Locale.ROOT);
    Path home = Path.of(System.getProperty("user.home"));
    if (system.contains("win")) {
      return variable("APPDATA", home.resolve("AppData/Roaming")).resolve("Clampwright");
    }
    if (system.contains("mac")) {
      return home.resolve("Library/Application Support/Clampwright");
    }
    return variable("XDG_CONFIG_HOME", home.resolve(".config")).resolve("clampwright");
  }

  private static Path variable(String name, Path otherwise) {
    String value = System.getenv(name);
    return value == null || value.isBlank() ? otherwise : Path.of(value);
  }

  Values values() {
    return values;
  }

  /** Files opened or saved last, newest first; those that are gone are left out. */
  List<Path> recent() {
    return values.recent.stream().map(Path::of).filter(Files::isRegularFile).toList();
  }

  void addRecent(Path path) {
    String name = path.toAbsolutePath().normalize().toString();
    values.recent.remove(name);
    values.recent.add(0, name);
    while (values.recent.size() > MOST_RECENT) {
      values.recent.remove(values.recent.size() - 1);
    }
    keep();
  }

  /** Writes the file; whether that worked. */
  boolean keep() {
    try {
      Files.createDirectories(file.getParent());
      Path fresh = Files.createTempFile(file.getParent(), "settings", ".tmp");
      try (Writer writer = Files.newBufferedWriter(fresh)) {
        GSON.toJson(values, writer);
      }
      Files.move(fresh, file, StandardCopyOption.REPLACE_EXISTING);
      return true;
    } catch (IOException notWritable) {
      return false;
    }
  }
}

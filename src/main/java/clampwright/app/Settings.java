package clampwright.app;

import java.io.File;
import java.io.IOException;
import java.io.Reader;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Properties;

/**
 * What the program remembers between runs, in a small file of the user's configuration folder. What
 * cannot be read there means the usual settings; a folder that cannot be written costs the memory
 * only, never the work.
 */
final class Settings {
  private static final int MOST_RECENT = 8;
  private static final double LEAST_SIZE = 100;
  private static final double LARGEST_SIZE = 20_000;
  private static final String DARK = "dark";
  private static final String DRAWER_OPEN = "drawer.open";
  private static final String DRAWER_HEIGHT = "drawer.height";
  private static final String WIDTH = "window.width";
  private static final String HEIGHT = "window.height";
  private static final String MAXIMIZED = "window.maximized";
  private static final String RECENT = "recent.";

  /** What is remembered. */
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
    return of(folder().resolve("settings.properties"));
  }

  static Settings of(Path file) {
    return new Settings(file, read(file));
  }

  private static Values read(Path file) {
    Properties properties = new Properties();
    if (Files.isRegularFile(file)) {
      try (Reader reader = Files.newBufferedReader(file)) {
        properties.load(reader);
      } catch (IOException | IllegalArgumentException unreadable) {
        properties.clear();
      }
    }
    return values(properties);
  }

  /** The values written; the usual ones for what is missing or makes no sense. */
  private static Values values(Properties properties) {
    Values values = new Values();
    values.dark = Boolean.parseBoolean(properties.getProperty(DARK));
    values.drawerOpen = !"false".equals(properties.getProperty(DRAWER_OPEN));
    values.drawerHeight = size(properties, DRAWER_HEIGHT, values.drawerHeight);
    values.width = size(properties, WIDTH, values.width);
    values.height = size(properties, HEIGHT, values.height);
    values.maximized = Boolean.parseBoolean(properties.getProperty(MAXIMIZED));
    for (int i = 1; i <= MOST_RECENT; i++) {
      Optional.ofNullable(properties.getProperty(RECENT + i)).ifPresent(values.recent::add);
    }
    return values;
  }

  private static double size(Properties properties, String name, double usual) {
    try {
      double size = Double.parseDouble(properties.getProperty(name, ""));
      return size >= LEAST_SIZE && size <= LARGEST_SIZE ? size : usual;
    } catch (NumberFormatException none) {
      return usual;
    }
  }

  private Properties properties() {
    Properties properties = new Properties();
    properties.setProperty(DARK, Boolean.toString(values.dark));
    properties.setProperty(DRAWER_OPEN, Boolean.toString(values.drawerOpen));
    properties.setProperty(DRAWER_HEIGHT, Double.toString(values.drawerHeight));
    properties.setProperty(WIDTH, Double.toString(values.width));
    properties.setProperty(HEIGHT, Double.toString(values.height));
    properties.setProperty(MAXIMIZED, Boolean.toString(values.maximized));
    for (int i = 0; i < values.recent.size(); i++) {
      properties.setProperty(RECENT + (i + 1), values.recent.get(i));
    }
    return properties;
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
    return values.recent.stream().map(File::new).filter(File::isFile).map(File::toPath).toList();
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
        properties().store(writer, "Clampwright: what is remembered between runs");
      }
      Files.move(fresh, file, StandardCopyOption.REPLACE_EXISTING);
      return true;
    } catch (IOException notWritable) {
      return false;
    }
  }
}

package clampwright.app;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import javafx.application.Application;
import javafx.scene.Scene;
import javafx.scene.text.Font;

/** The two looks of the program, and its font. */
final class Looks {
  private static final String THEMES = "/atlantafx/base/theme/";
  private static final String STYLES = "/clampwright/styles/";
  private static final String FONTS = "/liberation/LiberationSans-";

  private Looks() {}

  /** Loads the font that screen and print share. */
  static void loadFonts() {
    for (String face : new String[] {"Regular", "Bold"}) {
      try (InputStream in = Looks.class.getResourceAsStream(FONTS + face + ".ttf")) {
        Font.loadFont(in, 12);
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      }
    }
  }

  /** The theme that controls start from; costs time, and only controls need it. */
  static void showTheme(boolean dark) {
    Application.setUserAgentStylesheet(resource(THEMES + "primer-" + name(dark) + ".bss"));
  }

  /** The styles that the first frame needs. */
  static void showFirst(Scene scene, boolean dark) {
    scene.getStylesheets().setAll(style("first"), style(name(dark)));
  }

  /** All styles of our own. */
  static void showStyles(Scene scene, boolean dark) {
    scene.getStylesheets().setAll(style("first"), style("clampwright"), style(name(dark)));
  }

  private static String style(String name) {
    return resource(STYLES + name + ".css");
  }

  private static String name(boolean dark) {
    return dark ? "dark" : "light";
  }

  private static String resource(String name) {
    return Looks.class.getResource(name).toExternalForm();
  }
}

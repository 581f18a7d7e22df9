package clampwright.app;

import clampwright.paint.canvas.Fonts;
import javafx.application.Application;
import javafx.scene.Scene;

/** The two looks of the program, and its font. */
final class Looks {
  private static final String THEMES = "/atlantafx/base/theme/";
  private static final String STYLES = "/clampwright/styles/";

  private Looks() {}

  /** Loads the typeface that screen and print share. */
  static void loadFonts() {
    Fonts.family();
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

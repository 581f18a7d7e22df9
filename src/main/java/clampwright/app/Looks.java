package clampwright.app;

import clampwright.paint.canvas.Fonts;
import javafx.application.Application;
import javafx.scene.Scene;
import javafx.scene.paint.Color;

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

  /** Colour between the panes, for the first frame, which has no style sheet yet. */
  static Color window(boolean dark) {
    return Color.web(dark ? "#14171B" : "#F1EFE9");
  }

  /** Colour of the panes, for the first frame. */
  static Color pane(boolean dark) {
    return Color.web(dark ? "#1A1E23" : "#F7F5F0");
  }

  /** All styles of our own. */
  static void showStyles(Scene scene, boolean dark) {
    scene.getStylesheets().setAll(style("clampwright"), style(name(dark)));
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

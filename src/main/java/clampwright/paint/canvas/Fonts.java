package clampwright.paint.canvas;

import clampwright.figure.Mark;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;

/** The one typeface of screen and print, Liberation Sans, from the program's own libraries. */
public final class Fonts {
  private static final String FAMILY = "Liberation Sans";
  private static final String FOLDER = "/liberation/";

  static {
    load("LiberationSans-Regular.ttf");
    load("LiberationSans-Bold.ttf");
  }

  private Fonts() {}

  /** Makes the typeface known to style sheets and returns its family name. */
  public static String family() {
    return FAMILY;
  }

  static Font of(Mark.Weight weight, double size) {
    boolean bold = weight == Mark.Weight.BOLD;
    return Font.font(FAMILY, bold ? FontWeight.BOLD : FontWeight.NORMAL, size);
  }

  private static void load(String file) {
    try (InputStream in = Fonts.class.getResourceAsStream(FOLDER + file)) {
      if (in == null || Font.loadFont(in, 12) == null) {
        throw new IOException("the typeface " + file + " is missing from the program");
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}

package clampwright.paint.print;

import clampwright.figure.Mark;
import java.awt.Font;
import java.awt.FontFormatException;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** The one typeface of screen and print, Liberation Sans, from the program's own libraries. */
final class PrintFonts {
  static final String REGULAR = "/liberation/LiberationSans-Regular.ttf";
  static final String BOLD = "/liberation/LiberationSans-Bold.ttf";

  private static final Font REGULAR_FONT = read(REGULAR);
  private static final Font BOLD_FONT = read(BOLD);

  private PrintFonts() {}

  static Font of(Mark.Weight weight, double size) {
    return (weight == Mark.Weight.BOLD ? BOLD_FONT : REGULAR_FONT).deriveFont((float) size);
  }

  private static Font read(String file) {
    try (InputStream in = PrintFonts.class.getResourceAsStream(file)) {
      if (in == null) {
        throw new IOException("the typeface " + file + " is missing from the program");
      }
      return Font.createFont(Font.TRUETYPE_FONT, in);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (FontFormatException e) {
      throw new IllegalStateException("the typeface " + file + " cannot be read", e);
    }
  }

  /** The bytes of a font file, to be embedded. */
  static byte[] bytes(String file) {
    try (InputStream in = PrintFonts.class.getResourceAsStream(file)) {
      if (in == null) {
        throw new IOException("the typeface " + file + " is missing from the program");
      }
      return in.readAllBytes();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}

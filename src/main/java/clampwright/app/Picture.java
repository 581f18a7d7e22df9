package clampwright.app;

import clampwright.figure.Figure;
import clampwright.figure.PictureFigure;
import clampwright.figure.Sentences;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.paint.Palette;
import clampwright.paint.print.PdfPicture;
import clampwright.paint.print.PngPicture;
import clampwright.paint.print.SvgPicture;
import clampwright.quantity.UnitSystem;
import clampwright.store.PictureFormat;
import clampwright.store.SketchPicture;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import javafx.scene.image.Image;

/**
 * A picture that leaves the program.
 *
 * @param format of the file
 * @param theme colours
 * @param dpi resolution of a PNG [dots per inch]
 * @param carriesSketch whether opening the picture brings the sketch back
 * @param units of its numbers; empty for those of the sketch
 * @param request size and content
 */
record Picture(
    PictureFormat format,
    Theme theme,
    double dpi,
    boolean carriesSketch,
    Optional<UnitSystem> units,
    PictureFigure.Request request) {

  /** Colours of a picture. */
  enum Theme {
    LIGHT("light", "light, on white"),
    DARK("dark", "dark"),
    BLACK_AND_WHITE("bw", "black and white");

    private final String word;
    private final String title;

    Theme(String word, String title) {
      this.word = word;
      this.title = title;
    }

    String word() {
      return word;
    }

    String title() {
      return title;
    }

    Palette palette() {
      return switch (this) {
        case LIGHT -> Palette.WHITE;
        case DARK -> Palette.DARK;
        case BLACK_AND_WHITE -> Palette.BLACK_AND_WHITE;
      };
    }
  }

  Figure figure(Sketch sketch) {
    Sketch shown = sketch.withUnits(units.orElse(sketch.units()));
    return PictureFigure.of(shown, Assessment.of(sketch.joint()), request);
  }

  /** Colours, and lines as wide as the preset's type is large. */
  Palette palette() {
    return theme.palette().scaled(request.preset().scale());
  }

  /** The picture for the screen or the clipboard. */
  Image image(Sketch sketch, double dpi) {
    PngPicture.Pixels pixels = PngPicture.pixels(figure(sketch), palette(), dpi);
    return ScreenImage.of(pixels.width(), pixels.height(), pixels.argb());
  }

  /** The file. */
  byte[] bytes(Sketch sketch) {
    byte[] painted = painted(sketch);
    return carriesSketch ? SketchPicture.with(format, painted, sketch) : painted;
  }

  private byte[] painted(Sketch sketch) {
    Figure figure = figure(sketch);
    Palette palette = palette();
    return switch (format) {
      case PNG -> PngPicture.of(figure, palette, dpi);
      case SVG ->
          SvgPicture.of(
                  figure,
                  palette,
                  "Bolted joint in section. " + Sentences.CAUTION,
                  part -> Places.of(part, sketch.joint()))
              .getBytes(StandardCharsets.UTF_8);
      case PDF -> PdfPicture.of(figure, palette);
    };
  }
}

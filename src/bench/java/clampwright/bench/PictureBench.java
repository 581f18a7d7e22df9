package clampwright.bench;

import clampwright.figure.Figure;
import clampwright.figure.PictureFigure;
import clampwright.figure.Preset;
import clampwright.figure.Show;
import clampwright.joint.Outline;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.paint.Palette;
import clampwright.paint.print.PdfPicture;
import clampwright.paint.print.PngPicture;
import clampwright.paint.print.SvgPicture;
import clampwright.quantity.UnitSystem;
import java.util.EnumSet;
import java.util.function.ToIntFunction;

/**
 * Pictures of a twelve-layer sketch, warm, drawing included. House targets, medians: PNG of 3840 ×
 * 2160 at most 1 s, SVG 100 ms, PDF 300 ms.
 */
final class PictureBench {
  private static final int WARM_UP = 8;
  private static final int RUNS = 20;

  /** 3840 pixels over the 254 mm of a slide. */
  private static final double DPI = 384;

  private PictureBench() {}

  static void run() {
    Sketch sketch = new Sketch("Twelve layers", TwelveLayers.with(Outline.WIDE), UnitSystem.METRIC);
    time("PNG, 3840 × 2160", sketch, figure -> PngPicture.of(figure, Palette.WHITE, DPI).length);
    time(
        "SVG",
        sketch,
        figure ->
            SvgPicture.of(figure, Palette.WHITE, "Bench", part -> part.kind().name()).length());
    time("PDF", sketch, figure -> PdfPicture.of(figure, Palette.WHITE).length);
  }

  private static void time(String name, Sketch sketch, ToIntFunction<Figure> picture) {
    long[] times = new long[RUNS];
    for (int i = -WARM_UP; i < RUNS; i++) {
      long begin = System.nanoTime();
      Figure figure =
          PictureFigure.of(
              sketch,
              Assessment.of(sketch.joint()),
              new PictureFigure.Request(Preset.SLIDE, EnumSet.allOf(Show.class), "", 0));
      if (picture.applyAsInt(figure) == 0) {
        throw new IllegalStateException("an empty picture");
      }
      if (i >= 0) {
        times[i] = System.nanoTime() - begin;
      }
    }
    System.out.println(new Times(times).line(name));
  }
}

package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.figure.SectionFigure;
import clampwright.figure.Sheet;
import clampwright.joint.Sketch;
import clampwright.quantity.UnitSystem;
import clampwright.store.Samples;
import clampwright.store.Stored;

/** The sketch that the editor opens with. */
final class FirstSketch {
  private static final double WARM_WIDTH = 220;
  private static final double WARM_HEIGHT = 150;

  private FirstSketch() {}

  /** The first sample, or an empty sketch should the samples be broken. */
  static Sketch read() {
    Stored sample = Samples.open(Samples.all().get(0));
    Sketch sketch =
        sample instanceof Stored.Opened opened
            ? opened.sketch()
            : NewSketch.create(UnitSystem.METRIC);
    rehearse(sketch);
    return sketch;
  }

  /**
   * Runs what the first frame will run, so that the classes are loaded and the comparison of
   * records is linked by then: the linking alone takes tens of milliseconds.
   */
  private static void rehearse(Sketch sketch) {
    SketchModel model = new SketchModel(sketch);
    Sheet sheet = SectionFigure.fitted(sketch, WARM_WIDTH, WARM_HEIGHT);
    sheet.equals(sheet.panned(0, 0));
    SectionFigure.of(sketch, model.assessment(), sheet, SectionFigure.Options.PLAIN);
  }
}

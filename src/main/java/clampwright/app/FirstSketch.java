package clampwright.app;

import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.quantity.UnitSystem;
import clampwright.store.Samples;
import clampwright.store.Stored;

/** The sketch that the editor opens with. */
final class FirstSketch {
  private FirstSketch() {}

  /** The first sample, or an empty sketch should the samples be broken. */
  static Sketch read() {
    Stored sample = Samples.open(Samples.all().get(0));
    Sketch sketch =
        sample instanceof Stored.Opened opened
            ? opened.sketch()
            : NewSketch.create(UnitSystem.METRIC);
    // Has the calculation loaded by the time the window wants it.
    Assessment.of(sketch.joint());
    return sketch;
  }
}

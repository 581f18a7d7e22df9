package clampwright.edit;

import clampwright.catalog.Catalogue;
import clampwright.joint.Part;
import clampwright.joint.ScrewThread;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * The edge of the shank that steps through the sizes of the thread's series.
 *
 * @param start sketch taken hold of
 * @param grab where it was taken hold of
 * @param series the threads to step through, small to large
 */
record ShankDrag(Sketch start, Grab grab, List<ScrewThread> series) implements Drag {

  /** Typed diameters this near to a thread's own mean it [mm]. */
  private static final double SAME = 0.01;

  static Optional<Drag> of(Sketch sketch, Grab grab) {
    List<ScrewThread> series = Catalogue.standard().series(sketch.joint().fastener().thread());
    return series.size() < 2 ? Optional.empty() : Optional.of(new ShankDrag(sketch, grab, series));
  }

  private ScrewThread thread() {
    return start.joint().fastener().thread();
  }

  @Override
  public Dragged at(double fromAxis, double z, Snap snap) {
    return changed(nearest(thread().diameter() + 2 * grab.outwards(fromAxis)));
  }

  /** The thread nearest in diameter; the one at the start wins over its equals. */
  private ScrewThread nearest(double diameter) {
    Comparator<ScrewThread> byDistance =
        Comparator.comparingDouble(thread -> Math.abs(thread.diameter() - diameter));
    return series.stream()
        .min(byDistance.thenComparing(thread -> !thread.equals(thread())))
        .orElseThrow();
  }

  @Override
  public Dragged set(double value) {
    return changed(nearest(value));
  }

  private Dragged changed(ScrewThread thread) {
    return new Dragged(
        start.withJoint(ThreadChange.of(start.joint(), thread)),
        Part.SHANK,
        "thread",
        Dimension.LENGTH,
        thread.diameter(),
        thread.designation(),
        "Change thread to " + thread.designation());
  }

  @Override
  public Optional<String> problem(double value) {
    return Math.abs(nearest(value).diameter() - value) <= SAME
        ? Optional.empty()
        : Optional.of(
            "No thread of this series measures "
                + Quantities.trimmedText(Dimension.LENGTH, start.units(), value)
                + "; the nearest is "
                + nearest(value).designation()
                + ".");
  }

  @Override
  public Dimension dimension() {
    return Dimension.LENGTH;
  }
}

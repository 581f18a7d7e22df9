package clampwright.edit;

import clampwright.catalog.Catalogue;
import clampwright.catalog.Catalogue.Fit;
import clampwright.catalog.Entry;
import clampwright.catalog.Washer;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.ScrewThread;
import java.util.List;
import java.util.Optional;

/**
 * A joint carried over to another thread. Head and nut follow the thread; so do clearance holes and
 * washers that have the sizes of the tables for the old thread. What has a size of its own keeps
 * it.
 */
public final class ThreadChange {
  private static final double SAME = 1e-6;

  private final Catalogue catalogue = Catalogue.standard();
  private final ScrewThread from;
  private final ScrewThread to;

  private ThreadChange(ScrewThread from, ScrewThread to) {
    this.from = from;
    this.to = to;
  }

  public static Joint of(Joint joint, ScrewThread thread) {
    if (thread.equals(joint.fastener().thread())) {
      return joint;
    }
    ThreadChange change = new ThreadChange(joint.fastener().thread(), thread);
    List<Element> elements = joint.elements().stream().map(change::followed).toList();
    return joint
        .withFastener(change.catalogue.resized(joint.fastener(), thread))
        .withElements(elements);
  }

  private Element followed(Element element) {
    if (element.isWasher() && element.outline() instanceof Outline.Round round) {
      Washer washer = new Washer(element.hole(), round.diameter(), element.thickness());
      return matching(washer).map(found -> sized(element, found)).orElse(element);
    }
    return hole(element.hole()).map(element::withHole).orElse(element);
  }

  private static Element sized(Element element, Washer washer) {
    return element
        .withThickness(washer.thickness())
        .withHole(washer.hole())
        .withOutline(new Outline.Round(washer.outsideDiameter()));
  }

  /** The hole of the same fit for the new thread; empty for a hole of no fit. */
  private Optional<Double> hole(double hole) {
    for (Fit fit : Fit.values()) {
      Optional<Double> old = catalogue.clearanceHole(from, fit).map(Entry::value);
      if (old.isPresent() && Math.abs(old.get() - hole) < SAME) {
        return catalogue.clearanceHole(to, fit).map(Entry::value);
      }
    }
    boolean usual = Math.abs(catalogue.usualHole(from) - hole) < SAME;
    return usual ? Optional.of(catalogue.usualHole(to)) : Optional.empty();
  }

  /** The washer of the same series for the new thread; empty for a washer of no table. */
  private Optional<Washer> matching(Washer washer) {
    if (same(washer, catalogue.usualWasher(from))) {
      return Optional.of(catalogue.usualWasher(to));
    }
    return catalogue.washers(from).stream()
        .filter(entry -> same(washer, entry.value()))
        .map(Entry::label)
        .flatMap(label -> catalogue.washers(to).stream().filter(e -> e.label().equals(label)))
        .map(Entry::value)
        .findFirst();
  }

  private static boolean same(Washer one, Washer other) {
    return Math.abs(one.hole() - other.hole()) < SAME
        && Math.abs(one.outsideDiameter() - other.outsideDiameter()) < SAME
        && Math.abs(one.thickness() - other.thickness()) < SAME;
  }
}

package clampwright.view.given;

import clampwright.catalog.Catalogue;
import clampwright.catalog.Catalogue.Fit;
import clampwright.catalog.Washer;
import clampwright.joint.Element;
import clampwright.joint.Outline;
import clampwright.joint.ScrewThread;
import java.util.Locale;

/** Which table the sizes of an element agree with, for tooltips. */
final class Origins {
  private static final double SAME = 1e-6;

  private Origins() {}

  /** The washer table's row, or the fit of the hole; empty where no table has the size. */
  static String of(Element element, ScrewThread thread) {
    if (element.isWasher() && element.outline() instanceof Outline.Round round) {
      Washer washer = new Washer(element.hole(), round.diameter(), element.thickness());
      return Catalogue.standard().originOf(thread, washer).orElse("");
    }
    return hole(element.hole(), thread);
  }

  private static String hole(double hole, ScrewThread thread) {
    for (Fit fit : Fit.values()) {
      String found =
          Catalogue.standard()
              .clearanceHole(thread, fit)
              .filter(entry -> Math.abs(entry.value() - hole) < SAME)
              .map(entry -> "clearance hole, " + word(fit) + " fit\n" + entry.origin())
              .orElse("");
      if (!found.isEmpty()) {
        return found;
      }
    }
    return "";
  }

  private static String word(Fit fit) {
    return fit.name().toLowerCase(Locale.ROOT);
  }
}

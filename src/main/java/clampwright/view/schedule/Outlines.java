package clampwright.view.schedule;

import clampwright.joint.Outline;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;

/** Outlines in few words. */
final class Outlines {
  private Outlines() {}

  static String text(Outline outline, UnitSystem units) {
    if (outline instanceof Outline.Round round) {
      return "round Ø " + length(round.diameter(), units);
    }
    if (outline instanceof Outline.Strip strip) {
      return "edges " + length(strip.left(), units) + " | " + length(strip.right(), units);
    }
    return "wide";
  }

  private static String length(double value, UnitSystem units) {
    return Quantities.trimmed(Dimension.LENGTH, units, value);
  }
}

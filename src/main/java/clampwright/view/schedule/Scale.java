package clampwright.view.schedule;

import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.ElementFinding;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;

/**
 * What the found columns of all rows have in common: which stiffness they show, its decimals, the
 * sum that a share is of.
 *
 * @param exact whether the exact integral is shown instead of the mid-plane cylinder
 * @param give the members' give [mm/N]
 * @param decimals of the stiffness column
 */
record Scale(boolean exact, double give, int decimals) {
  static final Scale NONE = new Scale(false, 1, 0);

  static Scale of(Solved solved, StiffnessMethod method, UnitSystem units) {
    boolean exact = method == StiffnessMethod.FULL_FRUSTA;
    double give = 0;
    double least = Double.POSITIVE_INFINITY;
    for (ElementFinding finding : solved.elements()) {
      double stiffness = stiffness(finding, exact);
      give += 1 / stiffness;
      least = Math.min(least, Quantities.shown(Dimension.STIFFNESS, units, stiffness));
    }
    return new Scale(exact, give, least >= 99.5 ? 0 : least >= 9.95 ? 1 : least >= 0.995 ? 2 : 3);
  }

  private static double stiffness(ElementFinding finding, boolean exact) {
    return exact ? finding.frustaStiffness() : finding.stiffness();
  }

  String stiffness(ElementFinding finding, UnitSystem units) {
    return Quantities.number(Dimension.STIFFNESS, units, stiffness(finding, exact), decimals);
  }

  double share(ElementFinding finding) {
    return 1 / (stiffness(finding, exact) * give);
  }
}

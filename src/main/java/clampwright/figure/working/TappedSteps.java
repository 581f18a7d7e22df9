package clampwright.figure.working;

import clampwright.mechanics.ElementFinding;
import java.util.List;

/** The virtual lower face inside a tapped last layer. */
record TappedSteps(Found found) {

  /** What counts of the tapped layer. */
  List<Step> layer() {
    Numbers numbers = found.numbers();
    double d = found.joint().fastener().thread().diameter();
    return List.of(
        depth(),
        new Step(
            "Hole",
            "d of the thread",
            numbers.length(d),
            numbers.lengthResult(d),
            Source.EFFECTIVE_GRIP));
  }

  /** How deep the lower face lies. */
  Step depth() {
    Numbers numbers = found.numbers();
    int last = found.count() - 1;
    ElementFinding finding = found.finding(last);
    return new Step(
        "Lower face, depth in the tapped layer",
        "min(t, d)/2",
        "min("
            + numbers.length(found.element(last).thickness())
            + ", "
            + numbers.length(found.joint().fastener().thread().diameter())
            + ") / 2",
        numbers.lengthResult(finding.clampedThickness()),
        Source.EFFECTIVE_GRIP);
  }
}

package clampwright.figure.working;

import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.MemberStiffness;

/** An element as one spring: the mid-plane cylinder and its share of the members' give. */
record SpringSteps(Found found, int index) {

  Step midPlane() {
    return midPlane("Stiffness");
  }

  Step midPlane(String label) {
    ElementFinding finding = found.finding(index);
    Numbers numbers = found.numbers();
    return new Step(
        label,
        "E·A/t",
        numbers.modulus(found.element(index).material().modulus())
            + " × "
            + numbers.area(finding.area())
            + " / "
            + numbers.length(finding.clampedThickness()),
        numbers.stiffnessResult(finding.stiffness()),
        Source.ELASTIC_BAR);
  }

  Step share() {
    double all = midPlaneStiffness();
    double own = found.finding(index).stiffness();
    Numbers numbers = found.numbers();
    return new Step(
        "Share of the members' give",
        "(1/k)/(1/k_m) = k_m/k, mid-plane cylinders",
        "100 × " + numbers.stiffness(all) + " / " + numbers.stiffness(own),
        numbers.percent(all / own),
        Source.SERIES);
  }

  private double midPlaneStiffness() {
    MemberStiffness.Result result =
        found.solved().members().get(StiffnessMethod.MID_PLANE_CYLINDERS);
    return ((MemberStiffness.Value) result).stiffness();
  }
}

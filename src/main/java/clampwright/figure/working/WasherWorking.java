package clampwright.figure.working;

import clampwright.joint.Part;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Side;
import java.util.ArrayList;
import java.util.List;

/** The working of a washer that is itself the clamp face: no cone passes it, all of it gives. */
record WasherWorking(Found found, int index) {

  Working working() {
    ElementFinding finding = found.finding(index);
    Numbers numbers = found.numbers();
    String outer = numbers.length(finding.headDiameter());
    String inner = numbers.length(finding.hole());
    List<Step> steps = new ArrayList<>();
    steps.addAll(new FaceSteps(found, side()).decision());
    steps.add(
        new Step(
            "Area",
            "the whole ring: π/4·(D² − d_h²)",
            "π / 4 × (%s² − %s²)".formatted(outer, inner),
            numbers.areaResult(finding.area()),
            Source.GEOMETRY));
    steps.add(new SpringSteps(found, index).midPlane());
    steps.add(new SpringSteps(found, index).share());
    steps.addAll(found.notices(part -> part.equals(Part.element(index))));
    String material = found.element(index).material().name();
    return new Working(found.name(index) + ", " + material, steps);
  }

  private Side side() {
    return found.finding(index).governing();
  }
}

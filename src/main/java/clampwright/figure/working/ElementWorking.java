package clampwright.figure.working;

import clampwright.joint.Part;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Side;
import java.util.ArrayList;
import java.util.List;

/**
 * The working of an element that the cones pass through: depths, both cones, which of them governs,
 * area, effective diameter, stiffness by the mid-plane rule, its share of the give, and the full
 * frusta beside it.
 */
record ElementWorking(Found found, int index) {

  Working working() {
    List<Step> steps = new ArrayList<>();
    steps.addAll(washerDecisions());
    if (found.joint().isTappedLayer(index)) {
      steps.addAll(new TappedSteps(found).layer());
    }
    steps.addAll(new ConeSteps(found, index, Side.HEAD).steps());
    steps.addAll(new ConeSteps(found, index, Side.NUT).steps());
    steps.add(governs());
    steps.addAll(new AreaSteps(found, index).steps());
    steps.add(new SpringSteps(found, index).midPlane());
    steps.add(new SpringSteps(found, index).share());
    steps.addAll(new FrustaSteps(found, index).steps());
    steps.addAll(found.notices(part -> part.equals(Part.element(index))));
    return new Working(title(), steps);
  }

  /** Where it is a washer that touches head or nut: why it does not count whole. */
  private List<Step> washerDecisions() {
    List<Step> steps = new ArrayList<>();
    if (index == 0) {
      steps.addAll(new FaceSteps(found, Side.HEAD).decision());
    }
    if (index == found.count() - 1) {
      steps.addAll(new FaceSteps(found, Side.NUT).decision());
    }
    return steps;
  }

  private String title() {
    return found.name(index) + ", " + found.element(index).material().name();
  }

  private Step governs() {
    ElementFinding finding = found.finding(index);
    Numbers numbers = found.numbers();
    double head = finding.headDiameter();
    double nut = finding.nutDiameter();
    return new Step(
        "Governs: " + side(finding),
        "the narrower cone: min(D_head, D_" + other() + ")" + why(finding),
        "min(" + numbers.length(head) + ", " + numbers.length(nut) + ")",
        numbers.lengthResult(Math.min(head, nut)),
        Source.CONES);
  }

  private String side(ElementFinding finding) {
    return switch (finding.governing()) {
      case HEAD -> "head";
      case NUT -> other();
      case BOTH -> "both";
    };
  }

  private String other() {
    return found.joint().fastener().isTapped() ? "lower" : "nut";
  }

  private static String why(ElementFinding finding) {
    String edge = finding.edgeLimited() ? "; an edge holds it" : "";
    String cut = finding.edgeClipped() ? "; a straight edge cuts its disc" : "";
    return switch (finding.governing()) {
      case HEAD, NUT -> edge + cut;
      case BOTH -> "; both are equally wide" + edge + cut;
    };
  }
}

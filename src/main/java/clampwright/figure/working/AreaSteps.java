package clampwright.figure.working;

import clampwright.joint.Outline;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.ZoneArea;
import java.util.ArrayList;
import java.util.List;

/** The area of the zone at an element's mid-plane, less what straight edges cut off. */
record AreaSteps(Found found, int index) {

  List<Step> steps() {
    List<Step> steps = new ArrayList<>();
    StringBuilder formula = new StringBuilder("π/4·(D² − d_h²)");
    StringBuilder cut = new StringBuilder();
    if (found.element(index).outline() instanceof Outline.Strip strip) {
      addSegment(steps, formula, cut, "left", strip.left());
      addSegment(steps, formula, cut, "right", strip.right());
    }
    ElementFinding finding = found.finding(index);
    Numbers numbers = found.numbers();
    steps.add(
        new Step(
            "Area",
            formula.toString(),
            ring(diameter(), finding.hole()) + cut,
            numbers.areaResult(finding.area()),
            Source.GEOMETRY));
    steps.add(
        new Step(
            "Effective diameter",
            "√(4·A/π + d_h²)",
            "√(4 × " + numbers.area(finding.area()) + " / π + " + square(finding.hole()) + ")",
            numbers.lengthResult(finding.effectiveDiameter()),
            "cylinder of the same area"));
    return steps;
  }

  private void addSegment(
      List<Step> steps, StringBuilder formula, StringBuilder cut, String edge, double distance) {
    double radius = diameter() / 2;
    double segment = ZoneArea.segment(radius, distance);
    if (segment <= 0) {
      return;
    }
    Numbers numbers = found.numbers();
    String r = numbers.length(radius);
    String c = numbers.length(distance);
    steps.add(
        new Step(
            "Cut off by the " + edge + " edge",
            "S_" + edge + " = R²·acos(c/R) − c·√(R² − c²)",
            "%s² × acos(%s / %s) − %s × √(%s² − %s²)".formatted(r, c, r, c, r, c),
            numbers.areaResult(segment),
            "circular segment"));
    formula.append(" − S_").append(edge);
    cut.append(" − ").append(numbers.area(segment));
  }

  private double diameter() {
    ElementFinding finding = found.finding(index);
    return Math.min(finding.headDiameter(), finding.nutDiameter());
  }

  /** π / 4 × (D² − d²). */
  private String ring(double outer, double inner) {
    return "π / 4 × (" + square(outer) + " − " + square(inner) + ")";
  }

  private String square(double millimetres) {
    return found.numbers().length(millimetres) + "²";
  }
}

package clampwright.figure.working;

import clampwright.joint.AngleRule;
import clampwright.mechanics.Side;
import clampwright.mechanics.VdiProportions;
import clampwright.quantity.Dimension;
import java.util.List;

/** The half-angle of the cones, by rule. */
record AngleSteps(Found found) {

  /** The angle in force on one side. */
  List<Step> inForce(Side side) {
    AngleRule rule = found.joint().method().angle();
    if (rule instanceof AngleRule.Vdi2230) {
      return vdi();
    }
    double angle = side == Side.HEAD ? found.zone().headHalfAngle() : found.zone().nutHalfAngle();
    Numbers numbers = found.numbers();
    return List.of(
        new Step(
            "Half-angle",
            rule instanceof AngleRule.Typed ? "typed" : "fixed",
            numbers.angle(angle),
            numbers.result(Dimension.ANGLE, angle),
            source(rule)));
  }

  private static String source(AngleRule rule) {
    if (rule instanceof AngleRule.Typed) {
      return Source.TYPED;
    }
    return rule instanceof AngleRule.Fixed30 ? "Shigley ch. 8" : Source.PRACTICE;
  }

  /** The computed angle; only where VDI 2230 applies. */
  List<Step> vdi() {
    VdiProportions proportions = VdiProportions.of(found.joint(), found.zone());
    Numbers numbers = found.numbers();
    double body = proportions.bodyDiameter().orElseThrow();
    return List.of(
        ratio(
            "Slenderness β",
            proportions.tapped()
                ? "l_K/d_w, l_K down to the tapped layer, d_w the mean of both faces"
                : "l_K/d_w, d_w the mean of both faces",
            proportions.clampLength(),
            proportions),
        ratio("Width y", "D_A/d_w, D_A the body's outside diameter", body, proportions),
        tangent(proportions),
        new Step(
            "Half-angle φ",
            "arctan",
            "atan(" + numbers.ratio(Math.tan(proportions.halfAngle())) + ")",
            numbers.result(Dimension.ANGLE, proportions.halfAngle()),
            Source.VDI));
  }

  private Step ratio(String label, String formula, double length, VdiProportions proportions) {
    Numbers numbers = found.numbers();
    double face = proportions.faceDiameter();
    return new Step(
        label,
        formula,
        numbers.length(length) + " / " + numbers.length(face),
        numbers.result(Dimension.RATIO, length / face),
        Source.VDI);
  }

  private Step tangent(VdiProportions proportions) {
    String beta = found.numbers().ratio(proportions.beta());
    String y = found.numbers().ratio(proportions.y());
    boolean tapped = proportions.tapped();
    return new Step(
        "tan φ",
        tapped ? "0.348 + 0.013·ln β + 0.193·ln y" : "0.362 + 0.032·ln(β/2) + 0.153·ln y",
        tapped
            ? "0.348 + 0.013 × ln(%s) + 0.193 × ln(%s)".formatted(beta, y)
            : "0.362 + 0.032 × ln(%s / 2) + 0.153 × ln(%s)".formatted(beta, y),
        found.numbers().result(Dimension.RATIO, Math.tan(proportions.halfAngle())),
        Source.VDI);
  }
}

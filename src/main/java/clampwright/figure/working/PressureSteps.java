package clampwright.figure.working;

import clampwright.mechanics.checks.Stripping;
import java.util.List;

/** Checks of pressed faces and of engaged threads. */
record PressureSteps(CheckWorking check) {

  List<Step> pressure() {
    String name = check.found().name(check.judged().part().index());
    return List.of(
        Step.remark(
            "Pressure on " + name,
            "the greatest bolt load over the smallest pressed area is "
                + check.result(check.judged().demand()),
            check.judged().kind().source()),
        Step.remark(
            "Its limit",
            "as typed for the material, " + check.result(check.judged().capacity()),
            Source.TYPED));
  }

  List<Step> stripping() {
    Numbers numbers = check.numbers();
    Stripping stripping = Stripping.of(check.found().joint(), check.found().solved());
    return List.of(
        Step.remark(
            "Engaged length",
            "less 0.8·P of chamfer: " + numbers.lengthResult(stripping.engagement()),
            Source.PRACTICE),
        Step.remark(
            "Bolt's thread strips at",
            numbers.areaResult(stripping.areas().external())
                + " at 0.6·R_m: "
                + numbers.forceResult(stripping.external()),
            check.judged().kind().source()),
        Step.remark(
            "Nut's thread strips at",
            numbers.areaResult(stripping.areas().internal())
                + " at 0.6·R_m: "
                + numbers.forceResult(stripping.internal()),
            check.judged().kind().source()),
        Step.remark(
            "Asked",
            "the bolt breaks first, R_m·A_s = " + numbers.forceResult(check.judged().demand()),
            check.judged().kind().source()));
  }
}

package clampwright.figure.working;

import clampwright.joint.LoadCase;
import clampwright.mechanics.checks.ShearPlane;
import java.util.ArrayList;
import java.util.List;

/** Checks of the load across the bolt. */
record ShearSteps(CheckWorking check) {

  private LoadCase load() {
    return check.found().joint().service().loads().get(check.judged().where().loadCase());
  }

  private Numbers numbers() {
    return check.numbers();
  }

  List<Step> slip() {
    List<Step> steps = new ArrayList<>(check.preload().assembly());
    steps.addAll(check.preload().losses());
    int state = check.judged().where().temperature();
    if (state >= 0) {
      steps.add(check.preload().temperature(state));
    }
    steps.add(check.preload().least(state));
    double pull = check.judged().factor() * check.pull();
    double clamp = Math.max(0, check.min() - (1 - check.loadFactor()) * pull);
    steps.add(
        check.step(
            "Clamp load left",
            "max(F_min − (1 − Φ)·FF·FS·F_A, 0)",
            "max(%s − (1 − %s) × %s, 0)"
                .formatted(
                    numbers().force(check.min()),
                    numbers().ratio(check.loadFactor()),
                    numbers().force(pull)),
            numbers().forceResult(clamp)));
    steps.add(
        check.step(
            "Friction holds",
            "µ·n_f·clamp load",
            "%s × %s × %s"
                .formatted(
                    numbers().ratio(load().friction()),
                    numbers().plain(load().slipFaces()),
                    numbers().force(clamp)),
            check.result(check.judged().capacity())));
    steps.add(check.demand("V", load().shear()));
    return steps;
  }

  List<Step> interaction() {
    ShearPlane plane = ShearPlane.of(check.found().joint(), check.found().solved());
    List<Step> steps = new ArrayList<>();
    steps.add(
        Step.remark(
            "Shear plane",
            plane.shank() ? "through the shank" : "through the thread",
            check.judged().kind().source()));
    steps.add(
        Step.remark(
            "Shear load of a plane V_u",
            "τ_u·A = " + numbers().forceResult(plane.load()),
            check.judged().kind().source()));
    steps.add(check.preload().most(check.judged().where().temperature()));
    steps.add(
        Step.remark(
            "Multiple m",
            "(m·V/V_u)^"
                + numbers().plain(plane.shank() ? 2.5 : 1.2)
                + " + (T(m)/P_u)^"
                + numbers().plain(plane.shank() ? 1.5 : 2)
                + " = 1 at m = "
                + numbers().plain(check.judged().margin() + 1)
                + ", T(m) the bolt's tension at m times the load",
            check.judged().kind().source()));
    return steps;
  }

  List<Step> hole() {
    return List.of(
        Step.remark(
            "Hole bears",
            "min(2.8·e/d₀ − 1.7, 2.5)·min(e/(3·d₀), f_ub/f_u, 1)·f_u·d·t in "
                + check.found().name(check.judged().part().index()),
            check.judged().kind().source()),
        Step.remark(
            "Edge distance e",
            "the nearest edge, in whichever direction the load acts",
            Source.PRACTICE));
  }
}

package clampwright.figure.working;

import clampwright.joint.Criteria;
import clampwright.joint.Fastener;
import clampwright.joint.ScrewThread;
import clampwright.mechanics.LoadSharing;
import clampwright.mechanics.checks.BoltLimits;
import clampwright.mechanics.checks.Endurance;
import java.util.ArrayList;
import java.util.List;

/** Checks of the bolt's stress: at tightening, in service, and its amplitude. */
record BoltStressSteps(CheckWorking check) {

  private Numbers numbers() {
    return check.numbers();
  }

  List<Step> tightening() {
    BoltLimits limits = check.limits();
    double force = check.found().solved().preload().assemblyMax();
    List<Step> steps = new ArrayList<>(check.preload().assembly());
    double tension = force / limits.area();
    double torsion = force * limits.threadArm() / limits.plasticSection();
    steps.add(tension("Tension σ", "F_0,max/A_s", force, tension));
    steps.add(
        torsion(
            "Torsion τ, plastic section",
            "F_0,max·(P/2π + µ·d2/(2·cos 30°))/(π·d_s³/12)",
            force,
            12,
            torsion));
    steps.add(equivalent(tension, torsion));
    return steps;
  }

  List<Step> service() {
    BoltLimits limits = check.limits();
    List<Step> steps = new ArrayList<>(check.preload().assembly());
    steps.add(check.preload().most(check.judged().where().temperature()));
    double pull = check.judged().factor() * check.pull();
    double load = LoadSharing.boltLoad(check.max(), check.loadFactor(), pull);
    steps.add(
        check.step(
            "Bolt load F_b",
            "max(F_max + Φ·F_A, F_A)",
            "max(%s + %s × %s, %s)"
                .formatted(
                    numbers().force(check.max()),
                    numbers().ratio(check.loadFactor()),
                    numbers().force(pull),
                    numbers().force(pull)),
            numbers().forceResult(load)));
    double tension = load / limits.area();
    double left = 0.5 * check.found().solved().preload().assemblyMax();
    double torsion = left * limits.threadArm() / limits.elasticSection();
    steps.add(tension("Tension σ", "F_b/A_s", load, tension));
    steps.add(
        torsion(
            "Torsion left τ, elastic section",
            "0.5·F_0,max·(P/2π + µ·d2/(2·cos 30°))/(π·d_s³/16)",
            left,
            16,
            torsion));
    steps.add(equivalent(tension, torsion));
    return steps;
  }

  private Step tension(String label, String formula, double force, double stress) {
    String put = numbers().stressOf(numbers().force(force), numbers().area(check.limits().area()));
    return check.step(label, formula, put, numbers().stressResult(stress));
  }

  /** A hollow bolt's section is left in symbols. */
  private Step torsion(String label, String formula, double force, double twelfths, double stress) {
    Fastener fastener = check.found().joint().fastener();
    ScrewThread thread = fastener.thread();
    String d = numbers().length((thread.pitchDiameter() + thread.minorDiameter()) / 2);
    String arm = numbers().length(check.limits().threadArm());
    String put =
        fastener.bore() > 0
            ? ""
            : numbers()
                .stressOf(
                    numbers().force(force) + " × " + arm,
                    "(π × %s × %s × %s / %s)".formatted(d, d, d, numbers().plain(twelfths)));
    return check.step(label, formula, put, numbers().stressResult(stress));
  }

  private Step equivalent(double tension, double torsion) {
    return check.step(
        "Equivalent stress",
        "√(σ² + 3·τ²)",
        "√(" + numbers().stress(tension) + "² + 3 × " + numbers().stress(torsion) + "²)",
        check.result(check.judged().demand()));
  }

  List<Step> fatigue() {
    BoltLimits limits = check.limits();
    LoadSharing sharing = check.found().sharing();
    List<Step> steps = new ArrayList<>(check.preload().assembly());
    int state = check.judged().where().temperature();
    steps.add(check.preload().least(state));
    steps.add(check.preload().most(state));
    double least = range(check.min(), sharing);
    double most = range(check.max(), sharing);
    boolean atLeast = least >= most;
    double preload = atLeast ? check.min() : check.max();
    double upper = LoadSharing.boltLoad(preload, check.loadFactor(), sharing.axialMax());
    double lower = LoadSharing.boltLoad(preload, check.loadFactor(), sharing.axialMin());
    String at = atLeast ? "F_min" : "F_max";
    steps.add(boltLoad("Bolt load, most, with " + at, preload, sharing.axialMax(), upper));
    steps.add(boltLoad("Bolt load, least, with " + at, preload, sharing.axialMin(), lower));
    steps.add(
        check.step(
            "Amplitude σ_a",
            "(F_b,most − F_b,least)/(2·A_s)",
            numbers()
                .stressOf(
                    "(" + numbers().force(upper) + " − " + numbers().force(lower) + ")",
                    "(2 × " + numbers().area(limits.area()) + ")"),
            check.result((upper - lower) / 2 / limits.area())));
    steps.add(endurable());
    return steps;
  }

  private double range(double preload, LoadSharing sharing) {
    return LoadSharing.boltLoad(preload, check.loadFactor(), sharing.axialMax())
        - LoadSharing.boltLoad(preload, check.loadFactor(), sharing.axialMin());
  }

  private Step boltLoad(String label, double preload, double axial, double result) {
    return check.step(
        label,
        "max(F_p + Φ·F_A, F_A, 0)",
        "max(%s + %s × %s, %s, 0)"
            .formatted(
                numbers().force(preload),
                numbers().ratio(check.loadFactor()),
                numbers().force(axial),
                numbers().force(axial)),
        numbers().forceResult(result));
  }

  private Step endurable() {
    Criteria criteria = check.found().joint().criteria();
    String label = "Endurable amplitude";
    String result = check.result(check.judged().capacity());
    if (criteria.allowables().amplitude().isPresent()) {
      return new Step(label, "typed", "", result, Source.TYPED);
    }
    Fastener fastener = check.found().joint().fastener();
    ScrewThread thread = fastener.thread();
    return switch (criteria.fatigue()) {
      case VDI_ROLLED_BEFORE ->
          new Step(
              label,
              "0.85·(150/d + 45)" + rise(criteria) + ", d in mm, MPa",
              "",
              result,
              "VDI 2230-1, from memory: thread rolled before heat treatment");
      case VDI_ROLLED_AFTER ->
          new Step(
              label,
              "(2 − F_m/F_0.2)·0.85·(150/d + 45)" + rise(criteria) + ", d in mm, MPa",
              "",
              result,
              "VDI 2230-1, from memory: thread rolled after heat treatment");
      case GOODMAN ->
          new Step(
              label,
              "S_e·(S_ut − σ_i)/(S_ut + S_e), S_e = "
                  + numbers()
                      .stressResult(
                          Endurance.shigley(fastener.strength(), thread.diameter()).orElse(0)),
              "",
              result,
              "Shigley eq. 8-38 and table 8-17");
    };
  }

  private static String rise(Criteria criteria) {
    return criteria.cycles() < 2e6 ? "·∛(2·10⁶/N)" : "";
  }
}

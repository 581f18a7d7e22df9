package clampwright.figure.working;

import clampwright.mechanics.checks.CheckKind;
import java.util.ArrayList;
import java.util.List;

/** Checks of the bolt load and of parting. */
record BoltLoadSteps(CheckWorking check) {

  private static final double SCREEN = 0.75;

  /** The outside load that brings the bolt to a limit. */
  List<Step> limit(String symbol, double limit) {
    Numbers numbers = check.numbers();
    List<Step> steps = new ArrayList<>(check.preload().assembly());
    steps.add(check.preload().most(check.judged().where().temperature()));
    double parts = check.max() / (1 - check.loadFactor());
    boolean first = parts <= limit;
    steps.add(
        check.step(
            "Parts at",
            "F_max/(1 − Φ)",
            numbers.force(check.max())
                + " / (1 − "
                + numbers.ratio(check.loadFactor(), 1 - check.loadFactor())
                + ")",
            numbers.forceResult(parts)));
    if (first || check.judged().capacity() == limit) {
      steps.add(
          check.step(
              "Load at the limit L*",
              first ? "it parts before " + symbol + ": L* = " + symbol : "at most " + symbol,
              "",
              check.result(check.judged().capacity())));
    } else {
      steps.add(
          check.step(
              "Load at the limit L*",
              "(" + symbol + " − F_max)/Φ",
              "(%s − %s) / %s"
                  .formatted(
                      numbers.force(limit),
                      numbers.force(check.max()),
                      numbers.ratio(check.loadFactor())),
              check.result(check.judged().capacity())));
    }
    steps.add(check.demand("F_A", check.pull()));
    if (check.judged().kind() == CheckKind.RUPTURE) {
      steps.add(screen(limit));
    }
    return steps;
  }

  /** Whether the preload leaves room to part before it breaks, F_max ≤ 0.75·P_u. */
  private Step screen(double limit) {
    boolean kept = check.max() <= SCREEN * limit;
    return Step.remark(
        "Beside it",
        "F_max is "
            + (kept ? "" : "not ")
            + "within 0.75·P_u = "
            + check.numbers().forceResult(SCREEN * limit)
            + ", the screen for parting before rupture",
        "NASA-STD-5020, corrected from 0.85 in its first print");
  }

  /** The least preload against the load, and beside it the form that counts the bolt's share. */
  List<Step> parting() {
    Numbers numbers = check.numbers();
    List<Step> steps = new ArrayList<>(check.preload().assembly());
    steps.addAll(check.preload().losses());
    int state = check.judged().where().temperature();
    if (state >= 0) {
      steps.add(check.preload().temperature(state));
    }
    steps.add(check.preload().least(state));
    steps.add(check.demand("F_A", check.pull()));
    steps.add(
        Step.remark(
            "Beside it",
            "counting the bolt's share, F_min/((1 − Φ)·FF·FS·F_A) − 1 = "
                + clampwright.figure.Verdicts.margin(
                    check.min() / ((1 - check.loadFactor()) * check.judged().demand()) - 1)
                + "; F_min over the load is "
                + numbers.plain(check.min() / check.judged().demand()),
            check.judged().kind().source()));
    return steps;
  }
}

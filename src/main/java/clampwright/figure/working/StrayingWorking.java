package clampwright.figure.working;

import clampwright.figure.Sentences;
import clampwright.figure.Straying;
import clampwright.figure.Verdicts;
import clampwright.joint.Joint;
import clampwright.mechanics.checks.Verdict;
import clampwright.mechanics.spread.Sensitivity;
import clampwright.quantity.UnitSystem;
import java.util.List;
import java.util.Optional;

/** What an input at its limits does to a margin. */
record StrayingWorking(Sensitivity.Bar bar, Joint joint, UnitSystem units) {

  Working working() {
    String name = Straying.name(bar.input(), joint);
    return new Working(
        "Which number matters: " + name,
        List.of(
            Step.remark("How", name + " alone at its limits, all else as given, no scatter", ""),
            limit(bar.input().low(), bar.low()),
            limit(bar.input().high(), bar.high())));
  }

  private Step limit(double off, Optional<Verdict.Judged> verdict) {
    String label = Straying.off(bar.input(), off, units);
    if (verdict.isEmpty()) {
      return Step.remark(label, "no solution or no margin there", "");
    }
    Verdict.Judged judged = verdict.get();
    Numbers numbers = new Numbers(units);
    String where = Sentences.where(judged.where(), joint);
    return new Step(
        label,
        Sentences.check(judged.kind())
            + (where.isEmpty() ? "" : ", " + where)
            + ": there over asked − 1",
        numbers.result(Verdicts.dimension(judged.kind()), judged.capacity())
            + " / "
            + numbers.result(Verdicts.dimension(judged.kind()), judged.demand())
            + " − 1",
        Verdicts.signed(judged.margin()),
        judged.kind().source());
  }
}

package clampwright.figure.working;

import clampwright.figure.Sentences;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.Assessment.Unsolved;
import clampwright.mechanics.checks.Verdict;
import clampwright.mechanics.spread.Sensitivity;
import clampwright.quantity.UnitSystem;
import java.util.List;

/**
 * The arithmetic behind a part or a readout. A joint without a solution has a working without
 * numbers: the reasons.
 *
 * @param title what is worked out
 * @param steps in the order in which a person would do them
 */
public record Working(String title, List<Step> steps) {
  public Working {
    steps = List.copyOf(steps);
  }

  /**
   * The working of a selected part; of the member stiffness where nothing is selected.
   *
   * @param loadCase index of the load case that is shown
   */
  public static Working of(
      Part part, Joint joint, Assessment assessment, UnitSystem units, int loadCase) {
    return assessment instanceof Solved solved
        ? new PartWorking(new Found(joint, solved, new Numbers(units), loadCase)).of(part)
        : unsolved(joint, (Unsolved) assessment, units);
  }

  /** The working of a readout. */
  public static Working of(
      Headline headline, Joint joint, Assessment assessment, UnitSystem units, int loadCase) {
    return assessment instanceof Solved solved
        ? new PartWorking(new Found(joint, solved, new Numbers(units), loadCase)).of(headline)
        : unsolved(joint, (Unsolved) assessment, units);
  }

  /** The working of a check; why it does not apply where it has no margin. */
  public static Working of(Verdict verdict, Joint joint, Assessment assessment, UnitSystem units) {
    if (!(assessment instanceof Solved solved)) {
      return unsolved(joint, (Unsolved) assessment, units);
    }
    if (verdict instanceof Verdict.Judged judged) {
      int loadCase = Math.max(0, judged.where().loadCase());
      Found found = new Found(joint, solved, new Numbers(units), loadCase);
      return new CheckWorking(found, judged).working();
    }
    Verdict.NotApplicable not = (Verdict.NotApplicable) verdict;
    return new Working(
        "Check: " + Sentences.check(not.kind()),
        List.of(Step.remark("Not applicable", not.why().text(), not.kind().source())));
  }

  /** How a margin moves with an input at its limits. */
  public static Working of(Sensitivity.Bar bar, Joint joint, UnitSystem units) {
    return new StrayingWorking(bar, joint, units).working();
  }

  private static Working unsolved(Joint joint, Unsolved unsolved, UnitSystem units) {
    return new Working(
        "No solution yet",
        unsolved.reasons().stream()
            .map(
                reason ->
                    Step.remark(
                        PartNames.of(reason.part(), joint), Sentences.reason(reason, units), ""))
            .toList());
  }
}

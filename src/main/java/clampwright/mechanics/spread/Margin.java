package clampwright.mechanics.spread;

import clampwright.joint.Joint;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Checks;
import clampwright.mechanics.checks.Verdict;
import java.util.Optional;

/**
 * Which margin is asked about: that of one check, or the least of all that loads and preload
 * decide. Thread stripping compares the threads with the bolt itself, which no load moves; in the
 * least margin it would hide the rest.
 *
 * @param check the check; empty for the least margin under load
 */
public record Margin(Optional<CheckKind> check) {
  public static final Margin WORST = new Margin(Optional.empty());

  public static Margin of(CheckKind check) {
    return new Margin(Optional.of(check));
  }

  /** The verdict that has the margin of a joint; empty without a solution or a margin. */
  public Optional<Verdict.Judged> verdict(Joint joint) {
    Verdict.Judged found = null;
    if (Assessment.of(joint) instanceof Assessment.Solved solved) {
      for (Verdict verdict : Checks.of(joint, solved)) {
        if (verdict instanceof Verdict.Judged judged && isAskedFor(judged)) {
          found = found == null || judged.margin() < found.margin() ? judged : found;
        }
      }
    }
    return Optional.ofNullable(found);
  }

  private boolean isAskedFor(Verdict.Judged judged) {
    return check.isEmpty()
        ? judged.kind() != CheckKind.THREAD_STRIPPING
        : check.get() == judged.kind();
  }

  /** The margin; NaN without a solution or a margin. Inside this package only. */
  double value(Joint joint) {
    Optional<Verdict.Judged> verdict = verdict(joint);
    return verdict.isPresent() ? verdict.get().margin() : Double.NaN;
  }
}

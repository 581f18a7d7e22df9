package clampwright.mechanics;

import clampwright.joint.Introduction;
import java.util.List;

/**
 * The load-introduction factor n [–]: typed, or the give of the members between the mid-planes at
 * which the load enters and leaves, over the give of all members.
 */
public final class IntroductionFactor {
  private IntroductionFactor() {}

  /** n by the mid-plane gives of the elements; a plane beyond the stack counts at its end. */
  static double of(Introduction introduction, List<ElementFinding> findings) {
    if (introduction instanceof Introduction.Factor typed) {
      return typed.factor();
    }
    Introduction.Planes planes = (Introduction.Planes) introduction;
    int last = findings.size() - 1;
    return between(Math.min(planes.upper(), last), Math.min(planes.lower(), last), findings);
  }

  private static double between(int upper, int lower, List<ElementFinding> findings) {
    double all = 0;
    double inside = 0;
    for (int i = 0; i < findings.size(); i++) {
      double give = 1 / findings.get(i).stiffness();
      all += give;
      if (i >= upper && i <= lower) {
        boolean end = i == upper || i == lower;
        inside += end ? give / 2 : give;
      }
    }
    return upper == lower ? 0 : inside / all;
  }
}

package clampwright.mechanics;

import clampwright.joint.Joint;
import java.util.List;

/** What a joint comes to: numbers, or the reasons why there are none. Never NaN, never a guess. */
public sealed interface Assessment {

  /**
   * The joint cannot be solved.
   *
   * @param reasons at least one, each pointing at a part
   */
  record Unsolved(List<Reason> reasons) implements Assessment {
    public Unsolved {
      reasons = List.copyOf(reasons);
      if (reasons.isEmpty()) {
        throw new IllegalArgumentException("an unsolved joint has a reason");
      }
    }
  }

  /**
   * The joint is solved.
   *
   * @param zone the pressure zone at the angle in force
   * @param elements what each element of the stack comes to, in stack order
   * @param members member stiffness by every method, with the load factor each gives
   * @param bolt the bolt as springs in series
   * @param sharing how preload and outside load share out, by the chosen method
   * @param notices assumptions that need saying for this joint
   */
  record Solved(
      Zone zone,
      List<ElementFinding> elements,
      MemberStiffness members,
      BoltStiffness bolt,
      LoadSharing sharing,
      List<Notice> notices)
      implements Assessment {
    public Solved {
      elements = List.copyOf(elements);
      notices = List.copyOf(notices);
    }
  }

  /** Assesses a joint by all methods. Pure; the same joint always gives the same assessment. */
  static Assessment of(Joint joint) {
    return Assessor.assess(joint);
  }
}

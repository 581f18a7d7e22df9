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
   * @param members member stiffness by every method
   * @param bolt the bolt as springs in series
   * @param preload from tightening to service
   * @param cases how preload and outside load share out by the chosen method, one per load case
   * @param notices assumptions that need saying for this joint
   */
  record Solved(
      Zone zone,
      List<ElementFinding> elements,
      MemberStiffness members,
      BoltStiffness bolt,
      Preload preload,
      List<LoadSharing> cases,
      List<Notice> notices)
      implements Assessment {
    public Solved {
      elements = List.copyOf(elements);
      cases = List.copyOf(cases);
      notices = List.copyOf(notices);
    }

    /** The first load case, which the headline readouts follow. */
    public LoadSharing sharing() {
      return cases.get(0);
    }

    /**
     * Stiffness with which bolt and members together resist settling, k_b·k_m/(k_b + k_m) [N/mm].
     */
    public double series() {
      double bolt = this.bolt.stiffness();
      double members = sharing().memberStiffness();
      return bolt * members / (bolt + members);
    }
  }

  /** Assesses a joint by all methods. Pure; the same joint always gives the same assessment. */
  static Assessment of(Joint joint) {
    return Assessor.assess(joint);
  }
}

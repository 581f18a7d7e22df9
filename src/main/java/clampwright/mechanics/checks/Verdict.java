package clampwright.mechanics.checks;

import clampwright.joint.Part;
import clampwright.joint.StiffnessMethod;
import java.util.Optional;

/** What one check says of a joint. */
public sealed interface Verdict {

  CheckKind kind();

  /** The part it concerns. */
  Part part();

  /**
   * A margin, of the worst case.
   *
   * @param where the case it was found in
   * @param demand what is asked, with the factors [N or MPa]
   * @param capacity what is there [N or MPa]
   * @param factor by which the outside load was multiplied [–]
   * @param margin below 0 fails [–]
   */
  record Judged(
      CheckKind kind,
      Part part,
      Where where,
      double demand,
      double capacity,
      double factor,
      double margin)
      implements Verdict {
    public boolean passes() {
      return margin >= 0;
    }
  }

  /**
   * The worst case.
   *
   * @param loadCase index; −1 where no outside load enters the check
   * @param temperature index of the temperature case, {@code Preload.ROOM} at assembly, {@code
   *     Preload.ANY} where none enters
   * @param method stiffness method; empty where none enters
   */
  record Where(int loadCase, int temperature, Optional<StiffnessMethod> method) {}

  /**
   * The check does not apply, or something it needs is not given.
   *
   * @param why which
   */
  record NotApplicable(CheckKind kind, Part part, Why why) implements Verdict {}

  /** Why a check has no margin. */
  enum Why {
    NO_PRELOAD("the bolt is not tightened"),
    NO_YIELD_STRENGTH("needs the yield strength of the bolt"),
    NO_THREAD_FRICTION("needs the friction in the thread, for the torsion"),
    NO_PULL("no load pulls the joint apart"),
    NO_SHEAR("no load acts across the bolt"),
    NO_PRESSURE_LIMIT("needs a pressure limit of a clamped part"),
    NOTHING_NARROW("no part is narrower than the pressure zone"),
    NO_PART_STRENGTH("needs the tensile strength of a layer"),
    NO_TAPPED_STRENGTH("needs the tensile strength of the tapped layer"),
    NO_ENGAGEMENT("no thread is engaged"),
    STEADY_LOAD("every load is steady"),
    NO_ENDURANCE("no endurance strength is tabled for this strength class");

    private final String text;

    Why(String text) {
      this.text = text;
    }

    public String text() {
      return text;
    }
  }
}

package clampwright.mechanics;

import clampwright.joint.Part;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * Why a joint has no solution, pointing at the part that is to blame. The sentence is put together
 * where it is read, in the reader's units.
 *
 * @param part to blame
 * @param cause what is wrong
 * @param values the numbers that the sentence names, in the order the cause says [mm or °]
 * @param why what keeps the chosen method from applying; empty for the other causes
 */
public record Reason(
    Part part, Cause cause, List<Double> values, Optional<MemberStiffness.Why> why) {

  /** The causes; brackets name the values in order. */
  public enum Cause {
    /** Nothing is clamped yet []. */
    EMPTY_STACK,
    /** The bearing face of head or nut is not larger than the hole under it [face, hole]. */
    FACE_INSIDE_HOLE,
    /** The zone is not larger than the hole of the element [zone diameter, hole]. */
    NO_BEARING,
    /** The outline is not larger than the hole [outline diameter, hole]. */
    OUTLINE_INSIDE_HOLE,
    /** An edge of a strip lies inside the hole [edge distance, hole radius]. */
    EDGE_INSIDE_HOLE,
    /** The half-angle is outside 5° … 60° [angle]. */
    ANGLE_OUT_OF_RANGE,
    /** The VDI 2230 angle needs the outside diameter of the body []. */
    BODY_DIAMETER_NEEDED,
    /** The bolt does not pass the hole [bolt diameter, hole]. */
    HOLE_NARROWER_THAN_BOLT,
    /** The bolt is not longer than the grip [length, grip]. */
    BOLT_TOO_SHORT,
    /** The bore leaves no wall [bore, smallest diameter of the bolt]. */
    BORE_TOO_WIDE,
    /** A tapped thread needs a layer, not a washer, at the end []. */
    TAPPED_WASHER,
    /** The preload is a share of the proof load, and the strength class has none []. */
    NO_PROOF_STRENGTH,
    /** The method chosen for the headline does not apply [], see {@link Reason#why}. */
    METHOD_NOT_APPLICABLE
  }

  public Reason {
    Objects.requireNonNull(part, "part");
    Objects.requireNonNull(cause, "cause");
    values = List.copyOf(values);
    Objects.requireNonNull(why, "why");
  }

  /** A reason that names numbers only. */
  public Reason(Part part, Cause cause, List<Double> values) {
    this(part, cause, values, Optional.empty());
  }

  static Reason of(Part part, Cause cause, Double... values) {
    return new Reason(part, cause, List.of(values));
  }
}

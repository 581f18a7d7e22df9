package clampwright.mechanics;

import clampwright.joint.StiffnessMethod;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;

/**
 * The members' stiffness by every method.
 *
 * @param byMethod one entry per method
 */
public record MemberStiffness(Map<StiffnessMethod, Result> byMethod) {

  /** What one method says. */
  public sealed interface Result {}

  /**
   * A stiffness.
   *
   * @param stiffness k_m [N/mm]
   * @param share the bolt's share k_b/(k_b + k_m) [–], the load factor for n = 1
   * @param halfAngle the angle it was computed at [rad]; 0 where the method has none
   */
  public record Value(double stiffness, double share, double halfAngle) implements Result {

    /** Φ = n·k_b/(k_b + k_m) [–]. */
    public double loadFactor(double introduction) {
      return introduction * share;
    }
  }

  /**
   * The method does not apply to this joint.
   *
   * @param why what is missing or not met
   */
  public record NotApplicable(Why why) implements Result {}

  /** Why a method does not apply. */
  public enum Why {
    BODY_DIAMETER_NEEDED("needs the body's outside diameter"),
    ANGLE_OUT_OF_RANGE("its angle comes out outside 5° … 60°"),
    NOTHING_ABOVE_THE_TAPPED_LAYER("no part lies above the tapped layer"),
    NO_BEARING("its zone finds no bearing around a hole"),
    SEVERAL_MATERIALS("holds for one material only"),
    EDGES_REACHED("holds only where no edge limits the zone"),
    WHOLE_WASHER("has no place for a washer as the clamp face"),
    FACE_NOT_USUAL("holds for a face of about 1.5 d only"),
    HOLE_NOT_USUAL("holds for a hole of about the bolt's diameter only");

    private final String text;

    Why(String text) {
      this.text = text;
    }

    public String text() {
      return text;
    }
  }

  public MemberStiffness {
    byMethod = Collections.unmodifiableMap(new EnumMap<>(byMethod));
  }

  public Result get(StiffnessMethod method) {
    return byMethod.get(method);
  }
}

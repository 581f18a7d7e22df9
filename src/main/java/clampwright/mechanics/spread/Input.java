package clampwright.mechanics.spread;

/**
 * An input that may stray from what was given.
 *
 * @param kind which
 * @param index of the element or load case; −1 where there is only one
 * @param low how far it may be below what was given, 0 or less [share, –, K or °]
 * @param high how far above, 0 or more
 */
public record Input(Kind kind, int index, double low, double high) {

  /** Kinds of inputs, with what their deviation is measured in. */
  public enum Kind {
    /** The preload at assembly, by its scatter [share]. */
    PRELOAD,
    /** Thickness of an element [share]. */
    THICKNESS,
    /** Modulus of an element, or of the bolt with index −1 [share]. */
    MODULUS,
    /** Friction in the thread [share]. */
    THREAD_FRICTION,
    /** Friction under the head, or the nut factor [share]. */
    FACE_FRICTION,
    /** Friction between the members [share]. */
    SLIP_FRICTION,
    /** Load-introduction factor of a load case [–]. */
    INTRODUCTION,
    /** Temperature of the members in every service state [K]. */
    MEMBERS_TEMPERATURE,
    /** Temperature of the bolt in every service state [K]. */
    BOLT_TEMPERATURE,
    /** Half-angle of both cones [°]. */
    ANGLE
  }

  /** Whether every value between the limits is as likely; else those near the middle are. */
  public boolean isEven() {
    return kind == Kind.ANGLE || kind == Kind.INTRODUCTION;
  }
}

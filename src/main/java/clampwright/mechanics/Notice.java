package clampwright.mechanics;

import clampwright.joint.Part;

/**
 * An assumption or a caution that the reader of a result must see.
 *
 * @param part it concerns
 * @param kind what it says
 */
public record Notice(Part part, Kind kind) {

  /** What can be said. */
  public enum Kind {
    /** The cone beyond a strip is not reduced: unconservative. */
    CONE_NOT_REDUCED_BEHIND_STRIP,
    /** The bolt ends inside the nut, or its engaged thread is shorter than one diameter. */
    SHORT_ENGAGEMENT,
    /** The plain shank reaches past the grip; it is counted up to the grip. */
    SHANK_LONGER_THAN_GRIP,
    /** The shank is wider than a hole it passes. */
    SHANK_WIDER_THAN_HOLE,
    /** The outside load parts the joint. */
    PARTED,
    /** Embedment and relaxation are both given, which charges settling twice. */
    SETTLING_CHARGED_TWICE,
    /** Losses and temperature use up the whole preload. */
    LOOSE,
    /** A part has no coefficient of expansion, so temperature cases cannot be counted. */
    EXPANSION_UNKNOWN
  }
}

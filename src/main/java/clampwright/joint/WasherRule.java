package clampwright.joint;

/** Where the cone starts when a washer touches the head or the nut. */
public enum WasherRule {
  /** Whole washer when it hardly overhangs the head, else from the head's edge. */
  AUTOMATIC,
  /** The washer is the clamp face: the zone begins at its inner side with its outside diameter. */
  WHOLE_WASHER,
  /** The zone begins at the head's bearing face and fans through the washer. */
  FROM_THE_HEADS_EDGE
}

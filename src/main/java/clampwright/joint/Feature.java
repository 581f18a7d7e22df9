package clampwright.joint;

/** What of a part can be taken hold of and changed. */
public enum Feature {
  /** The face towards the nut: drags the thickness. */
  FACE,
  /** The left outer edge: drags the diameter of a round part, the left distance of a strip. */
  LEFT_EDGE,
  /** The right outer edge. */
  RIGHT_EDGE,
  /** The edge of the hole. */
  HOLE_EDGE,
  /** The body: drags the order. */
  BODY,
  /** The flank of a cone: drags the half-angle. */
  FLANK,
  /** The edge of the shank: steps the thread size. */
  SHANK_EDGE,
  /** The grip at an interface that inserts a layer; the part is the element below it. */
  INSERT,
  /** The load arrow at the head: drags the axial load. */
  LOAD_AT_HEAD,
  /** The load arrow at the nut: drags the axial load. */
  LOAD_AT_NUT,
  /** Where the load enters: drags to another part. */
  LOAD_ENTERS,
  /** Where the load leaves: drags to another part. */
  LOAD_LEAVES,
  /** The words of a note: drags them. */
  NOTE,
  /** The preload arrow: drags the preload. */
  PRELOAD_SIZE
}

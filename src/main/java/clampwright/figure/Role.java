package clampwright.figure;

/** What a mark stands for. A palette gives each role its look. */
public enum Role {
  /** The paper itself. */
  PAPER,
  /** Filled body of a layer, a washer, the bolt, the nut. */
  LAYER_BODY,
  WASHER_BODY,
  BOLT_BODY,
  /** Visible edges of parts. */
  OUTLINE,
  /** Thin lines of parts: thread roots, chamfers, facets, break lines. */
  FINE_LINE,
  /** Section hatching. */
  HATCH,
  /** Chain line of the bolt axis. */
  AXIS,
  /** The clamp faces. */
  HEAD_FACE,
  NUT_FACE,
  /** Flanks of the cones. */
  HEAD_CONE,
  NUT_CONE,
  /** The same flanks, faint, on the half that tells the matter. */
  HEAD_CONE_FAINT,
  NUT_CONE_FAINT,
  /** The part of the zone that each side governs, filled. */
  HEAD_GOVERNS,
  NUT_GOVERNS,
  BOTH_GOVERN,
  /** The effective cylinder of an element. */
  EFFECTIVE_CYLINDER,
  /** The mark at the element's mid-plane and the call-out that belongs to it, by governing side. */
  HEAD_MARK,
  NUT_MARK,
  BOTH_MARK,
  /** Dimension and extension lines, their arrowheads and numbers. */
  DIMENSION,
  /** Thin leader to a name or number. */
  LEADER,
  /** A part's name; the smaller second line under it; a caption of the sheet. */
  NAME,
  SUBNAME,
  CAPTION,
  /** The outside load; where it acts; the preload. */
  LOAD,
  LOAD_FOOT,
  PRELOAD,
  /** Axis, ticks and labels of a scale; a point on it; the point of the method in force. */
  SCALE,
  SCALE_TEXT,
  POINT,
  POINT_CHOSEN,
  /** From the least to the greatest preload, filled. */
  PRELOAD_BAND,
  /** A rung of the load ladder: a limit or a load; the bolt's load; the preload aimed at. */
  RUNG,
  RUNG_BOLT,
  RUNG_PRELOAD,
  /** Lines of the joint diagram, with the nominal preload and, faint, with the limits. */
  BOLT_LINE,
  MEMBERS_LINE,
  BOLT_LINE_FAINT,
  MEMBERS_LINE_FAINT,
  /** A bin of a histogram whose joints hold, or fail. */
  BIN_HOLDS,
  BIN_FAILS,
  /** A note of the reader's own, its leader, and the plate under its words. */
  NOTE,
  NOTE_PLATE,
  /** Frame of the selected part; its grips; what lies under the pointer; an insertion grip. */
  SELECTION,
  GRIP,
  HOT,
  INSERT_GRIP,
  /** Why there is no solution, at the part to blame; the plate under the words. */
  PROBLEM,
  PROBLEM_PLATE
}

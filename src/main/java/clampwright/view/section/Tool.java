package clampwright.view.section;

/** What a press on the sheet begins. */
public enum Tool {
  /** Takes hold of what lies there; beside the stack, draws a layer. */
  SELECT,
  /** Draws a layer wherever it is pressed. */
  LAYER,
  /** Draws a washer at the nearer end of the stack. */
  WASHER
}

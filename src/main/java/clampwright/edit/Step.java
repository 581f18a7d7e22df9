package clampwright.edit;

import clampwright.joint.Part;
import clampwright.joint.Sketch;

/**
 * One step of the history.
 *
 * @param name of what it changed; empty for the sketch that the history starts with
 * @param sketch as the step left it
 * @param before what was selected when it was made
 * @param after what it left selected
 */
record Step(String name, Sketch sketch, Part before, Part after) {

  /** The same step, gone on with: what was selected before it stays the one of its beginning. */
  Step continued(Sketch sketch, Part after) {
    return new Step(name, sketch, before, after);
  }
}

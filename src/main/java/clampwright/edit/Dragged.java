package clampwright.edit;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;

/**
 * What a drag has come to.
 *
 * @param sketch to be shown
 * @param part that is changed, as it is called in this sketch
 * @param label of what is changed, such as "thickness"
 * @param dimension of the value
 * @param value in the units inside the program
 * @param text the value as shown at the pointer
 * @param step name of the step that the drag leaves in the history
 */
public record Dragged(
    Sketch sketch,
    Part part,
    String label,
    Dimension dimension,
    double value,
    String text,
    String step) {

  /** Label and value in one line, for the pointer. */
  public String caption() {
    return label + " " + text;
  }
}

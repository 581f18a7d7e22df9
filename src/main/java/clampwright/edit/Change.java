package clampwright.edit;

import clampwright.joint.Part;
import clampwright.joint.Sketch;

/**
 * A change of a sketch, ready to become a step of the history.
 *
 * @param name of the step
 * @param sketch as changed
 * @param then what is selected afterwards
 */
public record Change(String name, Sketch sketch, Part then) {}

package clampwright.edit;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import java.util.ArrayList;
import java.util.List;

/** Whole sketches in the order they came about, a position among them, and the saved position. */
final class History {
  private static final int NOWHERE = -1;

  private final List<Step> steps = new ArrayList<>();
  private int position;
  private int saved;

  /** A history that starts with a saved sketch. */
  History(Sketch sketch) {
    steps.add(new Step("", sketch, Part.JOINT, Part.JOINT));
  }

  /** The step at the present position. */
  Step present() {
    return steps.get(position);
  }

  boolean canUndo() {
    return position > 0;
  }

  boolean canRedo() {
    return position < steps.size() - 1;
  }

  /** The step that redo brings again; there must be one. */
  Step next() {
    return steps.get(position + 1);
  }

  /** Adds a step behind the present one and drops what could have been redone. */
  void add(Step step) {
    dropBehind(position);
    steps.add(step);
    position++;
  }

  /** Puts a step in the place of the present one and drops what could have been redone. */
  void replace(Step step) {
    dropBehind(position);
    steps.set(position, step);
  }

  /** Takes the present step out of the history, as when typing has come back to where it began. */
  void withdraw() {
    position--;
    dropBehind(position);
  }

  private void dropBehind(int last) {
    steps.subList(last + 1, steps.size()).clear();
    if (saved > last) {
      saved = NOWHERE;
    }
  }

  void back() {
    position--;
  }

  void forth() {
    position++;
  }

  void markSaved() {
    saved = position;
  }

  boolean isSaved() {
    return position == saved;
  }

  /** The step before the present one; there must be one. */
  Step before() {
    return steps.get(position - 1);
  }
}

package clampwright.edit;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import java.util.function.UnaryOperator;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.value.ObservableValue;

/**
 * The sketch being edited, its assessment and its history. One property holds the sketch; all else
 * is derived from it.
 */
public final class SketchModel {

  /** A model that starts with a saved sketch. */
  public SketchModel(Sketch sketch) {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  public ReadOnlyObjectProperty<Sketch> sketchProperty() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  public Sketch sketch() {
    return sketchProperty().get();
  }

  /** The assessment of the present sketch. */
  public ObservableValue<Assessment> assessmentProperty() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  public Assessment assessment() {
    return assessmentProperty().getValue();
  }

  /** The selected part; {@link Part#JOINT} when nothing is. Never points at a missing element. */
  public ObjectProperty<Part> selectionProperty() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Changes the sketch as one step of the history; no step when nothing changes. */
  public void change(String name, UnaryOperator<Sketch> change) {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Like change, but merges with the step before when that was typed into the same field. */
  public void type(String name, Object field, UnaryOperator<Sketch> change) {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Ends the merging of typed steps, as when a field loses the focus. */
  public void endTyping() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Shows a sketch during a gesture, without a step. */
  public void preview(Sketch sketch) {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Makes what the gesture has shown one step. */
  public void settle(String name) {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Takes back what the gesture has shown. */
  public void revert() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  public void undo() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  public void redo() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Name of the step that undo takes back; empty when there is none. */
  public ReadOnlyStringProperty undoNameProperty() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Name of the step that redo brings again; empty when there is none. */
  public ReadOnlyStringProperty redoNameProperty() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Whether there is work that has not been saved. */
  public ReadOnlyBooleanProperty unsavedProperty() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Marks the present position of the history as saved. */
  public void saved() {
    throw new UnsupportedOperationException("comes with the edit commit");
  }

  /** Replaces everything: a new or opened sketch, an empty history. */
  public void open(Sketch sketch) {
    throw new UnsupportedOperationException("comes with the edit commit");
  }
}

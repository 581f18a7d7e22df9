package clampwright.edit;

import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.checks.Checks;
import clampwright.mechanics.checks.Verdict;
import java.util.List;
import java.util.function.UnaryOperator;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.beans.value.ObservableValue;

/**
 * The sketch being edited, its assessment and its history. One property holds the sketch; all else
 * is derived from it.
 *
 * <p>A plain listener on these properties lives as long as the model. A view that may go before the
 * model observes them through {@code map}, {@code when} or a subscription that it ends.
 */
public final class SketchModel {
  private final ReadOnlyObjectWrapper<Sketch> sketch;
  private final Selection selection;
  private final ObservableValue<Assessment> assessment;
  private final ReadOnlyStringWrapper undoName = new ReadOnlyStringWrapper(this, "undoName", "");
  private final ReadOnlyStringWrapper redoName = new ReadOnlyStringWrapper(this, "redoName", "");
  private final ReadOnlyBooleanWrapper unsaved = new ReadOnlyBooleanWrapper(this, "unsaved");

  private History history;

  /** The field whose typing goes on; null when none does. */
  private Object typedField;

  /** What was selected before the gesture that goes on. */
  private Part beforeGesture = Part.JOINT;

  private Joint assessedJoint;
  private Assessment lastAssessment;

  /** What the verdicts below belong to. */
  private Assessment judged;

  private List<Verdict> lastVerdicts = List.of();

  private final ReadOnlyObjectWrapper<Sketch> opened;

  private final IntegerProperty shownCase = new SimpleIntegerProperty(this, "shownCase");

  /** A model that starts with a saved sketch. */
  public SketchModel(Sketch sketch) {
    this.sketch = new ReadOnlyObjectWrapper<>(this, "sketch", sketch);
    this.selection = new Selection(this, this.sketch::get);
    this.assessment = this.sketch.map(this::assessed);
    this.history = new History(sketch);
    this.opened = new ReadOnlyObjectWrapper<>(this, "opened", sketch);
  }

  public ReadOnlyObjectProperty<Sketch> sketchProperty() {
    return sketch.getReadOnlyProperty();
  }

  public Sketch sketch() {
    return sketch.get();
  }

  /** The assessment of the present sketch. */
  public ObservableValue<Assessment> assessmentProperty() {
    return assessment;
  }

  public Assessment assessment() {
    return assessment.getValue();
  }

  /** Computed once per joint, however many ask: switching units keeps it. */
  private Assessment assessed(Sketch sketch) {
    if (!sketch.joint().equals(assessedJoint)) {
      lastAssessment = Assessment.of(sketch.joint());
      assessedJoint = sketch.joint();
    }
    return lastAssessment;
  }

  /** What the checks say of the present sketch; none while it has no solution. */
  public List<Verdict> verdicts() {
    if (!(assessment() instanceof Assessment.Solved solved)) {
      return List.of();
    }
    if (judged != solved) {
      judged = solved;
      lastVerdicts = Checks.of(sketch().joint(), solved);
    }
    return lastVerdicts;
  }

  /** The selected part; {@link Part#JOINT} when nothing is. Never points at a missing element. */
  public ObjectProperty<Part> selectionProperty() {
    return selection;
  }

  public Part selection() {
    return selection.get();
  }

  public void select(Part part) {
    selection.set(part);
  }

  /** Index of the load case that is shown; see {@link #loadCase}. */
  public IntegerProperty shownCaseProperty() {
    return shownCase;
  }

  /** Index of the load case that readouts and drawing follow; one that the sketch has. */
  public int loadCase() {
    return Math.max(0, Math.min(shownCase.get(), sketch().joint().service().loads().size() - 1));
  }

  /** Changes the sketch as one step of the history; no step when nothing changes. */
  public void change(String name, UnaryOperator<Sketch> change) {
    revert();
    Sketch changed = change.apply(sketch());
    change(name, Selection.followed(selection(), sketch(), changed), changed);
  }

  /** Like change, and selects a part of the changed sketch, such as one just inserted. */
  public void change(String name, Part then, UnaryOperator<Sketch> change) {
    revert();
    change(name, then, change.apply(sketch()));
  }

  /** Makes a change that was worked out from the present sketch one step, and selects its part. */
  public void change(Change change) {
    revert();
    change(change.name(), change.then(), change.sketch());
  }

  private boolean change(String name, Part then, Sketch changed) {
    endTyping();
    if (changed.equals(sketch())) {
      return false;
    }
    Part before = selection();
    show(changed, then);
    history.add(new Step(name, changed, before, selection()));
    tell();
    return true;
  }

  /**
   * Like change, but merges with the step before when that was typed into the same field. Typing
   * back what stood there first leaves no step.
   */
  public void type(String name, Object field, UnaryOperator<Sketch> change) {
    revert();
    boolean goesOn = field.equals(typedField);
    Sketch changed = change.apply(sketch());
    Part then = Selection.followed(selection(), sketch(), changed);
    boolean open = goesOn ? goOn(then, changed) : change(name, then, changed);
    typedField = open ? field : null;
  }

  private boolean goOn(Part then, Sketch changed) {
    boolean back = changed.equals(history.before().sketch());
    if (back) {
      history.withdraw();
    } else {
      history.replace(history.present().continued(changed, then));
    }
    show(history.present().sketch(), then);
    tell();
    return !back;
  }

  /** Ends the merging of typed steps, as when a field loses the focus. */
  public void endTyping() {
    typedField = null;
  }

  /** Shows a sketch during a gesture, without a step. */
  public void preview(Sketch sketch) {
    endTyping();
    if (!isPreviewing()) {
      beforeGesture = selection();
    }
    show(sketch, Selection.followed(selection(), sketch(), sketch));
  }

  /** Makes what the gesture has shown one step. */
  public void settle(String name) {
    if (sketch().equals(history.present().sketch())) {
      revert();
    } else {
      history.add(new Step(name, sketch(), beforeGesture, selection()));
      tell();
    }
  }

  /** Takes back what the gesture has shown, and what it has selected. */
  public void revert() {
    if (isPreviewing()) {
      show(history.present().sketch(), beforeGesture);
    }
  }

  /** Whether a gesture shows something that is not a step yet. */
  public boolean isPreviewing() {
    return sketch() != history.present().sketch();
  }

  /** Takes back the last step; during a gesture, what the gesture has shown. */
  public void undo() {
    endTyping();
    if (isPreviewing()) {
      revert();
    } else if (history.canUndo()) {
      Step undone = history.present();
      history.back();
      travel(undone.after(), undone.before());
    }
  }

  /** Brings again the step that was taken back last; during a gesture it does nothing. */
  public void redo() {
    endTyping();
    if (!isPreviewing() && history.canRedo()) {
      history.forth();
      travel(history.present().before(), history.present().after());
    }
  }

  /**
   * Shows the history's present sketch. A selection that has not been touched since the step was
   * made goes with the step; one that has follows its element.
   */
  private void travel(Part untouched, Part remembered) {
    Sketch there = history.present().sketch();
    boolean goes = selection().equals(untouched);
    show(there, goes ? remembered : Selection.followed(selection(), sketch(), there));
    tell();
  }

  /** Name of the step that undo takes back; empty when there is none. */
  public ReadOnlyStringProperty undoNameProperty() {
    return undoName.getReadOnlyProperty();
  }

  /** Name of the step that redo brings again; empty when there is none. */
  public ReadOnlyStringProperty redoNameProperty() {
    return redoName.getReadOnlyProperty();
  }

  /** Whether there is work that has not been saved. */
  public ReadOnlyBooleanProperty unsavedProperty() {
    return unsaved.getReadOnlyProperty();
  }

  /** Marks the present position of the history as saved. */
  public void saved() {
    endTyping();
    history.markSaved();
    tell();
  }

  /** Replaces everything: a new or opened sketch, an empty history. */
  public void open(Sketch sketch) {
    endTyping();
    history = new History(sketch);
    shownCase.set(0);
    show(sketch, Part.JOINT);
    opened.set(sketch);
    tell();
  }

  /** The sketch that the history starts with; another one when a sketch has been opened. */
  public ReadOnlyObjectProperty<Sketch> openedProperty() {
    return opened.getReadOnlyProperty();
  }

  /**
   * Sets sketch and selection in an order in which the selection points at something at every
   * moment, whoever listens.
   */
  private void show(Sketch shown, Part selected) {
    Part there = Selection.exists(selected, shown) ? selected : Part.JOINT;
    if (Selection.exists(there, sketch())) {
      selection.set(there);
    } else if (!Selection.exists(selection(), shown)) {
      selection.set(Part.JOINT);
    }
    sketch.set(shown);
    selection.set(there);
  }

  private void tell() {
    undoName.set(history.present().name());
    redoName.set(history.canRedo() ? history.next().name() : "");
    unsaved.set(!history.isSaved());
  }
}

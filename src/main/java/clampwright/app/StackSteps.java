package clampwright.app;

import clampwright.edit.Change;
import clampwright.edit.End;
import clampwright.edit.Noting;
import clampwright.edit.SketchModel;
import clampwright.edit.Stacking;
import clampwright.joint.Sketch;
import java.util.function.Function;

/** Steps on the stack that menus and keys offer; they act on the selected element. */
final class StackSteps {
  private final SketchModel model;

  StackSteps(SketchModel model) {
    this.model = model;
  }

  boolean isElementSelected() {
    return model.selection().isElement();
  }

  boolean canMove(int places) {
    return isElementSelected() && Stacking.canMove(model.sketch(), selected(), places);
  }

  void delete() {
    make(sketch -> Stacking.deleted(sketch, selected()));
  }

  void duplicate() {
    make(sketch -> Stacking.duplicated(sketch, selected()));
  }

  void move(int places) {
    make(sketch -> Stacking.moved(sketch, selected(), selected() + places));
  }

  /** Inserts a layer below the selected element, or at the end before a washer at the nut. */
  void insertLayer() {
    make(sketch -> Stacking.inserted(sketch, isElementSelected() ? selected() + 1 : end()));
  }

  private int end() {
    int size = model.sketch().joint().elements().size();
    return size > 1 && hasWasher(End.NUT) ? size - 1 : size;
  }

  boolean hasWasher(End end) {
    return Stacking.hasWasher(model.sketch(), end);
  }

  boolean canAddWasher(End end) {
    return Stacking.canAddWasher(model.sketch(), end);
  }

  void addWasher(End end) {
    make(sketch -> Stacking.washerAdded(sketch, end));
  }

  void removeWasher(End end) {
    make(sketch -> Stacking.washerRemoved(sketch, end));
  }

  /** A note at the selected part, ready for its words. */
  void addNote() {
    make(sketch -> Noting.added(sketch, model.selection()));
  }

  private void make(Function<Sketch, Change> change) {
    model.change(change.apply(model.sketch()));
  }

  private int selected() {
    return model.selection().index();
  }
}

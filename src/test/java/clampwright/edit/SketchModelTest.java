package clampwright.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Element;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.quantity.UnitSystem;
import java.lang.ref.WeakReference;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.UnaryOperator;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleStringProperty;
import org.junit.jupiter.api.Test;

class SketchModelTest {
  private final Sketch start = Sketches.mixed();
  private final SketchModel model = new SketchModel(start);

  private static UnaryOperator<Sketch> named(String name) {
    return sketch -> sketch.withName(name);
  }

  private static UnaryOperator<Sketch> elements(UnaryOperator<List<Element>> change) {
    return sketch ->
        sketch.withJoint(
            joint -> joint.withElements(change.apply(new ArrayList<>(joint.elements()))));
  }

  private static UnaryOperator<Sketch> removed(int index) {
    return elements(
        list -> {
          list.remove(index);
          return list;
        });
  }

  private static UnaryOperator<Sketch> inserted(int index) {
    return elements(
        list -> {
          list.add(index, Sketches.layer("Shim", 1));
          return list;
        });
  }

  private void checkNames(String undo, String redo) {
    assertEquals(undo, model.undoNameProperty().get());
    assertEquals(redo, model.redoNameProperty().get());
  }

  @Test
  void everyChangeIsAStepWithItsName() {
    model.change("Rename", named("A"));
    model.change("Name again", named("B"));
    checkNames("Name again", "");
    model.undo();
    assertEquals("A", model.sketch().name());
    checkNames("Rename", "Name again");
    model.undo();
    assertSame(start, model.sketch());
    checkNames("", "Rename");
    model.redo();
    model.redo();
    assertEquals("B", model.sketch().name());
  }

  @Test
  void undoAndRedoAtTheEndsDoNothing() {
    model.undo();
    model.redo();
    assertSame(start, model.sketch());
    assertFalse(model.unsavedProperty().get());
  }

  @Test
  void aNewChangeDropsWhatCouldBeRedone() {
    model.change("Rename", named("A"));
    model.undo();
    model.change("Rename otherwise", named("C"));
    checkNames("Rename otherwise", "");
    model.redo();
    assertEquals("C", model.sketch().name());
  }

  @Test
  void noStepWhenNothingChanges() {
    model.change("Rename", named(start.name()));
    checkNames("", "");
    assertSame(start, model.sketch());
    assertFalse(model.unsavedProperty().get());
  }

  @Test
  void typingInOneFieldIsOneStep() {
    model.type("Rename", "name", named("P"));
    model.type("Rename", "name", named("Pu"));
    model.type("Rename", "name", named("Pum"));
    model.undo();
    assertSame(start, model.sketch());
    checkNames("", "Rename");
    model.redo();
    assertEquals("Pum", model.sketch().name());
  }

  @Test
  void typingElsewhereOrLaterIsAStepOfItsOwn() {
    model.type("Rename", "name", named("P"));
    model.type("Note", "note", named("Q"));
    model.endTyping();
    model.type("Note", "note", named("R"));
    model.undo();
    assertEquals("Q", model.sketch().name());
    model.undo();
    assertEquals("P", model.sketch().name());
  }

  @Test
  void typingBackWhatStoodThereLeavesNoStep() {
    model.type("Rename", "name", named("P"));
    model.type("Rename", "name", named(start.name()));
    checkNames("", "");
    assertFalse(model.unsavedProperty().get());
  }

  @Test
  void typingThatChangesNothingDoesNotMergeIntoTheStepBefore() {
    model.change("Units", sketch -> sketch.withUnits(UnitSystem.INCH));
    model.type("Rename", "name", named(start.name()));
    model.type("Rename", "name", named("P"));
    model.undo();
    assertEquals(UnitSystem.INCH, model.sketch().units());
    assertEquals(start.name(), model.sketch().name());
  }

  @Test
  void typingAfterSavingIsUnsavedWork() {
    model.type("Rename", "name", named("P"));
    model.saved();
    assertFalse(model.unsavedProperty().get());
    model.type("Rename", "name", named("Pu"));
    assertTrue(model.unsavedProperty().get());
    model.undo();
    assertEquals("P", model.sketch().name());
    assertFalse(model.unsavedProperty().get());
  }

  @Test
  void savedIsAPlaceInTheHistory() {
    model.change("Rename", named("A"));
    model.saved();
    model.undo();
    assertTrue(model.unsavedProperty().get());
    model.redo();
    assertFalse(model.unsavedProperty().get());
    model.undo();
    model.change("Rename otherwise", named("B"));
    model.undo();
    assertTrue(model.unsavedProperty().get(), "the saved place is gone for good");
  }

  @Test
  void aGestureIsOneStepHoweverManySketchesItShows() {
    for (int i = 0; i < 100; i++) {
      model.preview(start.withName("A" + i));
    }
    model.settle("Drag");
    checkNames("Drag", "");
    model.undo();
    assertSame(start, model.sketch());
    checkNames("", "Drag");
  }

  @Test
  void aGestureTakenBackLeavesNothing() {
    model.select(Part.element(2));
    model.preview(inserted(0).apply(start));
    assertEquals(Part.element(3), model.selection());
    model.revert();
    assertSame(start, model.sketch());
    assertEquals(Part.element(2), model.selection());
    checkNames("", "");
  }

  @Test
  void aGestureThatComesBackToItsStartLeavesNoStep() {
    model.preview(start.withName("A"));
    model.preview(start.withName(start.name()));
    model.settle("Drag");
    assertSame(start, model.sketch());
    checkNames("", "");
  }

  @Test
  void undoDuringAGestureTakesBackTheGestureOnly() {
    model.change("Rename", named("A"));
    model.preview(start.withName("B"));
    model.undo();
    assertEquals("A", model.sketch().name());
    checkNames("Rename", "");
  }

  @Test
  void aChangeDuringAGestureStartsFromBeforeIt() {
    model.preview(start.withName("A"));
    model.change("Units", sketch -> sketch.withUnits(UnitSystem.INCH));
    assertEquals(start.withUnits(UnitSystem.INCH), model.sketch());
  }

  @Test
  void openingForgetsEverything() {
    model.change("Rename", named("A"));
    model.select(Part.element(1));
    model.open(Sketches.empty());
    checkNames("", "");
    assertFalse(model.unsavedProperty().get());
    assertEquals(Part.JOINT, model.selection());
  }

  @Test
  void theSelectionFollowsItsElement() {
    checkFollows(1, inserted(0), 2);
    checkFollows(1, inserted(2), 1);
    checkFollows(2, removed(0), 1);
    checkFollows(2, removed(3), 2);
    checkFollows(
        3,
        elements(
            list -> {
              Collections.reverse(list);
              return list;
            }),
        0);
  }

  @Test
  void theSelectionGoesToWhatTakesThePlaceOfADeletedElement() {
    checkFollows(1, removed(1), 1);
    checkFollows(3, removed(3), 2);
  }

  private void checkFollows(int from, UnaryOperator<Sketch> change, int to) {
    SketchModel fresh = new SketchModel(Sketches.mixed());
    fresh.select(Part.element(from));
    fresh.change("Change", change);
    assertEquals(Part.element(to), fresh.selection());
    fresh.undo();
    assertEquals(Part.element(from), fresh.selection(), "undone");
    fresh.redo();
    assertEquals(Part.element(to), fresh.selection(), "redone");
  }

  @Test
  void aSelectionTouchedSinceFollowsItsElementThroughUndo() {
    model.change("Insert", inserted(0));
    model.select(Part.element(3));
    model.undo();
    assertEquals(Part.element(2), model.selection());
    model.redo();
    assertEquals(Part.element(3), model.selection());
  }

  @Test
  void aChangeCanSelectWhatItMade() {
    model.change("Insert", Part.element(4), inserted(4));
    assertEquals(Part.element(4), model.selection());
    model.undo();
    assertEquals(Part.JOINT, model.selection());
    model.redo();
    assertEquals(Part.element(4), model.selection());
  }

  @Test
  void theSelectionNeverPointsAtAMissingElementWhoeverListens() {
    List<String> missing = new ArrayList<>();
    Runnable check =
        () -> {
          if (!Selection.exists(model.selection(), model.sketch())) {
            missing.add(model.selection() + " of " + model.sketch().joint().elements().size());
          }
        };
    model.sketchProperty().addListener((property, before, after) -> check.run());
    model.selectionProperty().addListener((property, before, after) -> check.run());
    model.select(Part.element(3));
    model.change("Delete", removed(3));
    model.change("Insert", Part.element(3), inserted(3));
    model.undo();
    model.undo();
    model.select(Part.element(9));
    assertEquals(Part.JOINT, model.selection());
    model.select(Part.element(3));
    model.open(Sketches.empty());
    assertEquals(List.of(), missing);
  }

  @Test
  void theAssessmentIsThatOfTheSketchAndComputedOnce() {
    Assessment first = model.assessment();
    assertEquals(Assessment.of(start.joint()), first);
    assertSame(first, model.assessment());
    model.change("Units", sketch -> sketch.withUnits(UnitSystem.INCH));
    assertSame(first, model.assessment(), "units change no number");
    model.change("Delete", removed(1));
    assertNotSame(first, model.assessment());
    assertEquals(Assessment.of(model.sketch().joint()), model.assessment());
  }

  @Test
  void listenersHearOfTheAssessmentDuringAGesture() {
    List<Assessment> heard = new ArrayList<>();
    model.assessmentProperty().subscribe((Assessment now) -> heard.add(now));
    model.preview(removed(1).apply(start));
    model.preview(removed(2).apply(start));
    assertEquals(3, heard.size());
  }

  @Test
  void aDerivedValueLivesAsLongAsItIsUsedAndNoLonger() {
    SimpleStringProperty shown = new SimpleStringProperty();
    shown.bind(model.sketchProperty().map(Sketch::name));
    System.gc();
    model.change("Rename", named("A"));
    assertEquals("A", shown.get(), "still told after a collection");
  }

  @Test
  void aViewThatObservesWhileShownCanBeCollected() {
    WeakReference<Object> view = watchedForAWhile();
    for (int i = 0; i < 50 && view.get() != null; i++) {
      System.gc();
    }
    assertNull(view.get());
  }

  private WeakReference<Object> watchedForAWhile() {
    SimpleBooleanProperty shown = new SimpleBooleanProperty(true);
    List<Object> view = new ArrayList<>();
    model.assessmentProperty().when(shown).subscribe((Assessment now) -> view.add(now));
    model.change("Delete", removed(1));
    assertEquals(2, view.size());
    shown.set(false);
    return new WeakReference<>(view);
  }
}

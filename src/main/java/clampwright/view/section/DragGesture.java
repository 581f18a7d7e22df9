package clampwright.view.section;

import clampwright.edit.Drag;
import clampwright.edit.Dragged;
import clampwright.edit.SketchModel;
import clampwright.edit.Snap;
import clampwright.edit.Typed;
import clampwright.figure.Tag;
import clampwright.joint.Feature;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import java.util.Optional;
import javafx.scene.Cursor;

/**
 * A drag on the sheet, or a drawing of a new part: shows what it comes to and its value at the
 * pointer, lets typed digits take over, and leaves one step.
 */
final class DragGesture implements Gesture {
  private final SectionPane pane;
  private final SketchModel model;
  private final Drag drag;
  private final Optional<Tag> held;
  private final StringBuilder text = new StringBuilder();
  private Pointer pointer;
  private Drag typing;
  private Dragged last;
  private Sketch shown;

  /**
   * A drag that has begun.
   *
   * @param held what was taken hold of, kept in sight while it moves; empty for a new part
   */
  DragGesture(SectionPane pane, SketchModel model, Drag drag, Optional<Tag> held, Pointer grab) {
    this.pane = pane;
    this.model = model;
    this.drag = drag;
    this.held = held;
    pointer = grab;
    typing = drag;
    last = drag.at(pane.viewport().fromAxis(grab), pane.viewport().z(grab), Snap.FREE);
    shown = model.sketch();
    pane.say(Hints.dragging(held));
    if (held.flatMap(Tag::feature).equals(Optional.of(Feature.BODY))) {
      pane.setCursor(Cursor.CLOSED_HAND);
    }
  }

  @Override
  public void moved(Pointer to) {
    pointer = to;
    if (text.isEmpty()) {
      Drag hold = drag.alone(to.alone());
      Dragged dragged =
          hold.at(
              pane.viewport().fromAxis(to),
              pane.viewport().z(to),
              pane.viewport().snap(model.sketch(), to.free()));
      show(dragged);
      pane.value().show(dragged.caption(), to);
    }
  }

  private void show(Dragged dragged) {
    last = dragged;
    shown = dragged.sketch();
    model.preview(shown);
    if (!dragged.part().equals(Part.JOINT)) {
      model.select(dragged.part());
    }
    pane.setHot(held.map(tag -> new Tag(tag.role(), dragged.part(), tag.feature())));
  }

  /** Whether somebody else has changed the sketch meanwhile: then there is nothing left to hold. */
  private boolean isOvertaken() {
    return model.sketch() != shown;
  }

  @Override
  public boolean released(Pointer at) {
    return text.isEmpty() && confirmed();
  }

  @Override
  public void typed(String character) {
    if (text.isEmpty() && !character.matches("[0-9.,+\\-\\u2212]")) {
      return;
    }
    if (text.isEmpty()) {
      pane.say(Hints.TYPING);
      Drag hold = drag.alone(pointer.alone());
      typing = hold.after(last);
    }
    text.append(character);
    read();
  }

  @Override
  public void erased() {
    if (!text.isEmpty()) {
      text.setLength(text.length() - 1);
      if (text.isEmpty()) {
        pane.say(Hints.dragging(held));
        moved(pointer);
      } else {
        read();
      }
    }
  }

  /** Shows what the text comes to; text on its way to a number says nothing yet. */
  private void read() {
    if (typing.typed(text.toString()) instanceof Typed.Value value) {
      show(value.dragged());
    }
    pane.value().showTyped(last.label(), text.toString(), "", pointer);
  }

  @Override
  public boolean confirmed() {
    if (isOvertaken()) {
      return true;
    }
    if (!text.isEmpty() && typing.typed(text.toString()) instanceof Typed.Wrong wrong) {
      pane.value().showTyped(last.label(), text.toString(), wrong.problem(), pointer);
      return false;
    }
    model.settle(last.step());
    return true;
  }

  @Override
  public void cancel() {
    if (!isOvertaken()) {
      model.revert();
    }
  }
}

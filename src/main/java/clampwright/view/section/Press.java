package clampwright.view.section;

import clampwright.edit.Change;
import clampwright.edit.Drag;
import clampwright.edit.End;
import clampwright.edit.Interfaces;
import clampwright.edit.SketchModel;
import clampwright.edit.Stacking;
import clampwright.figure.Tag;
import clampwright.joint.Feature;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import java.util.Optional;

/**
 * A press of which nobody knows yet what it will be: let go at once it is a click; going far enough
 * it becomes a drag, a drawing or a move of the sheet.
 */
final class Press implements Gesture {
  /** Less than this is a click of an unsteady hand [px]. */
  private static final double FAR = 3;

  /** On bare paper the direction decides; it shows only after a while [px]. */
  private static final double FAR_ON_PAPER = 6;

  private final SectionPane pane;
  private final SketchModel model;
  private final Tool tool;
  private final Optional<Tag> tag;
  private final Pointer at;
  private boolean idle;

  Press(SectionPane pane, SketchModel model, Tool tool, Optional<Tag> tag, Pointer at) {
    this.pane = pane;
    this.model = model;
    this.tool = tool;
    this.tag = tag;
    this.at = at;
    if (tool == Tool.SELECT) {
      tag.filter(hit -> !isInsertion(hit)).ifPresent(hit -> model.select(hit.part()));
    }
  }

  private static boolean isInsertion(Tag tag) {
    return tag.feature().equals(Optional.of(Feature.INSERT));
  }

  @Override
  public void moved(Pointer pointer) {
    if (!idle && pointer.distance(at) >= far()) {
      Optional<Gesture> gesture = begun(pointer);
      idle = gesture.isEmpty();
      gesture.ifPresent(
          begun -> {
            pane.goOn(begun);
            begun.moved(pointer);
          });
    }
  }

  private double far() {
    return tool == Tool.SELECT && tag.isEmpty() ? FAR_ON_PAPER : FAR;
  }

  private Optional<Gesture> begun(Pointer pointer) {
    return switch (tool) {
      case LAYER -> Optional.of(drawing());
      case WASHER -> washer();
      case SELECT -> tag.isPresent() ? dragged(tag.get()) : Optional.of(onBarePaper(pointer));
    };
  }

  private Optional<Gesture> dragged(Tag tag) {
    if (tag.feature().isEmpty()) {
      return Optional.of(new PanGesture(pane, at));
    }
    Optional<Drag> drag =
        tag.part().equals(Part.LOAD)
            ? Drag.load(model.sketch(), model.loadCase(), tag.feature().get(), x(), z())
            : Drag.start(model.sketch(), tag.part(), tag.feature().get(), x(), z());
    if (drag.isEmpty()) {
      pane.refuse(Hints.held(model.sketch(), tag));
    }
    boolean drawn = isInsertion(tag);
    return drag.map(
        hold -> new DragGesture(pane, model, hold, drawn ? Optional.empty() : this.tag, at));
  }

  /** Down or up beside the stack draws a layer; everything else moves the sheet. */
  private Gesture onBarePaper(Pointer pointer) {
    boolean alongAxis = Math.abs(pointer.y() - at.y()) > Math.abs(pointer.x() - at.x());
    return alongAxis && pane.isBesideStack(at) ? drawing() : new PanGesture(pane, at);
  }

  private Gesture drawing() {
    pane.setTool(Tool.SELECT);
    Drag drag = Drag.layer(model.sketch(), x(), z());
    return new DragGesture(pane, model, drag, Optional.empty(), at);
  }

  private Optional<Gesture> washer() {
    End end = Interfaces.end(model.sketch().joint(), z());
    if (!Stacking.canAddWasher(model.sketch(), end)) {
      pane.refuse(Hints.NO_WASHER);
      return Optional.empty();
    }
    pane.setTool(Tool.SELECT);
    Drag drag = Drag.washer(model.sketch(), end, x(), z());
    return Optional.of(new DragGesture(pane, model, drag, Optional.empty(), at));
  }

  private double x() {
    return pane.viewport().fromAxis(at);
  }

  private double z() {
    return pane.viewport().z(at);
  }

  @Override
  public boolean released(Pointer pointer) {
    if (!idle) {
      clicked();
    }
    return true;
  }

  private void clicked() {
    Joint joint = model.sketch().joint();
    switch (tool) {
      case LAYER -> insert(Interfaces.nearest(joint, z()));
      case WASHER -> addWasher(Interfaces.end(joint, z()));
      case SELECT -> {
        if (tag.isEmpty()) {
          model.select(Part.JOINT);
        } else if (isInsertion(tag.get())) {
          insert(Interfaces.above(joint, tag.get().part()));
        }
      }
    }
  }

  private void insert(int index) {
    change(Stacking.inserted(model.sketch(), index));
  }

  private void addWasher(End end) {
    if (Stacking.canAddWasher(model.sketch(), end)) {
      change(Stacking.washerAdded(model.sketch(), end));
    } else {
      pane.refuse(Hints.NO_WASHER);
    }
  }

  private void change(Change change) {
    pane.setTool(Tool.SELECT);
    model.change(change);
  }

  @Override
  public void cancel() {
    idle = true;
  }
}

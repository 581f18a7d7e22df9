package clampwright.view.section;

import clampwright.edit.Drag;
import clampwright.edit.Interfaces;
import clampwright.edit.Names;
import clampwright.edit.Noting;
import clampwright.edit.SketchModel;
import clampwright.edit.Snap;
import clampwright.edit.Stacking;
import clampwright.joint.Element;
import clampwright.joint.Feature;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.input.KeyEvent;

/** What keys do while nothing is being dragged. */
final class SectionKeys {
  /** What the keys below and those of a drag do, for the keyboard page. */
  static final List<SectionPane.Key> LIST =
      List.of(
          new SectionPane.Key("Up, Down", "Select the part above or below"),
          new SectionPane.Key("Shift+Up, Shift+Down", "Thicken or thin the selected part"),
          new SectionPane.Key("Digits", "Set the selected part's thickness, angle or thread"),
          new SectionPane.Key("Enter", "Open the selected part's card"),
          new SectionPane.Key("L", "Draw a layer"),
          new SectionPane.Key("W", "Draw or place a washer"),
          new SectionPane.Key("Alt in a drag", "Suspend snapping"),
          new SectionPane.Key("Digits in a drag", "Set the value exactly"),
          new SectionPane.Key("Esc", "Take a drag back, leave the tool, select nothing"));

  private static final double ZOOM = 1.25;

  private final SectionPane pane;
  private final SketchModel model;

  SectionKeys(SectionPane pane, SketchModel model) {
    this.pane = pane;
    this.model = model;
  }

  /** Whether the key meant something here. */
  boolean pressed(KeyEvent event) {
    if (event.isControlDown() || event.isMetaDown()) {
      return withControl(event);
    }
    return switch (event.getCode()) {
      case UP -> arrow(event, -1);
      case DOWN -> arrow(event, 1);
      case DELETE, BACK_SPACE -> delete();
      case INSERT -> insert();
      case ENTER -> openCard();
      case ESCAPE -> leave();
      case F -> fit();
      case L -> take(Tool.LAYER);
      case W -> take(Tool.WASHER);
      default -> false;
    };
  }

  private boolean withControl(KeyEvent event) {
    return switch (event.getCode()) {
      case PLUS, ADD, EQUALS -> zoom(ZOOM);
      case MINUS, SUBTRACT -> zoom(1 / ZOOM);
      case DIGIT0, NUMPAD0 -> fit();
      default -> false;
    };
  }

  private boolean zoom(double factor) {
    pane.viewport().zoom(factor, pane.getWidth() / 2, pane.getHeight() / 2);
    return true;
  }

  private boolean fit() {
    pane.fit();
    return true;
  }

  private boolean take(Tool tool) {
    pane.setTool(tool);
    return true;
  }

  /** Leaves the card; without one the tool; without that the selection. */
  private boolean leave() {
    if (pane.hasCard()) {
      pane.clearDesk();
      return true;
    }
    boolean something = pane.tool() != Tool.SELECT || !model.selection().equals(Part.JOINT);
    if (pane.tool() == Tool.SELECT) {
      model.select(Part.JOINT);
    }
    pane.setTool(Tool.SELECT);
    return something;
  }

  private boolean arrow(KeyEvent event, int towards) {
    if (event.isAltDown()) {
      return reorder(towards);
    }
    return event.isShiftDown() ? thicken(towards) : selectNext(towards);
  }

  /** The parts that the arrow keys go through, from the head to the nut. */
  private static List<Part> parts(Joint joint) {
    List<Part> parts = new ArrayList<>();
    parts.add(Part.HEAD);
    for (int i = 0; i < joint.elements().size(); i++) {
      parts.add(Part.element(i));
    }
    parts.add(Part.ANCHOR);
    return parts;
  }

  private boolean selectNext(int towards) {
    List<Part> parts = parts(model.sketch().joint());
    int at = parts.indexOf(model.selection());
    int next = at < 0 ? Math.min(1, parts.size() - 1) : at + towards;
    model.select(parts.get(Math.max(0, Math.min(parts.size() - 1, next))));
    return true;
  }

  private Optional<Integer> element() {
    Part part = model.selection();
    return part.isElement() ? Optional.of(part.index()) : Optional.empty();
  }

  private boolean reorder(int towards) {
    element()
        .filter(at -> Stacking.canMove(model.sketch(), at, towards))
        .ifPresent(at -> model.change(Stacking.moved(model.sketch(), at, at + towards)));
    return element().isPresent();
  }

  private boolean delete() {
    Optional<Integer> selected = element();
    selected.ifPresent(at -> model.change(Stacking.deleted(model.sketch(), at)));
    if (model.selection().isNote()) {
      model.change(Noting.deleted(model.sketch(), model.selection().index()));
      return true;
    }
    return selected.isPresent();
  }

  /** Below the selected part, else as near to the nut as a layer can come. */
  private boolean insert() {
    Sketch sketch = model.sketch();
    int last = Interfaces.nearest(sketch.joint(), Double.MAX_VALUE);
    model.change(Stacking.inserted(sketch, element().map(at -> at + 1).orElse(last)));
    return true;
  }

  /** Thickens the selected part to the next step; repeated keys are one step of the history. */
  boolean thicken(int steps) {
    Optional<Integer> at = element();
    at.ifPresent(
        index -> {
          Snap snap = pane.viewport().snap(model.sketch(), false);
          Part part = Part.element(index);
          String name = "Change thickness of " + Names.of(model.sketch().joint(), part);
          model.type(name, List.of(this, part), sketch -> thickened(sketch, index, steps, snap));
        });
    return at.isPresent();
  }

  private static Sketch thickened(Sketch sketch, int index, int steps, Snap snap) {
    Element element = sketch.joint().elements().get(index);
    double to = snap.next(element.thickness(), steps);
    return sketch.withJoint(joint -> joint.withElement(index, element.withThickness(to)));
  }

  private boolean openCard() {
    pane.openCard();
    return true;
  }

  /** What typed digits would set for the selected part; empty when nothing. */
  Optional<Drag> typed(Pointer at) {
    return switch (model.selection().kind()) {
      case ELEMENT -> drag(Feature.FACE, at);
      case HEAD_CONE, NUT_CONE -> drag(Feature.FLANK, at);
      case SHANK -> drag(Feature.SHANK_EDGE, at);
      default -> Optional.empty();
    };
  }

  private Optional<Drag> drag(Feature feature, Pointer at) {
    double fromAxis = pane.viewport().fromAxis(at);
    return Drag.start(model.sketch(), model.selection(), feature, fromAxis, pane.viewport().z(at));
  }
}

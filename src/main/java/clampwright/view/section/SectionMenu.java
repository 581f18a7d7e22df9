package clampwright.view.section;

import clampwright.edit.Change;
import clampwright.edit.End;
import clampwright.edit.Interfaces;
import clampwright.edit.SketchModel;
import clampwright.edit.Stacking;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import javafx.scene.control.ContextMenu;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.input.ContextMenuEvent;

/** The menu at a part or on bare paper; nothing in it cannot be done otherwise. */
final class SectionMenu {
  private final SectionPane pane;
  private final SketchModel model;
  private ContextMenu open;

  SectionMenu(SectionPane pane, SketchModel model) {
    this.pane = pane;
    this.model = model;
    pane.addEventHandler(ContextMenuEvent.CONTEXT_MENU_REQUESTED, this::requested);
  }

  private void requested(ContextMenuEvent event) {
    Pointer at = new Pointer(event.getX(), event.getY(), false, false);
    if (!event.isKeyboardTrigger()) {
      model.select(pane.hit(at).map(tag -> tag.part()).orElse(Part.JOINT));
    }
    hide();
    open = new ContextMenu();
    open.setId("section-menu");
    Part part = model.selection();
    open.getItems().setAll(part.isElement() ? forElement(part.index()) : forOthers(part, at));
    open.show(pane, event.getScreenX(), event.getScreenY());
    event.consume();
  }

  void hide() {
    if (open != null) {
      open.hide();
      open = null;
    }
  }

  private List<MenuItem> forElement(int at) {
    return List.of(
        item("Open card", true, pane::openCard),
        new SeparatorMenuItem(),
        step("Insert layer above", true, sketch -> Stacking.inserted(sketch, at)),
        step("Insert layer below", true, sketch -> Stacking.inserted(sketch, at + 1)),
        step("Duplicate", true, sketch -> Stacking.duplicated(sketch, at)),
        step("Move up", canMove(at, -1), sketch -> Stacking.moved(sketch, at, at - 1)),
        step("Move down", canMove(at, 1), sketch -> Stacking.moved(sketch, at, at + 1)),
        new SeparatorMenuItem(),
        step("Delete", true, sketch -> Stacking.deleted(sketch, at)));
  }

  private boolean canMove(int at, int places) {
    return Stacking.canMove(model.sketch(), at, places);
  }

  private List<MenuItem> forOthers(Part part, Pointer at) {
    List<MenuItem> items = new ArrayList<>();
    if (!part.equals(Part.JOINT)) {
      items.add(item("Open card", true, pane::openCard));
      items.add(new SeparatorMenuItem());
    }
    double z = pane.viewport().z(at);
    items.add(
        step(
            "Insert layer here",
            true,
            sketch -> Stacking.inserted(sketch, Interfaces.nearest(sketch.joint(), z))));
    items.add(washer("Add washer at the head", End.HEAD));
    items.add(washer("Add washer at the nut", End.NUT));
    items.add(new SeparatorMenuItem());
    items.add(item("Fit", true, pane::fit));
    return items;
  }

  private MenuItem washer(String text, End end) {
    boolean can = Stacking.canAddWasher(model.sketch(), end);
    return step(text, can, sketch -> Stacking.washerAdded(sketch, end));
  }

  private MenuItem step(String text, boolean enabled, Function<Sketch, Change> change) {
    return item(text, enabled, () -> model.change(change.apply(model.sketch())));
  }

  private static MenuItem item(String text, boolean enabled, Runnable action) {
    MenuItem item = new MenuItem(text);
    item.setMnemonicParsing(false);
    item.setDisable(!enabled);
    item.setOnAction(event -> action.run());
    return item;
  }
}

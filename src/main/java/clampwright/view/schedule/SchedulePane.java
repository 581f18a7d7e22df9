package clampwright.view.schedule;

import clampwright.edit.SketchModel;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.Assessment.Unsolved;
import clampwright.mechanics.ElementFinding;
import clampwright.view.OncePerPulse;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.application.Platform;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.VBox;

/**
 * The stack as a table. A row selects its element; a second press on a cell, Enter or F2 edits it.
 * While the joint has no solution the found columns are empty.
 */
public final class SchedulePane extends BorderPane {
  private final SketchModel model;
  private final HeaderLine header = new HeaderLine();
  private final VBox body = new VBox();
  private final ScrollPane scroll = new ScrollPane(body);
  private final List<ElementLine> lines = new ArrayList<>();

  public SchedulePane(SketchModel model) {
    this.model = model;
    getStyleClass().add("schedule");
    setAccessibleRole(AccessibleRole.TABLE_VIEW);
    setAccessibleText("Schedule of the stack");
    scroll.setFitToWidth(true);
    scroll.getStyleClass().add("schedule-body");
    scroll.setFocusTraversable(false);
    // A scroll bar comes and goes while the scroll pane is laid out, so only the next pulse can
    // lay the titles out by it.
    scroll
        .viewportBoundsProperty()
        .addListener((observable, was, is) -> Platform.runLater(this::requestLayout));
    BorderPane.setAlignment(header, Pos.TOP_LEFT);
    setTop(header);
    setCenter(scroll);
    OncePerPulse.keep(this, this::follow, model.sketchProperty(), model.assessmentProperty());
    model.selectionProperty().subscribe((Part was, Part is) -> mark());
  }

  /** The columns stand under their titles also when a scroll bar takes room beside them. */
  @Override
  protected void layoutChildren() {
    super.layoutChildren();
    scroll.layout();
    header.resize(scroll.getViewportBounds().getWidth(), header.getHeight());
  }

  private void follow() {
    Sketch sketch = model.sketch();
    Assessment assessment = model.assessment();
    int count = sketch.joint().elements().size();
    fit(count);
    header.show(sketch.units());
    Optional<Solved> solved =
        assessment instanceof Solved found ? Optional.of(found) : Optional.empty();
    Scale scale =
        solved
            .map(found -> Scale.of(found, sketch.joint().method().stiffness(), sketch.units()))
            .orElse(Scale.NONE);
    for (int i = 0; i < count; i++) {
      int index = i;
      Optional<ElementFinding> finding = solved.map(found -> found.elements().get(index));
      lines.get(i).show(sketch, finding, scale, isBlamed(assessment, i));
    }
    mark();
  }

  private static boolean isBlamed(Assessment assessment, int index) {
    return assessment instanceof Unsolved unsolved
        && unsolved.reasons().stream()
            .anyMatch(reason -> reason.part().equals(Part.element(index)));
  }

  private void fit(int count) {
    while (lines.size() < count) {
      lines.add(line(lines.size()));
    }
    if (body.getChildren().size() != count) {
      body.getChildren().setAll(lines.subList(0, count));
    }
  }

  private ElementLine line(int index) {
    ElementLine line = new ElementLine(model, index);
    line.addEventHandler(MouseEvent.MOUSE_PRESSED, event -> pressed(line, index, event));
    line.addEventHandler(KeyEvent.KEY_PRESSED, event -> keyPressed(line, index, event));
    line.focusedProperty()
        .addListener(
            (observable, was, is) -> {
              if (is) {
                select(index);
              }
            });
    return line;
  }

  private void pressed(ElementLine line, int index, MouseEvent event) {
    boolean again = model.selectionProperty().get().equals(Part.element(index));
    Column column = line.columnAt(event.getX());
    line.requestFocus();
    select(index);
    if (again && column.isEditable()) {
      line.editing().open(column);
    }
    event.consume();
  }

  private void keyPressed(ElementLine line, int index, KeyEvent event) {
    if (event.getTarget() != line || event.isShortcutDown() || event.isAltDown()) {
      return;
    }
    switch (event.getCode()) {
      case UP -> focus(index - 1, event);
      case DOWN -> focus(index + 1, event);
      case ENTER, F2 -> {
        line.editing().open(Column.THICKNESS);
        event.consume();
      }
      default -> {
        // Other keys belong to the window.
      }
    }
  }

  private void focus(int index, KeyEvent event) {
    if (index >= 0 && index < body.getChildren().size()) {
      lines.get(index).requestFocus();
    }
    event.consume();
  }

  private void select(int index) {
    if (index < model.sketch().joint().elements().size()) {
      model.selectionProperty().set(Part.element(index));
    }
  }

  private void mark() {
    Part selected = model.selectionProperty().get();
    for (int i = 0; i < lines.size(); i++) {
      lines.get(i).select(selected.equals(Part.element(i)));
    }
  }
}

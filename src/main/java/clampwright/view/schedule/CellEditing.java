package clampwright.view.schedule;

import clampwright.edit.SketchModel;
import clampwright.joint.Part;
import clampwright.view.field.Typed;
import clampwright.view.given.PartFields;
import java.util.EnumMap;
import java.util.Map;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;

/**
 * Turns cells of a row into fields and back. A field whose text is wrong stays where it is, text
 * and all.
 */
final class CellEditing {
  private final ElementLine line;
  private final PartFields fields;
  private final Map<Column, Region> editors = new EnumMap<>(Column.class);
  private final Map<Column, Node> labels = new EnumMap<>(Column.class);

  CellEditing(ElementLine line, SketchModel model, Part part) {
    this.line = line;
    fields = new PartFields(model, () -> part);
  }

  /** Opens the field of a column and gives it the focus. */
  void open(Column column) {
    if (!column.isEditable() || column == Column.HOLE && isTapped()) {
      return;
    }
    Region editor = editors.computeIfAbsent(column, this::editor);
    if (line.get(column) != editor) {
      labels.put(column, line.get(column));
      line.set(column, editor);
    }
    Node focus = editor.lookup(".text-field");
    (focus == null ? editor : focus).requestFocus();
    if (focus instanceof javafx.scene.control.TextField text) {
      text.selectAll();
    }
  }

  /** Closes every field that is no longer in use and has nothing wrong in it. */
  void close() {
    labels.keySet().removeIf(this::closed);
  }

  private boolean closed(Column column) {
    Region editor = editors.get(column);
    boolean wrong = editor instanceof Typed typed && typed.isWrong();
    if (wrong || editor.isFocusWithin()) {
      return false;
    }
    line.set(column, labels.get(column));
    return true;
  }

  private boolean isTapped() {
    return line.get(Column.HOLE) instanceof javafx.scene.control.Label label
        && label.getText().equals("tapped");
  }

  private Region editor(Column column) {
    Region editor =
        switch (column) {
          case PART -> fields.name();
          case MATERIAL -> fields.material();
          case THICKNESS -> fields.thickness();
          default -> fields.hole();
        };
    editor.getStyleClass().add("cell-field");
    editor
        .focusWithinProperty()
        .addListener(
            (observable, was, is) -> {
              if (!is) {
                closeUnlessListOpen(editor);
              }
            });
    editor.addEventFilter(KeyEvent.KEY_PRESSED, event -> keyPressed(event, column));
    return editor;
  }

  private void closeUnlessListOpen(Region editor) {
    boolean listOpen =
        editor instanceof Button
            && editor.getScene() != null
            && editor.getScene().getFocusOwner() == editor;
    if (!listOpen) {
      javafx.application.Platform.runLater(this::close);
    }
  }

  private void keyPressed(KeyEvent event, Column column) {
    if (event.getCode() == KeyCode.TAB) {
      Column next = next(column, event.isShiftDown() ? -1 : 1);
      if (next != null) {
        open(next);
        event.consume();
      }
    } else if (event.getCode() == KeyCode.ENTER && !(editors.get(column) instanceof Button)) {
      ((Typed) editors.get(column)).commit();
      if (!((Typed) editors.get(column)).isWrong()) {
        line.requestFocus();
      }
      event.consume();
    } else if (event.getCode() == KeyCode.ESCAPE) {
      javafx.application.Platform.runLater(line::requestFocus);
    }
  }

  private static Column next(Column column, int by) {
    for (int i = column.ordinal() + by; i >= 0 && i < Column.values().length; i += by) {
      if (Column.values()[i].isEditable()) {
        return Column.values()[i];
      }
    }
    return null;
  }
}

package clampwright.view.field;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.geometry.Bounds;
import javafx.scene.control.Button;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyEvent;
import javafx.stage.Popup;

/** The list that a choice field opens: headings, values, the present one selected. */
final class ChoiceList<T> {
  private static final double ROW = 24;
  private static final int MOST_ROWS = 14;

  /** A heading has no choice. */
  private record Row<T>(String label, Optional<Choice<T>> choice) {}

  private final Button field;
  private final Consumer<T> chosen;
  private final Popup popup = new Popup();
  private final ListView<Row<T>> list = new ListView<>();
  private final StringBuilder typed = new StringBuilder();

  ChoiceList(Button field, List<Choice<T>> choices, Optional<T> present, Consumer<T> chosen) {
    this.field = field;
    this.chosen = chosen;
    list.getStyleClass().add("choice-list");
    list.getItems().setAll(rows(choices));
    list.setFixedCellSize(ROW);
    list.setPrefHeight(ROW * Math.min(MOST_ROWS, list.getItems().size()) + 8);
    list.setPrefWidth(Math.max(field.getWidth(), widest() * 6.6 + 34));
    list.setCellFactory(view -> new Cell());
    list.addEventFilter(KeyEvent.KEY_PRESSED, this::keyPressed);
    list.addEventFilter(KeyEvent.KEY_TYPED, this::keyTyped);
    popup.getContent().add(list);
    popup.setAutoHide(true);
    popup.setOnHidden(event -> field.requestFocus());
    present.ifPresent(this::select);
  }

  void show() {
    Bounds place = field.localToScreen(field.getBoundsInLocal());
    popup.show(field, place.getMinX(), place.getMaxY() + 2);
    list.requestFocus();
    int selected = list.getSelectionModel().getSelectedIndex();
    list.scrollTo(Math.max(0, selected - MOST_ROWS / 2));
  }

  private static <T> List<Row<T>> rows(List<Choice<T>> choices) {
    List<Row<T>> rows = new ArrayList<>();
    String group = "";
    for (Choice<T> choice : choices) {
      if (!choice.group().equals(group)) {
        group = choice.group();
        rows.add(new Row<>(group, Optional.empty()));
      }
      rows.add(new Row<>(choice.label(), Optional.of(choice)));
    }
    return rows;
  }

  private int widest() {
    return list.getItems().stream().mapToInt(row -> row.label().length()).max().orElse(10);
  }

  private void select(T value) {
    for (int i = 0; i < list.getItems().size(); i++) {
      Optional<Choice<T>> choice = list.getItems().get(i).choice();
      if (choice.isPresent() && choice.get().value().equals(value)) {
        list.getSelectionModel().select(i);
        return;
      }
    }
  }

  private void take(Row<T> row) {
    row.choice()
        .ifPresent(
            choice -> {
              popup.hide();
              chosen.accept(choice.value());
            });
  }

  private void keyPressed(KeyEvent event) {
    switch (event.getCode()) {
      case ENTER, SPACE -> {
        Row<T> row = list.getSelectionModel().getSelectedItem();
        if (row != null) {
          take(row);
        }
        event.consume();
      }
      case ESCAPE -> {
        popup.hide();
        event.consume();
      }
      case UP -> step(event, -1);
      case DOWN -> step(event, 1);
      default -> {
        // Paging and ends are the list's own.
      }
    }
  }

  private void step(KeyEvent event, int by) {
    int at = list.getSelectionModel().getSelectedIndex() + by;
    while (at >= 0 && at < list.getItems().size()) {
      if (list.getItems().get(at).choice().isPresent()) {
        list.getSelectionModel().select(at);
        list.scrollTo(Math.max(0, at - MOST_ROWS / 2));
        break;
      }
      at += by;
    }
    event.consume();
  }

  /** Typing the beginning of a label goes to it. */
  private void keyTyped(KeyEvent event) {
    String letter = event.getCharacter();
    if (letter.isBlank() || event.isShortcutDown()) {
      return;
    }
    typed.append(letter.toLowerCase(Locale.ROOT));
    if (!selectStart(typed.toString())) {
      typed.setLength(0);
      typed.append(letter.toLowerCase(Locale.ROOT));
      selectStart(typed.toString());
    }
  }

  private boolean selectStart(String start) {
    for (int i = 0; i < list.getItems().size(); i++) {
      Row<T> row = list.getItems().get(i);
      if (row.choice().isPresent() && row.label().toLowerCase(Locale.ROOT).startsWith(start)) {
        list.getSelectionModel().select(i);
        list.scrollTo(Math.max(0, i - MOST_ROWS / 2));
        return true;
      }
    }
    return false;
  }

  private final class Cell extends ListCell<Row<T>> {
    Cell() {
      setOnMouseReleased(
          event -> {
            if (getItem() != null) {
              take(getItem());
            }
          });
    }

    @Override
    protected void updateItem(Row<T> row, boolean empty) {
      super.updateItem(row, empty);
      setText(empty ? null : row.label());
      boolean heading = !empty && row.choice().isEmpty();
      setDisable(heading);
      getStyleClass().remove("heading");
      if (heading) {
        getStyleClass().add("heading");
      }
      String origin = empty ? "" : row.choice().map(Choice::origin).orElse("");
      setTooltip(origin.isEmpty() ? null : new Tooltip(origin));
    }
  }
}

package clampwright.app;

import java.util.List;
import javafx.scene.control.Alert;
import javafx.scene.control.Alert.AlertType;
import javafx.scene.control.ButtonBar.ButtonData;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.stage.Window;

/** Asks and tells in dialogs of the window. */
final class Dialogs implements Questions {
  private static final ButtonType SAVE = new ButtonType("Save", ButtonData.YES);
  private static final ButtonType DISCARD = new ButtonType("Don't save", ButtonData.NO);
  private static final ButtonType CANCEL = new ButtonType("Cancel", ButtonData.CANCEL_CLOSE);

  private final Window owner;

  Dialogs(Window owner) {
    this.owner = owner;
  }

  @Override
  public Unsaved unsaved(String name) {
    Alert alert = alert(AlertType.NONE, "Unsaved work", SAVE, DISCARD, CANCEL);
    alert.setHeaderText("“" + name + "” has changes that are not saved.");
    alert.setContentText("Save them before going on?");
    ButtonType answer = alert.showAndWait().orElse(CANCEL);
    return answer == SAVE ? Unsaved.SAVE : answer == DISCARD ? Unsaved.DISCARD : Unsaved.CANCEL;
  }

  @Override
  public void tell(String title, List<String> lines) {
    Alert alert = alert(AlertType.NONE, "Clampwright", ButtonType.OK);
    alert.setHeaderText(title);
    Label text = new Label(String.join("\n", lines));
    text.setWrapText(true);
    text.setMaxWidth(520);
    ScrollPane scroll = new ScrollPane(text);
    scroll.setFitToWidth(true);
    scroll.setPrefViewportHeight(Math.min(280, 22.0 * Math.max(2, lines.size())));
    scroll.setPrefViewportWidth(540);
    scroll.getStyleClass().add("dialog-lines");
    alert.getDialogPane().setContent(lines.size() > 8 ? scroll : text);
    alert.showAndWait();
  }

  private Alert alert(AlertType type, String title, ButtonType... buttons) {
    Alert alert = new Alert(type, "", buttons);
    alert.setTitle(title);
    alert.initOwner(owner);
    alert.getDialogPane().getStylesheets().setAll(owner.getScene().getStylesheets());
    alert.getDialogPane().getStyleClass().add("cw-dialog");
    alert.getDialogPane().setMaxWidth(600);
    return alert;
  }
}

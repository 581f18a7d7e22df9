package clampwright.app;

import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.stage.Stage;

/** A window with a page of help beside the editor; Escape closes it. */
final class HelpWindow {
  private HelpWindow() {}

  static void show(Stage owner, String title, Node page) {
    ScrollPane scroll = new ScrollPane(page);
    scroll.setFitToWidth(true);
    scroll.getStyleClass().add("help");
    Scene scene = new Scene(scroll);
    scene.getStylesheets().setAll(owner.getScene().getStylesheets());
    Stage stage = new Stage();
    stage.initOwner(owner);
    stage.setTitle(title);
    stage.setScene(scene);
    stage.setWidth(640);
    stage.setHeight(620);
    scene.addEventHandler(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.ESCAPE) {
            stage.close();
          }
        });
    stage.show();
  }
}

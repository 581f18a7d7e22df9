package clampwright.app;

import javafx.application.Application;
import javafx.stage.Stage;

/** The editor. For now an empty window: its panes come with the commit of the shell. */
public final class ClampwrightApp extends Application {
  @Override
  public void start(Stage stage) {
    stage.show();
  }
}

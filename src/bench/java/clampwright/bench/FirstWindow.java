package clampwright.bench;

import javafx.application.Application;
import javafx.application.Platform;
import javafx.collections.ListChangeListener;
import javafx.scene.Group;
import javafx.scene.Scene;
import javafx.stage.Stage;
import javafx.stage.Window;

/**
 * A process that starts the program, or an empty window, says when its first window is painted and
 * when all panes of the program are, and ends.
 */
public final class FirstWindow {
  static final String PAINTED = "first window painted";
  static final String COMPLETE = "all panes painted";

  /** The last thing that the program puts into its window. */
  private static final String LAST = "#caution";

  private FirstWindow() {}

  /** Starts what the first argument names: {@code program} or {@code empty}. */
  public static void main(String[] arguments) {
    Window.getWindows()
        .addListener(
            (ListChangeListener<Window>)
                change -> {
                  change.next();
                  Window window = change.getAddedSubList().get(0);
                  boolean program = arguments[0].equals("program");
                  Painted.then(() -> painted(window, program));
                });
    if (arguments[0].equals("program")) {
      clampwright.app.Launcher.main(new String[0]);
    } else {
      Application.launch(Empty.class);
    }
  }

  private static void painted(Window window, boolean program) {
    tell(PAINTED);
    if (program) {
      Platform.runLater(() -> awaitPanes(window));
    } else {
      Runtime.getRuntime().halt(0);
    }
  }

  private static void awaitPanes(Window window) {
    boolean all = window.getScene().getRoot().lookup(LAST) != null;
    Painted.then(
        () -> {
          if (all) {
            tell(COMPLETE);
            Runtime.getRuntime().halt(0);
          }
          Platform.runLater(() -> awaitPanes(window));
        });
  }

  private static void tell(String what) {
    System.out.println(what);
    System.out.flush();
  }

  /** As little as a window can be. */
  public static final class Empty extends Application {
    @Override
    public void start(Stage stage) {
      stage.setScene(new Scene(new Group(), 1440, 900));
      stage.show();
    }
  }
}

package clampwright.app;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.function.Supplier;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.layout.StackPane;

/**
 * Parts of the window that come after its first frame: the window stands and shows the drawing
 * while the rest is being made, one part per frame, each at a place kept free for it.
 */
final class Later {
  private final Deque<Runnable> waiting = new ArrayDeque<>();
  private Scene scene;

  void add(Runnable part) {
    waiting.add(part);
  }

  /** A place that is filled later; what it holds until then goes. */
  StackPane place(String style, Supplier<Node> content, Node... untilThen) {
    StackPane place = new StackPane(untilThen);
    place.getStyleClass().add(style);
    add(() -> place.getChildren().setAll(content.get()));
    return place;
  }

  /** Starts once the scene has been laid out for its first frame. */
  void start(Scene scene) {
    this.scene = scene;
    next();
  }

  /** Makes all that is still waiting at once. */
  void finish() {
    while (!waiting.isEmpty()) {
      waiting.remove().run();
    }
  }

  boolean isDone() {
    return waiting.isEmpty();
  }

  private void next() {
    if (waiting.isEmpty()) {
      return;
    }
    Runnable[] once = {null};
    once[0] =
        () -> {
          scene.removePostLayoutPulseListener(once[0]);
          Platform.runLater(
              () -> {
                if (!waiting.isEmpty()) {
                  waiting.remove().run();
                  next();
                }
              });
        };
    scene.addPostLayoutPulseListener(once[0]);
    Platform.requestNextPulse();
  }
}

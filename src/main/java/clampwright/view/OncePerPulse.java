package clampwright.view;

import javafx.application.Platform;
import javafx.beans.Observable;
import javafx.scene.Node;
import javafx.scene.Scene;

/**
 * Brings a pane up to date once before the next frame, however often its sources change until then.
 * A pane that is in no scene is brought up to date when it comes into one.
 */
public final class OncePerPulse {
  private final Node node;
  private final Runnable update;
  private final Runnable pulse = this::pulse;
  private Scene waiting;
  private boolean stale;

  private OncePerPulse(Node node, Runnable update) {
    this.node = node;
    this.update = update;
  }

  /** Runs the update now and after every change of the sources. */
  public static void keep(Node node, Runnable update, Observable... sources) {
    OncePerPulse keeper = new OncePerPulse(node, update);
    for (Observable source : sources) {
      source.subscribe(keeper::changed);
    }
    node.sceneProperty().subscribe(keeper::entered);
    update.run();
  }

  private void changed() {
    Scene scene = node.getScene();
    stale = true;
    if (scene != null && waiting == null) {
      waiting = scene;
      scene.addPreLayoutPulseListener(pulse);
      Platform.requestNextPulse();
    }
  }

  private void entered(Scene scene) {
    if (scene != null && stale) {
      update();
    }
  }

  private void pulse() {
    waiting.removePreLayoutPulseListener(pulse);
    waiting = null;
    if (stale && node.getScene() != null) {
      update();
    }
  }

  private void update() {
    stale = false;
    update.run();
  }
}

package clampwright.view;

import java.util.function.Supplier;
import javafx.scene.Node;
import javafx.scene.control.Tooltip;
import javafx.scene.input.MouseEvent;
import javafx.util.Duration;

/** Tooltips that are made when the pointer first comes near: a window has many and shows few. */
public final class Hover {
  private Hover() {}

  /** Tells a text, asked for each time, when the pointer rests on a node; none while empty. */
  public static void tell(Node node, Supplier<String> text) {
    node.addEventHandler(
        MouseEvent.MOUSE_ENTERED,
        new javafx.event.EventHandler<>() {
          @Override
          public void handle(MouseEvent event) {
            node.removeEventHandler(MouseEvent.MOUSE_ENTERED, this);
            install(node, text);
          }
        });
  }

  /** An empty tooltip would still show its frame. */
  private static void offer(Node node, Tooltip tooltip, String text) {
    Tooltip.uninstall(node, tooltip);
    tooltip.setText(text);
    if (!text.isEmpty()) {
      Tooltip.install(node, tooltip);
    }
  }

  private static void install(Node node, Supplier<String> text) {
    Tooltip tooltip = new Tooltip();
    tooltip.setShowDelay(Duration.millis(500));
    tooltip.setShowDuration(Duration.seconds(30));
    tooltip.setWrapText(true);
    tooltip.setMaxWidth(360);
    tooltip.setOnShowing(event -> tooltip.setText(text.get()));
    node.addEventHandler(MouseEvent.MOUSE_ENTERED, event -> offer(node, tooltip, text.get()));
    offer(node, tooltip, text.get());
  }
}

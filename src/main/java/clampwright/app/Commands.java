package clampwright.app;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.scene.Scene;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;

/**
 * All that the window can do, menu by menu. Keys are looked up here before any field sees them, so
 * that undo in a text field undoes the sketch; keys without a modifier only when no text is being
 * typed and nothing nearer has used them.
 */
final class Commands {
  private final Map<String, List<Command>> menus = new LinkedHashMap<>();

  void add(String menu, Command... commands) {
    menus.computeIfAbsent(menu, name -> new ArrayList<>()).addAll(List.of(commands));
  }

  Map<String, List<Command>> menus() {
    return menus;
  }

  Command get(String id) {
    return all().stream().filter(command -> command.id().equals(id)).findFirst().orElseThrow();
  }

  private List<Command> all() {
    return menus.values().stream().flatMap(List::stream).toList();
  }

  void listen(Scene scene) {
    scene.addEventFilter(KeyEvent.KEY_PRESSED, event -> call(event, false));
    scene.addEventHandler(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (!(scene.getFocusOwner() instanceof TextInputControl)) {
            call(event, true);
          }
        });
  }

  private void call(KeyEvent event, boolean plain) {
    find(event, plain)
        .ifPresent(
            command -> {
              event.consume();
              command.run();
            });
  }

  private Optional<Command> find(KeyEvent event, boolean plain) {
    for (Command command : all()) {
      for (KeyCombination keys : command.keys()) {
        if (Command.isPlain(keys) == plain && keys.match(event)) {
          return Optional.of(command);
        }
      }
    }
    return Optional.empty();
  }
}

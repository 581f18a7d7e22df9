package clampwright.app;

import java.util.List;
import java.util.function.BooleanSupplier;
import java.util.function.Supplier;
import javafx.scene.input.KeyCombination;

/**
 * Something the window can do, from a menu or by key.
 *
 * @param id names it in tests and styles
 * @param text as the menu shows it at the time
 * @param keys that call it, the first shown in the menu
 * @param enabled whether it can be done at the time
 * @param action what it does
 */
record Command(
    String id,
    Supplier<String> text,
    List<KeyCombination> keys,
    BooleanSupplier enabled,
    Runnable action) {

  static Command of(String id, String text, Runnable action, String... keys) {
    return when(id, () -> text, () -> true, action, keys);
  }

  static Command when(
      String id, Supplier<String> text, BooleanSupplier enabled, Runnable action, String... keys) {
    List<KeyCombination> combinations =
        List.of(keys).stream().map(KeyCombination::valueOf).toList();
    return new Command(id, text, combinations, enabled, action);
  }

  /** Whether a key calls it that would type or move in a text field. */
  static boolean isPlain(KeyCombination keys) {
    String name = keys.getName();
    return !name.contains("Shortcut") && !name.contains("Ctrl") && !name.matches("F\\d+");
  }

  void run() {
    if (enabled.getAsBoolean()) {
      action.run();
    }
  }
}

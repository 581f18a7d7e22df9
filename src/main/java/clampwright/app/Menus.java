package clampwright.app;

import clampwright.store.Samples;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuBar;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;

/** The menus, made of the commands; texts and what is enabled are looked up when one opens. */
final class Menus {
  /** Commands of these ids stand for lists of samples and of recent files. */
  static final String SAMPLES = "samples";

  static final String RECENT = "recent";

  private static final String LINE = "line";

  private final Commands commands;
  private final Documents documents;
  private final Settings settings;

  Menus(Commands commands, Documents documents, Settings settings) {
    this.commands = commands;
    this.documents = documents;
    this.settings = settings;
  }

  /** A line between groups. */
  static Command line() {
    return Command.of(LINE, "", () -> {});
  }

  MenuBar bar() {
    MenuBar bar = new MenuBar();
    commands.menus().forEach((title, entries) -> bar.getMenus().add(menu(title, entries)));
    return bar;
  }

  private Menu menu(String title, List<Command> entries) {
    Menu menu = new Menu(title);
    menu.setId("menu-" + title.toLowerCase(Locale.ROOT));
    menu.getItems().setAll(entries.stream().map(this::item).toList());
    menu.setOnShowing(
        event -> {
          if (event.getTarget() == menu) {
            update(menu, entries);
          }
        });
    return menu;
  }

  private MenuItem item(Command command) {
    if (command.id().equals(LINE)) {
      return new SeparatorMenuItem();
    }
    if (isList(command)) {
      Menu submenu = new Menu(command.text().get());
      submenu.setId("do-" + command.id());
      return submenu;
    }
    MenuItem item = new MenuItem(command.text().get());
    item.setId("do-" + command.id());
    item.setMnemonicParsing(false);
    if (!command.keys().isEmpty()) {
      item.setAccelerator(command.keys().get(0));
    }
    item.setOnAction(event -> command.run());
    return item;
  }

  private static boolean isList(Command command) {
    return command.id().equals(SAMPLES) || command.id().equals(RECENT);
  }

  private void update(Menu menu, List<Command> entries) {
    for (int i = 0; i < entries.size(); i++) {
      MenuItem item = menu.getItems().get(i);
      Command command = entries.get(i);
      if (item instanceof Menu submenu) {
        submenu.getItems().setAll(command.id().equals(SAMPLES) ? samples() : recent());
        submenu.setDisable(submenu.getItems().isEmpty());
      } else if (!command.id().equals(LINE)) {
        item.setText(command.text().get());
        item.setDisable(!command.enabled().getAsBoolean());
      }
    }
  }

  private List<MenuItem> samples() {
    return Samples.all().stream()
        .map(sample -> listed(sample.title(), () -> documents.open(sample)))
        .toList();
  }

  private List<MenuItem> recent() {
    return settings.recent().stream().map(this::recent).toList();
  }

  private MenuItem recent(Path path) {
    return listed(path.getFileName() + "  ·  " + path.getParent(), () -> documents.open(path));
  }

  private static MenuItem listed(String text, Runnable action) {
    MenuItem item = new MenuItem(text);
    item.setMnemonicParsing(false);
    item.setOnAction(event -> action.run());
    return item;
  }
}

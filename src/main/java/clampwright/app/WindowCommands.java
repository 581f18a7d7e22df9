package clampwright.app;

import static clampwright.app.Menus.line;

import clampwright.edit.End;
import clampwright.edit.SketchModel;

/** Puts together what the window can do, menu by menu, with texts and keys. */
final class WindowCommands {
  private static final double ZOOM = 1.25;

  private final MainWindow window;
  private final SketchModel model;
  private final Documents documents;
  private final StackSteps stack;
  private final Commands commands = new Commands();

  WindowCommands(MainWindow window, SketchModel model, Documents documents) {
    this.window = window;
    this.model = model;
    this.documents = documents;
    stack = new StackSteps(model);
  }

  Commands commands() {
    addFile();
    addEdit();
    addSketch();
    addView();
    addHelp();
    return commands;
  }

  private void addFile() {
    commands.add(
        "File",
        Command.of("new", "New sketch", documents::startNew, "Shortcut+N"),
        Command.of("open", "Open…", documents::open, "Shortcut+O"),
        Command.of(Menus.SAMPLES, "Open sample", () -> {}),
        Command.of(Menus.RECENT, "Open recent", () -> {}),
        line(),
        Command.of("save", "Save", documents::save, "Shortcut+S"),
        Command.of("save-as", "Save as…", documents::saveAs, "Shortcut+Shift+S"),
        line(),
        Command.of("export-figure", "Export figure…", window::exportFigure, "Shortcut+P"),
        Command.of(
            "export-schedule", "Export schedule…", window::exportSchedule, "Shortcut+Shift+P"),
        Command.of("copy-figure", "Copy figure", window::copyFigure, "Shortcut+Shift+C"),
        line(),
        Command.of("exit", "Close", window::close, "Shortcut+Q", "Shortcut+W"));
  }

  private void addEdit() {
    commands.add(
        "Edit",
        Command.when(
            "undo",
            () -> named("Undo", model.undoNameProperty().get()),
            () -> true,
            window::undo,
            "Shortcut+Z"),
        Command.when(
            "redo",
            () -> named("Redo", model.redoNameProperty().get()),
            () -> !model.redoNameProperty().get().isEmpty(),
            window::redo,
            "Shortcut+Y",
            "Shortcut+Shift+Z"),
        line(),
        element("delete", "Delete part", stack::delete, "Delete"),
        element("duplicate", "Duplicate part", stack::duplicate, "Shortcut+D"),
        Command.when(
            "move-up",
            () -> "Move part up",
            () -> stack.canMove(-1),
            () -> stack.move(-1),
            "Alt+Up"),
        Command.when(
            "move-down",
            () -> "Move part down",
            () -> stack.canMove(1),
            () -> stack.move(1),
            "Alt+Down"));
  }

  private void addNote() {
    stack.addNote();
    window.section().openCardOfSelection();
  }

  private Command element(String id, String text, Runnable action, String keys) {
    return Command.when(id, () -> text, stack::isElementSelected, action, keys);
  }

  private void addSketch() {
    commands.add(
        "Sketch",
        Command.of("add-note", "Add note", this::addNote, "Shortcut+M"),
        Command.of("insert-layer", "Insert layer", stack::insertLayer, "Shortcut+L", "Insert"),
        line(),
        Command.of(
            "add-head-washer",
            "Add washer at the head",
            () -> stack.addWasher(End.HEAD),
            "Shortcut+H"),
        Command.when(
            "add-nut-washer",
            () -> "Add washer at the nut",
            () -> stack.canAddWasher(End.NUT),
            () -> stack.addWasher(End.NUT),
            "Shortcut+J"),
        Command.when(
            "remove-head-washer",
            () -> "Remove washer at the head",
            () -> stack.hasWasher(End.HEAD),
            () -> stack.removeWasher(End.HEAD),
            "Shortcut+Shift+H"),
        Command.when(
            "remove-nut-washer",
            () -> "Remove washer at the nut",
            () -> stack.hasWasher(End.NUT),
            () -> stack.removeWasher(End.NUT),
            "Shortcut+Shift+J"));
  }

  private void addView() {
    commands.add(
        "View",
        Command.of(
            "zoom-in",
            "Zoom in",
            () -> window.section().zoom(ZOOM),
            "Shortcut+PLUS",
            "Shortcut+EQUALS",
            "Shortcut+ADD"),
        Command.of(
            "zoom-out",
            "Zoom out",
            () -> window.section().zoom(1 / ZOOM),
            "Shortcut+MINUS",
            "Shortcut+SUBTRACT"),
        Command.of("fit", "Fit", () -> window.section().fit(), "Shortcut+0", "F"),
        line(),
        Command.when(
            "units",
            () ->
                model.sketch().units() == clampwright.quantity.UnitSystem.METRIC
                    ? "Show in and lbf"
                    : "Show mm and N",
            () -> true,
            () -> {
              window.commit();
              Units.toggle(model);
            },
            "Shortcut+U"),
        Command.when(
            "look",
            () -> window.isDark() ? "Light" : "Dark",
            () -> true,
            window::switchLook,
            "Shortcut+T"),
        line(),
        Command.of("schedule", "Schedule", () -> window.drawer().show("Schedule"), "Shortcut+1"),
        Command.of("working", "Working", () -> window.drawer().show("Working"), "Shortcut+2"),
        Command.of(
            "what-matters",
            "What matters",
            () -> window.drawer().show("What matters"),
            "Shortcut+3"),
        Command.of(
            "joint-diagram",
            "Joint diagram",
            () -> window.drawer().show("Joint diagram"),
            "Shortcut+4"),
        Command.when(
            "drawer",
            () -> window.drawer().openProperty().get() ? "Close the drawer" : "Open the drawer",
            () -> true,
            () -> window.drawer().openProperty().set(!window.drawer().openProperty().get()),
            "Shortcut+E"));
  }

  private void addHelp() {
    commands.add(
        "Help",
        Command.of(
            "method",
            "Method and limits",
            () -> HelpWindow.show(window.stage(), "Method and limits", HelpPages.method()),
            "F1"),
        Command.of(
            "keys",
            "Keyboard",
            () -> HelpWindow.show(window.stage(), "Keyboard", HelpPages.keys(commands)),
            "Shortcut+K"),
        line(),
        Command.of(
            "about",
            "About and cautions",
            () -> HelpWindow.show(window.stage(), "About and cautions", HelpPages.about())));
  }

  private static String named(String verb, String step) {
    return step.isEmpty() ? verb : verb + ": " + step;
  }
}

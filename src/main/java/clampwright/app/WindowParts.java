package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.figure.working.Headline;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.spread.Sensitivity;
import clampwright.view.diagram.JointDiagramPane;
import clampwright.view.found.FoundPane;
import clampwright.view.given.GivenPane;
import clampwright.view.schedule.SchedulePane;
import clampwright.view.spread.SpreadPane;
import clampwright.view.working.WorkingPane;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;

/**
 * The parts of the window that are made of controls. They stand in a class of their own so that the
 * first frame, which shows the drawing, does not have to load them.
 */
final class WindowParts {
  private final MainWindow window;
  private final SketchModel model;
  private final Settings settings;
  private ToolRow tools;
  private Drawer drawer;
  private WorkingPane working;

  WindowParts(MainWindow window, SketchModel model, Settings settings) {
    this.window = window;
    this.model = model;
    this.settings = settings;
  }

  Node tools() {
    Commands commands = new WindowCommands(window, model, window.documents()).commands();
    commands.listen(window.stage().getScene());
    Menus menus = new Menus(commands, window.documents(), settings);
    tools = new ToolRow(model, menus.bar(), window::switchLook);
    tools.showLook(settings.values().dark);
    return tools;
  }

  Node given() {
    return new GivenPane(model);
  }

  Node found() {
    return new FoundPane(model, this::openWorking, this::openCheck);
  }

  private void openWorking(Headline headline) {
    drawer.show("Working");
    working.show(headline);
  }

  private void openCheck(CheckKind check) {
    drawer.show("Working");
    working.show(check);
  }

  private void openBar(Sensitivity.Bar bar) {
    drawer.show("Working");
    working.show(bar);
  }

  /** The drawer with its tabs. */
  Node drawerNode() {
    working = new WorkingPane(model);
    drawer = new Drawer(settings.values().drawerHeight);
    drawer.add("Schedule", () -> new SchedulePane(model));
    drawer.add("Working", () -> working);
    drawer.add("What matters", () -> new SpreadPane(model, this::openBar));
    drawer.add("Joint diagram", () -> new JointDiagramPane(model));
    drawer.show("Schedule");
    drawer.openProperty().set(settings.values().drawerOpen);
    return drawer;
  }

  Node status(ObservableValue<String> hint) {
    return new StatusLine(hint);
  }

  Drawer drawer() {
    return drawer;
  }

  void showLook(boolean dark) {
    tools.showLook(dark);
  }
}

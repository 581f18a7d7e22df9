package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.figure.working.Headline;
import clampwright.paint.Palette;
import clampwright.paint.canvas.FigureCanvas;
import clampwright.view.found.FoundPane;
import clampwright.view.given.GivenPane;
import clampwright.view.schedule.SchedulePane;
import clampwright.view.section.SectionPane;
import clampwright.view.working.WorkingPane;
import java.util.function.Supplier;
import javafx.beans.property.StringProperty;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

/**
 * What stands where in the window: menus above, Given, Section and Found in a row, a drawer below,
 * a status line. The drawing comes first; everything that needs controls follows, a part per frame,
 * when the window stands.
 */
final class WindowLayout {
  private final SketchModel model;
  private final Settings settings;
  private final Later later = new Later();
  private final SectionPane section;
  private final BorderPane root = new BorderPane();
  private Drawer drawer;
  private WorkingPane working;
  private ToolRow tools;

  WindowLayout(
      SketchModel model, Settings settings, Supplier<ToolRow> toolRow, StringProperty hint) {
    this.model = model;
    this.settings = settings;
    later.add(
        () -> {
          Looks.showTheme(settings.values().dark);
          Looks.showStyles(root.getScene(), settings.values().dark);
        });
    StackPane top =
        later.place(
            "tool-place",
            () -> {
              tools = toolRow.get();
              tools.showLook(settings.values().dark);
              return tools;
            });
    showPalette();
    section = new SectionPane(model);
    StackPane sheet = new StackPane(section);
    sheet.getStyleClass().add("sheet-edge");
    StackPane desk = new StackPane(sheet);
    desk.getStyleClass().add("section-place");
    BorderPane panes = new BorderPane(desk);
    panes.setRight(later.place("found-place", () -> new FoundPane(model, this::openWorking)));
    panes.setLeft(later.place("given-place", () -> new GivenPane(model)));
    root.setCenter(panes);
    root.setTop(top);
    root.setBottom(
        new VBox(drawerPlace(), later.place("status-place", () -> new StatusLine(hint))));
  }

  private StackPane drawerPlace() {
    Settings.Values values = settings.values();
    StackPane place =
        later.place(
            "drawer-place",
            () -> {
              working = new WorkingPane(model);
              drawer = new Drawer(values.drawerHeight);
              drawer.add("Schedule", () -> new SchedulePane(model));
              drawer.add("Working", () -> working);
              drawer.show("Schedule");
              drawer.openProperty().set(values.drawerOpen);
              return drawer;
            });
    place.setMinHeight(Region.USE_PREF_SIZE);
    place.setPrefHeight(values.drawerOpen ? values.drawerHeight : 0);
    later.add(() -> place.setPrefHeight(Region.USE_COMPUTED_SIZE));
    return place;
  }

  private void showPalette() {
    FigureCanvas.paletteProperty().set(settings.values().dark ? Palette.DARK : Palette.LIGHT);
  }

  SectionPane section() {
    return section;
  }

  private void openWorking(Headline headline) {
    drawer().show("Working");
    working.show(headline);
  }

  Parent root() {
    return root;
  }

  /** Fills the places, beginning after the scene's first frame. */
  void start(Scene scene) {
    later.start(scene);
  }

  /** Whether all parts are there. */
  boolean isComplete() {
    return later.isDone();
  }

  /** The drawer; made at once when it is wanted before its turn. */
  Drawer drawer() {
    later.finish();
    return drawer;
  }

  void showLook(boolean dark) {
    later.finish();
    tools.showLook(dark);
    showPalette();
  }
}

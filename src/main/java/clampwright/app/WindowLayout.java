package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.paint.Palette;
import clampwright.paint.canvas.FigureCanvas;
import clampwright.view.section.SectionPane;
import java.util.function.Function;
import java.util.function.Supplier;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.layout.Background;
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
  /** Room kept for the parts until they come [px]; the style sheet gives them the same. */
  private static final double TOOL_ROW = 46;

  private static final double GIVEN = 258;
  private static final double FOUND = 306;
  private static final double STATUS = 26;

  private final Settings settings;
  private final Later later = new Later();
  private final SectionPane section;
  private final BorderPane root = new BorderPane();
  private WindowParts parts;

  /**
   * The layout.
   *
   * @param making makes the parts, after the first frame
   */
  WindowLayout(
      SketchModel model,
      Settings settings,
      Supplier<WindowParts> making,
      ObservableValue<String> hint) {
    this.settings = settings;
    later.add(() -> showTheme(settings.values().dark));
    later.add(() -> parts = making.get());
    root.setBackground(Background.fill(Looks.window(settings.values().dark)));
    showPalette();
    section = new SectionPane(model);
    StackPane sheet = new StackPane(section);
    sheet.getStyleClass().add("sheet-edge");
    StackPane desk = new StackPane(sheet);
    desk.getStyleClass().add("section-place");
    desk.setPadding(new Insets(10));
    BorderPane panes = new BorderPane(desk);
    StackPane top = place("tool-place", WindowParts::tools);
    StackPane right = place("found-place", WindowParts::found);
    StackPane left = place("given-place", WindowParts::given);
    StackPane drawer = drawerPlace();
    StackPane status = place("status-place", parts -> parts.status(hint));
    top.setMinHeight(TOOL_ROW);
    right.setMinWidth(FOUND);
    left.setMinWidth(GIVEN);
    status.setMinHeight(STATUS);
    panes.setRight(right);
    panes.setLeft(left);
    root.setTop(top);
    root.setCenter(panes);
    root.setBottom(new VBox(drawer, status));
  }

  private StackPane place(String style, Function<WindowParts, Node> content) {
    StackPane place = later.place(style, () -> content.apply(parts));
    place.setBackground(Background.fill(Looks.pane(settings.values().dark)));
    return place;
  }

  private StackPane drawerPlace() {
    Settings.Values values = settings.values();
    StackPane place = place("drawer-place", WindowParts::drawerNode);
    place.setMinHeight(Region.USE_PREF_SIZE);
    place.setPrefHeight(values.drawerOpen ? values.drawerHeight : 0);
    later.add(() -> place.setPrefHeight(Region.USE_COMPUTED_SIZE));
    return place;
  }

  private void showTheme(boolean dark) {
    Looks.showTheme(dark);
    Looks.showStyles(root.getScene(), dark);
  }

  private void showPalette() {
    FigureCanvas.paletteProperty().set(settings.values().dark ? Palette.DARK : Palette.LIGHT);
  }

  SectionPane section() {
    return section;
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
    return parts.drawer();
  }

  /** Shows the window in the look that the settings name. */
  void showLook() {
    later.finish();
    parts.showLook(settings.values().dark);
    showPalette();
    showTheme(settings.values().dark);
  }
}

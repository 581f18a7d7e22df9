package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.joint.Sketch;
import clampwright.quantity.UnitSystem;
import clampwright.view.Hover;
import clampwright.view.field.NameField;
import java.util.Optional;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.MenuBar;
import javafx.scene.control.ToggleButton;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.shape.Circle;
import javafx.scene.text.Text;

/** The row above the panes: mark, menus, the sketch's name, units, light or dark. */
final class ToolRow extends StackPane {
  private static final double GAP = 12;

  private final Button look = new Button();
  private final HBox left;
  private final HBox middle;
  private final HBox right;

  ToolRow(SketchModel model, MenuBar menus, Runnable switchLook) {
    getStyleClass().add("tool-row");
    Label program = new Label("Clampwright");
    program.getStyleClass().add("program");
    left = new HBox(10, new LogoMark(), program, menus);
    HBox.setMargin(menus, new javafx.geometry.Insets(0, 0, 0, 12));
    right = new HBox(8, unitSwitch(model), look);
    middle = new HBox(2, name(model), unsavedDot(model));
    for (HBox group : new HBox[] {left, middle, right}) {
      group.setPickOnBounds(false);
      group.setMaxWidth(Region.USE_PREF_SIZE);
    }
    left.setAlignment(Pos.CENTER_LEFT);
    middle.setAlignment(Pos.CENTER);
    right.setAlignment(Pos.CENTER_RIGHT);
    StackPane.setAlignment(left, Pos.CENTER_LEFT);
    StackPane.setAlignment(right, Pos.CENTER_RIGHT);
    look.getStyleClass().setAll("tool-button");
    look.setId("look");
    look.setOnAction(event -> switchLook.run());
    getChildren().addAll(middle, left, right);
  }

  /** The name stands in the middle of the window, or of what the menus leave free. */
  @Override
  protected void layoutChildren() {
    super.layoutChildren();
    double from = left.getLayoutX() + left.getWidth() + GAP;
    double to = right.getLayoutX() - GAP;
    double width = Math.max(0, Math.min(middle.prefWidth(-1), to - from));
    double centred = (getWidth() - width) / 2;
    middle.resize(width, middle.getHeight());
    middle.setLayoutX(snapPositionX(Math.max(from, Math.min(to - width, centred))));
  }

  /** Names the look that the button switches to. */
  void showLook(boolean dark) {
    look.setText(dark ? "Light" : "Dark");
    look.setAccessibleText(dark ? "Switch to light" : "Switch to dark");
  }

  private static HBox unitSwitch(SketchModel model) {
    ToggleButton metric = unit(model, "mm · N", UnitSystem.METRIC);
    ToggleButton inch = unit(model, "in · lbf", UnitSystem.INCH);
    metric.setId("metric");
    inch.setId("inch");
    HBox units = new HBox(2, metric, inch);
    units.setAlignment(Pos.CENTER);
    return units;
  }

  private static ToggleButton unit(SketchModel model, String text, UnitSystem units) {
    ToggleButton button = new ToggleButton(text);
    button.getStyleClass().setAll("tool-button");
    button.setMinWidth(68);
    button.setFocusTraversable(true);
    button.setOnAction(
        event -> {
          Units.show(model, units);
          button.setSelected(true);
        });
    model.sketchProperty().subscribe(sketch -> button.setSelected(sketch.units() == units));
    return button;
  }

  private static NameField name(SketchModel model) {
    NameField name =
        new NameField(model, "Sketch name", sketch -> Optional.of(sketch.name()), Sketch::withName);
    name.getStyleClass().add("sketch-name");
    name.setId("sketch-name");
    Hover.tell(name, () -> "The sketch's name; press to change it");
    Text measure = new Text();
    measure.textProperty().bind(name.textProperty());
    measure.fontProperty().bind(name.fontProperty());
    Runnable fit =
        () -> {
          double width = measure.getLayoutBounds().getWidth() + 24;
          name.setPrefWidth(Math.max(90, Math.min(330, width)));
        };
    name.setMinWidth(90);
    measure.layoutBoundsProperty().addListener(observable -> fit.run());
    fit.run();
    return name;
  }

  private static Circle unsavedDot(SketchModel model) {
    Circle dot = new Circle(3);
    dot.getStyleClass().add("unsaved-dot");
    dot.setId("unsaved");
    dot.visibleProperty().bind(model.unsavedProperty());
    Hover.tell(dot, () -> "Not saved yet");
    return dot;
  }
}

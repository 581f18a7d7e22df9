package clampwright.app;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.Supplier;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

/**
 * The drawer below the three panes: tabs whose content is made when first shown, an upper edge that
 * can be dragged, a button that closes it.
 */
final class Drawer extends VBox {
  private static final double LEAST = 110;
  private static final double MOST_SHARE = 0.6;

  private final BooleanProperty open = new SimpleBooleanProperty(true);
  private final HBox tabs = new HBox();
  private final StackPane content = new StackPane();
  private final ToggleGroup group = new ToggleGroup();
  private final Map<String, ToggleButton> buttons = new LinkedHashMap<>();
  private double pressedAt;
  private double heightThen;

  Drawer(double height) {
    getStyleClass().add("drawer");
    tabs.getStyleClass().add("drawer-tabs");
    tabs.setAlignment(Pos.BOTTOM_LEFT);
    content.getStyleClass().add("drawer-content");
    content.setMinHeight(0);
    VBox.setVgrow(content, Priority.ALWAYS);
    Region gap = new Region();
    HBox.setHgrow(gap, Priority.ALWAYS);
    tabs.getChildren().addAll(gap, close());
    StackPane head = new StackPane(tabs, edge());
    head.setAlignment(Pos.TOP_CENTER);
    getChildren().addAll(head, content);
    setPrefHeight(height);
    setMinHeight(USE_PREF_SIZE);
    visibleProperty().bind(open);
    managedProperty().bind(open);
  }

  BooleanProperty openProperty() {
    return open;
  }

  private Button close() {
    Region cross = new Region();
    cross.getStyleClass().add("cross");
    Button close = new Button();
    close.setId("close-drawer");
    close.getStyleClass().setAll("drawer-close");
    close.setGraphic(cross);
    close.setAccessibleText("Close the drawer");
    close.setOnAction(event -> open.set(false));
    HBox.setMargin(close, new javafx.geometry.Insets(0, 0, 4, 0));
    return close;
  }

  private Region edge() {
    Region edge = new Region();
    edge.getStyleClass().add("drawer-edge");
    edge.setOnMousePressed(
        event -> {
          pressedAt = event.getScreenY();
          heightThen = getHeight();
        });
    edge.setOnMouseDragged(
        event -> {
          double most = getScene().getHeight() * MOST_SHARE;
          double wanted = heightThen + pressedAt - event.getScreenY();
          setPrefHeight(Math.max(LEAST, Math.min(most, wanted)));
        });
    return edge;
  }

  /** Adds a tab; the first is shown. */
  void add(String title, Supplier<Node> content) {
    ToggleButton button = new ToggleButton(title);
    button.getStyleClass().setAll("drawer-tab");
    button.setId("tab-" + title.toLowerCase(java.util.Locale.ROOT).replace(' ', '-'));
    button.setAccessibleRole(AccessibleRole.TAB_ITEM);
    button.setToggleGroup(group);
    Node[] made = {null};
    button
        .selectedProperty()
        .addListener(
            (observable, was, is) -> {
              if (is) {
                if (made[0] == null) {
                  made[0] = content.get();
                }
                this.content.getChildren().setAll(made[0]);
              }
            });
    button.setOnAction(event -> button.setSelected(true));
    tabs.getChildren().add(buttons.size(), button);
    buttons.put(title, button);
  }

  /** Shows a tab and opens the drawer. */
  void show(String title) {
    buttons.get(title).setSelected(true);
    open.set(true);
  }
}

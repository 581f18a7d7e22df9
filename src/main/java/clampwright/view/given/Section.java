package clampwright.view.given;

import clampwright.view.field.FieldRow;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** A heading with its rows of fields; rarely used rows fold away. */
class Section extends VBox {
  private final Rows rows = new Rows();
  private final Label heading;

  Section(String title) {
    getStyleClass().add("section");
    heading = new Label(title);
    heading.getStyleClass().add("section-heading");
    heading.setMaxWidth(Double.MAX_VALUE);
    getChildren().addAll(heading, rows);
  }

  final void setTitle(String title) {
    heading.setText(title);
  }

  final FieldRow add(String name, Region field) {
    return rows.add(name, field);
  }

  final void add(Node node) {
    rows.add(node);
  }

  /** Puts these rows behind a small button that shows and hides them, and returns it. */
  final Button fold(String what, Node... folded) {
    Button toggle = new Button();
    toggle.getStyleClass().setAll("fold");
    Region chevron = new Region();
    chevron.getStyleClass().add("chevron");
    toggle.setText(what);
    toggle.setGraphic(chevron);
    toggle.setId("fold-" + what.replaceAll("\\W+", "-"));
    boolean[] open = {false};
    Runnable show =
        () -> {
          chevron.setRotate(open[0] ? 90 : 0);
          toggle.setAccessibleText((open[0] ? "Hide " : "Show ") + what);
          for (Node node : folded) {
            setShown(node, open[0]);
          }
        };
    toggle.setOnAction(
        event -> {
          open[0] = !open[0];
          show.run();
        });
    rows.getChildren().removeAll(folded);
    rows.getChildren().add(toggle);
    rows.getChildren().addAll(folded);
    show.run();
    return toggle;
  }

  /** Shows a row, or takes it out without leaving a gap. */
  static void setShown(Node node, boolean shown) {
    node.setVisible(shown);
    node.setManaged(shown);
  }
}

package clampwright.view.schedule;

import java.util.EnumMap;
import java.util.Map;
import javafx.geometry.HPos;
import javafx.geometry.VPos;
import javafx.scene.Node;
import javafx.scene.layout.Region;

/** A line of the schedule: one node per column, laid out by the same edges on every line. */
class Line extends Region {
  private final double height;
  private final Map<Column, Node> cells = new EnumMap<>(Column.class);

  Line(double height) {
    this.height = height;
    setMinHeight(height);
    setPrefHeight(height);
    setMaxHeight(height);
    setMinWidth(0);
  }

  /** Puts a node in a column, in place of what was there. */
  final void set(Column column, Node node) {
    Node old = cells.put(column, node);
    if (old != node) {
      getChildren().remove(old);
      getChildren().add(node);
    }
  }

  final Node get(Column column) {
    return cells.get(column);
  }

  /** The column at an x of this line. */
  final Column columnAt(double x) {
    double[] edges = Column.edges(getWidth());
    Column found = Column.NUMBER;
    for (Column column : Column.values()) {
      if (x >= edges[column.ordinal()] - Column.GAP / 2) {
        found = column;
      }
    }
    return found;
  }

  @Override
  protected void layoutChildren() {
    double[] edges = Column.edges(getWidth());
    cells.forEach(
        (column, node) -> {
          double x = edges[column.ordinal()];
          double room = edges[column.ordinal() + 1] - Column.GAP - x;
          boolean field = node.getStyleClass().contains("cell-field");
          double over = field ? 6 : spill(column, node, room);
          layoutInArea(
              node,
              x - over,
              0,
              room + (field ? 2 * over : over),
              height,
              0,
              null,
              field,
              false,
              field ? HPos.CENTER : column.align(),
              VPos.CENTER);
        });
  }

  /** How far a title wider than its right-aligned column reaches into the gap before it [px]. */
  private static double spill(Column column, Node node, double room) {
    return column.align() == HPos.RIGHT
        ? Math.max(0, Math.min(Column.GAP, node.prefWidth(-1) - room))
        : 0;
  }

  @Override
  protected double computePrefWidth(double height) {
    return Column.leastWidth();
  }
}

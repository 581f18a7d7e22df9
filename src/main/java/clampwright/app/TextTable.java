package clampwright.app;

import java.util.ArrayList;
import java.util.List;

/** Lines of cells under one another, each column as wide as its widest cell. */
final class TextTable {
  private static final String GAP = "  ";

  private final List<List<String>> rows = new ArrayList<>();
  private final String alignment;

  /**
   * An empty table.
   *
   * @param alignment one letter per column: l left, r right
   */
  TextTable(String alignment) {
    this.alignment = alignment;
  }

  void row(String... cells) {
    if (cells.length != alignment.length()) {
      throw new IllegalArgumentException(cells.length + " cells for columns " + alignment);
    }
    rows.add(List.of(cells));
  }

  /** The lines, each with its line end, without blanks at their ends. */
  String text() {
    StringBuilder text = new StringBuilder();
    for (List<String> row : rows) {
      StringBuilder line = new StringBuilder();
      for (int i = 0; i < row.size(); i++) {
        String padding = " ".repeat(width(i) - length(row.get(i)));
        boolean right = alignment.charAt(i) == 'r';
        line.append(i == 0 ? "" : GAP);
        line.append(right ? padding + row.get(i) : row.get(i) + padding);
      }
      text.append(line.toString().stripTrailing()).append('\n');
    }
    return text.toString();
  }

  private int width(int column) {
    return rows.stream().mapToInt(row -> length(row.get(column))).max().orElse(0);
  }

  private static int length(String cell) {
    return cell.codePointCount(0, cell.length());
  }
}

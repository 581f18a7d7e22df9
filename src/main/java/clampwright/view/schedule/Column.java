package clampwright.view.schedule;

import javafx.geometry.HPos;

/** The columns of the schedule, left to right. */
enum Column {
  NUMBER("", 16, 0, HPos.LEFT),
  PART("Part", 86, 3, HPos.LEFT),
  MATERIAL("Material", 122, 3, HPos.LEFT),
  THICKNESS("Thickness", 58, 1, HPos.RIGHT),
  HOLE("Hole", 44, 1, HPos.RIGHT),
  OUTLINE("Outline", 92, 3, HPos.LEFT),
  FROM_HEAD("From head", 58, 1.5, HPos.RIGHT),
  FROM_NUT("From nut", 56, 1.5, HPos.RIGHT),
  GOVERNS("Governs", 84, 1.5, HPos.LEFT),
  EFFECTIVE("Ø effective", 62, 1, HPos.RIGHT),
  AREA("Area", 56, 1.5, HPos.RIGHT),
  STIFFNESS("Stiffness", 62, 1.5, HPos.RIGHT),
  SHARE("Share of give", 100, 5, HPos.LEFT);

  /** Between two columns [px]. */
  static final double GAP = 14;

  /** Left and right of the table [px]. */
  static final double MARGIN = 20;

  private final String title;
  private final double least;
  private final double growth;
  private final HPos align;

  Column(String title, double least, double growth, HPos align) {
    this.title = title;
    this.least = least;
    this.growth = growth;
    this.align = align;
  }

  String title() {
    return title;
  }

  HPos align() {
    return align;
  }

  boolean isEditable() {
    return this == PART || this == MATERIAL || this == THICKNESS || this == HOLE;
  }

  /** Least width of the whole table [px]. */
  static double leastWidth() {
    double sum = 2 * MARGIN - GAP;
    for (Column column : values()) {
      sum += column.least + GAP;
    }
    return sum;
  }

  /** Left edges and, at the end, the right margin's, for a table of this width [px]. */
  static double[] edges(double width) {
    double growth = 0;
    for (Column column : values()) {
      growth += column.growth;
    }
    double spare = Math.max(0, width - leastWidth());
    double squeeze = Math.min(1, width / leastWidth());
    double[] edges = new double[values().length + 1];
    double x = MARGIN;
    for (Column column : values()) {
      edges[column.ordinal()] = Math.round(x);
      x += (column.least + GAP) * squeeze + spare * column.growth / growth;
    }
    edges[values().length] = Math.round(x);
    return edges;
  }
}

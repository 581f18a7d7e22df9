package clampwright.figure;

import java.util.Set;

/** Sizes of a picture by use. */
public enum Preset {
  /** A slide of 16:9. */
  SLIDE("slide", "slide, 16:9", 254, 142.875, 1.25, false),
  /** A text column. */
  COLUMN("column", "text column, 85 mm", 85, 78, 0.66, false),
  /** The width of a page's text. */
  PAGE("page", "page width, 170 mm", 170, 115, 1, false),
  /** A whole sheet with frame and title block. */
  SHEET("sheet", "A4 sheet with title block", 297, 210, 1, true);

  private static final double BELOW = 46;
  private static final double DIAGRAM = 31;

  private final String word;
  private final String title;
  private final double width;
  private final double height;
  private final double scale;
  private final boolean framed;

  Preset(String word, String title, double width, double height, double scale, boolean framed) {
    this.word = word;
    this.title = title;
    this.width = width;
    this.height = height;
    this.scale = scale;
    this.framed = framed;
  }

  /** For the command line. */
  public String word() {
    return word;
  }

  /** For a reader. */
  public String title() {
    return title;
  }

  /** Width of the picture [mm]. */
  public double width() {
    return width;
  }

  /** Height of the picture [mm]; a text column grows with what stands below one another in it. */
  public double height(Set<Show> shown) {
    if (this != COLUMN) {
      return height;
    }
    boolean below = shown.contains(Show.READOUTS) || shown.contains(Show.LADDER);
    return height + (below ? BELOW : 0) + (shown.contains(Show.DIAGRAM) ? DIAGRAM : 0);
  }

  /** Whether readouts and ladder stand below the section, for want of room beside it. */
  boolean isNarrow() {
    return this == COLUMN;
  }

  /** How much larger type is than on the screen. */
  public double scale() {
    return scale;
  }

  boolean isFramed() {
    return framed;
  }
}

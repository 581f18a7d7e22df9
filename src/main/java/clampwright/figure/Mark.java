package clampwright.figure;

import java.util.List;

/** One mark of a figure, in sheet millimetres. */
public sealed interface Mark {

  Tag tag();

  default Role role() {
    return tag().role();
  }

  /** A stroked line through points; closed joins the last to the first. */
  record Path(Tag tag, List<Point> points, boolean closed) implements Mark {
    public Path {
      points = List.copyOf(points);
    }
  }

  /** A filled polygon. */
  record Area(Tag tag, List<Point> points) implements Mark {
    public Area {
      points = List.copyOf(points);
    }
  }

  /**
   * Hatching, already cut to its polygon: separate strokes, two points each.
   *
   * @param polygon what is hatched, for hit testing and bounds
   * @param strokes start and end in turn
   */
  record Hatch(Tag tag, List<Point> polygon, List<Point> strokes) implements Mark {
    public Hatch {
      polygon = List.copyOf(polygon);
      strokes = List.copyOf(strokes);
    }
  }

  /**
   * A line of text.
   *
   * @param at the anchor, on the base line
   * @param anchor which end of the text stands at the anchor
   * @param size type size [sheet mm]
   * @param weight regular or bold
   */
  record Text(Tag tag, Point at, String text, Anchor anchor, double size, Weight weight)
      implements Mark {}

  /** A filled or ringed disc. */
  record Disc(Tag tag, Point centre, double radius, boolean filled) implements Mark {}

  /**
   * A rounded box with a symbol, a letter and a number, such as a governing mark.
   *
   * @param x left edge
   * @param y upper edge
   * @param symbol drawn at its left
   * @param letter bold, behind the symbol; may be empty
   * @param text at its right end; may be empty
   */
  record Pill(
      Tag tag,
      double x,
      double y,
      double width,
      double height,
      Symbol symbol,
      String letter,
      String text,
      double size)
      implements Mark {}

  /**
   * A dimension line with arrowheads at both ends, parallel to an axis of the sheet.
   *
   * @param from one end
   * @param to other end
   */
  record Arrow(Tag tag, Point from, Point to, boolean headAtFrom, boolean headAtTo)
      implements Mark {}

  /** Ends of a text. */
  enum Anchor {
    START,
    MIDDLE,
    END
  }

  /** Weights of type. */
  enum Weight {
    REGULAR,
    BOLD
  }

  /** Symbols that survive grey printing. */
  enum Symbol {
    NONE,
    /** Points away from the head: the head governs. */
    TRIANGLE_DOWN,
    /** Points away from the nut: the nut governs. */
    TRIANGLE_UP,
    DIAMOND
  }
}

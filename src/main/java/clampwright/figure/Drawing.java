package clampwright.figure;

import java.util.ArrayList;
import java.util.List;

/** Gathers the marks of a section; places in mm of the joint become places on the sheet. */
final class Drawing {
  private final Sheet sheet;
  private final List<Mark> marks = new ArrayList<>();

  /** Where words lie already. */
  private final List<WordBox> words = new ArrayList<>();

  Drawing(Sheet sheet) {
    this.sheet = sheet;
  }

  Sheet sheet() {
    return sheet;
  }

  List<Mark> marks() {
    return marks;
  }

  /** A point of the joint on the sheet. */
  Point at(double fromAxis, double z) {
    return new Point(sheet.x(fromAxis), sheet.y(z));
  }

  void add(Mark mark) {
    marks.add(mark);
    if (mark instanceof Mark.Pill pill) {
      words.add(WordBox.of(pill));
    } else if (mark instanceof Mark.Text text) {
      words.add(WordBox.of(text));
    }
  }

  /** Keeps a box between two corners free of the words that look for a place of their own. */
  void reserve(Point one, Point other) {
    words.add(
        new WordBox(
            Math.min(one.x(), other.x()),
            Math.min(one.y(), other.y()),
            Math.max(one.x(), other.x()),
            Math.max(one.y(), other.y())));
  }

  /**
   * Draws the first of these texts that lies on the sheet and over no word drawn before; where none
   * does, the first.
   */
  void firstFree(List<Mark.Text> candidates) {
    for (Mark.Text candidate : candidates) {
      WordBox box = WordBox.of(candidate);
      if (box.isOn(sheet) && words.stream().noneMatch(box::overlaps)) {
        add(candidate);
        return;
      }
    }
    add(candidates.get(0));
  }

  void line(Tag tag, Point from, Point to) {
    marks.add(new Mark.Path(tag, List.of(from, to), false));
  }

  void path(Tag tag, List<Point> points) {
    marks.add(new Mark.Path(tag, points, false));
  }

  void outline(Tag tag, List<Point> points) {
    marks.add(new Mark.Path(tag, points, true));
  }

  void area(Tag tag, List<Point> points) {
    marks.add(new Mark.Area(tag, points));
  }

  void text(Tag tag, double x, double y, String text, Mark.Anchor anchor, double size) {
    text(tag, x, y, text, anchor, size, Mark.Weight.REGULAR);
  }

  void text(
      Tag tag,
      double x,
      double y,
      String text,
      Mark.Anchor anchor,
      double size,
      Mark.Weight weight) {
    add(new Mark.Text(tag, new Point(x, y), text, anchor, size, weight));
  }

  void disc(Tag tag, Point centre, double radius, boolean filled) {
    marks.add(new Mark.Disc(tag, centre, radius, filled));
  }

  /** Corners of a rectangle in mm of the joint. */
  List<Point> rectangle(double left, double top, double right, double bottom) {
    return List.of(at(left, top), at(right, top), at(right, bottom), at(left, bottom));
  }
}

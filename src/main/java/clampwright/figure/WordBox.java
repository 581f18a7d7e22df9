package clampwright.figure;

/**
 * The room that words take on a sheet [mm].
 *
 * @param left edge
 * @param top edge
 * @param right edge
 * @param bottom edge
 */
record WordBox(double left, double top, double right, double bottom) {
  /** How far letters reach above and below their base line, as shares of the type size. */
  private static final double ABOVE = 0.75;

  private static final double BELOW = 0.22;

  /** The box of a line of text. */
  static WordBox of(Mark.Text text) {
    double width = TextWidth.of(text.text(), text.size(), text.weight());
    double left =
        switch (text.anchor()) {
          case START -> text.at().x();
          case MIDDLE -> text.at().x() - width / 2;
          case END -> text.at().x() - width;
        };
    double base = text.at().y();
    return new WordBox(left, base - ABOVE * text.size(), left + width, base + BELOW * text.size());
  }

  static WordBox of(Mark.Pill pill) {
    return new WordBox(pill.x(), pill.y(), pill.x() + pill.width(), pill.y() + pill.height());
  }

  boolean overlaps(WordBox other) {
    return left < other.right && other.left < right && top < other.bottom && other.top < bottom;
  }

  boolean isOn(Sheet sheet) {
    return left >= 0 && top >= 0 && right <= sheet.width() && bottom <= sheet.height();
  }
}

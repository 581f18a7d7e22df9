package clampwright.quantity;

/** What a typed text comes to. */
public sealed interface Reading {

  /**
   * A value.
   *
   * @param value in the units inside the program
   */
  record Value(double value) implements Reading {}

  /**
   * Not a value; the text stays where it was typed.
   *
   * @param problem a short sentence for the person who typed it
   */
  record Wrong(String problem) implements Reading {}

  /**
   * Reads a typed number: {@code 6}, {@code 6,5}, {@code 6.5 mm}, {@code 1/4 in}, {@code 1 1/4"},
   * {@code 0.25in}, {@code −2}. Dot or comma as the decimal mark, no grouping; a unit of either
   * system may follow and then wins over the reader's system; the whole text must be understood.
   */
  static Reading of(String text, Dimension dimension, UnitSystem system) {
    return TypedNumber.read(text, dimension, system);
  }
}

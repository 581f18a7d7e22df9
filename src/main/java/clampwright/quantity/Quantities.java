package clampwright.quantity;

/** Formats values for a reader. All methods are locale-independent: a dot is the decimal mark. */
public final class Quantities {
  private Quantities() {}

  /** The unit as shown, such as {@code kN/mm}; empty for a ratio. */
  public static String unit(Dimension dimension, UnitSystem system) {
    throw new UnsupportedOperationException("comes with the quantity commit");
  }

  /** Value in the shown unit. */
  public static double shown(Dimension dimension, UnitSystem system, double value) {
    throw new UnsupportedOperationException("comes with the quantity commit");
  }

  /** Value inside the program from one in the shown unit. */
  public static double inside(Dimension dimension, UnitSystem system, double shown) {
    throw new UnsupportedOperationException("comes with the quantity commit");
  }

  /**
   * A readout without its unit, to the digits a reader can use: lengths to 0.01 mm or 0.0001 in,
   * forces and stiffnesses to 4 significant digits, thousands parted by a thin space, a true minus.
   */
  public static String number(Dimension dimension, UnitSystem system, double value) {
    throw new UnsupportedOperationException("comes with the quantity commit");
  }

  /** A readout with its unit. */
  public static String text(Dimension dimension, UnitSystem system, double value) {
    throw new UnsupportedOperationException("comes with the quantity commit");
  }

  /** What an input field shows: the shortest text that reads back as the same value, no unit. */
  public static String field(Dimension dimension, UnitSystem system, double value) {
    throw new UnsupportedOperationException("comes with the quantity commit");
  }
}

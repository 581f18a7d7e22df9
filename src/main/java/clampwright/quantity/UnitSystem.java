package clampwright.quantity;

/** The units in which a person reads and types. */
public enum UnitSystem {
  /** Millimetre and newton. */
  METRIC,
  /** Inch and pound-force. */
  INCH
}

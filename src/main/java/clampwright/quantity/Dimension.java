package clampwright.quantity;

import java.util.List;

/**
 * What a number measures. Values inside the program are in mm, N, MPa, N/mm, mm², rad only; this is
 * where they become what a reader sees. The first unit of each system is the one shown.
 */
public enum Dimension {
  LENGTH(
      List.of(new Unit("mm", 1), new Unit("cm", 10), new Unit("m", 1000), new Unit("µm", 0.001)),
      List.of(new Unit("in", Unit.INCH), new Unit("\"", Unit.INCH))),
  AREA(List.of(new Unit("mm²", 1)), List.of(new Unit("in²", Unit.INCH * Unit.INCH))),
  FORCE(
      List.of(new Unit("kN", 1000), new Unit("N", 1)),
      List.of(new Unit("lbf", Unit.POUND), new Unit("klbf", 1000 * Unit.POUND))),
  STIFFNESS(
      List.of(new Unit("kN/mm", 1000), new Unit("N/mm", 1)),
      List.of(new Unit("Mlbf/in", 1e6 * Unit.POUND / Unit.INCH))),
  STRESS(
      List.of(new Unit("MPa", 1), new Unit("N/mm²", 1)),
      List.of(new Unit("ksi", 1000 * Unit.PSI), new Unit("psi", Unit.PSI))),
  MODULUS(
      List.of(new Unit("GPa", 1000), new Unit("MPa", 1)),
      List.of(new Unit("Mpsi", 1e6 * Unit.PSI), new Unit("ksi", 1000 * Unit.PSI))),
  ANGLE(
      List.of(new Unit("°", Math.PI / 180), new Unit("deg", Math.PI / 180), new Unit("rad", 1)),
      List.of(new Unit("°", Math.PI / 180))),
  RATIO(List.of(new Unit("", 1), new Unit("%", 0.01)), List.of(new Unit("", 1)));

  /**
   * A unit.
   *
   * @param symbol as shown and typed
   * @param size how much of the inside unit it is
   */
  record Unit(String symbol, double size) {
    static final double INCH = 25.4;
    static final double POUND = 4.4482216152605;
    static final double PSI = POUND / (INCH * INCH);
  }

  private final List<Unit> metric;
  private final List<Unit> inch;

  Dimension(List<Unit> metric, List<Unit> inch) {
    this.metric = metric;
    this.inch = inch;
  }

  List<Unit> units(UnitSystem system) {
    return system == UnitSystem.METRIC ? metric : inch;
  }

  Unit shown(UnitSystem system) {
    return units(system).get(0);
  }
}

package clampwright.quantity;

import java.util.List;

/**
 * What a number measures. Values inside the program are in mm, N, MPa, N/mm, mm², rad only; this is
 * where they become what a reader sees. The first unit of each system is the one shown.
 */
public enum Dimension {
  LENGTH(
      List.of(
          Unit.of("mm", "1"), Unit.of("cm", "10"), Unit.of("m", "1000"), Unit.of("µm", "0.001")),
      List.of(Unit.of("in", Unit.INCH), Unit.of("\"", Unit.INCH))),
  AREA(
      List.of(Unit.of("mm²", "1")), List.of(Unit.of("in²", "1").times(Unit.INCH).times(Unit.INCH))),
  FORCE(
      List.of(Unit.of("kN", "1000"), Unit.of("N", "1")),
      List.of(Unit.of("lbf", Unit.POUND), Unit.of("klbf", "1000").times(Unit.POUND))),
  STIFFNESS(
      List.of(Unit.of("kN/mm", "1000"), Unit.of("N/mm", "1")),
      List.of(Unit.of("Mlbf/in", "1e6").times(Unit.POUND).per(Unit.INCH))),
  STRESS(
      List.of(Unit.of("MPa", "1"), Unit.of("N/mm²", "1")),
      List.of(Unit.psi("ksi", "1000"), Unit.psi("psi", "1"))),
  MODULUS(
      List.of(Unit.of("GPa", "1000"), Unit.of("MPa", "1")),
      List.of(Unit.psi("Mpsi", "1e6"), Unit.psi("ksi", "1000"))),
  ANGLE(
      List.of(Unit.of("°", Unit.DEGREE), Unit.of("deg", Unit.DEGREE), Unit.of("rad", "1")),
      List.of(Unit.of("°", Unit.DEGREE))),
  TORQUE(
      List.of(Unit.of("N·m", "1000"), Unit.of("N·mm", "1")),
      List.of(
          Unit.of("lbf·ft", "12").times(Unit.POUND).times(Unit.INCH),
          Unit.of("lbf·in", "1").times(Unit.POUND).times(Unit.INCH))),
  /** Small lengths of settling. */
  SETTLING(
      List.of(Unit.of("µm", "0.001"), Unit.of("mm", "1")),
      List.of(Unit.of("mil", "0.001").times(Unit.INCH), Unit.of("in", Unit.INCH))),
  TEMPERATURE(List.of(Unit.of("°C", "1")), List.of(Unit.FAHRENHEIT)),
  TEMPERATURE_CHANGE(List.of(Unit.of("K", "1")), List.of(Unit.of("°F", "5").per("9"))),
  /** A share that is read in per cent. */
  SHARE(List.of(Unit.of("%", "0.01")), List.of(Unit.of("%", "0.01"))),
  /** A whole number, such as of cycles or faces. */
  COUNT(List.of(Unit.of("", "1")), List.of(Unit.of("", "1"))),
  RATIO(List.of(Unit.of("", "1"), Unit.of("%", "0.01")), List.of(Unit.of("", "1")));

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

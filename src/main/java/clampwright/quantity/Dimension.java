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

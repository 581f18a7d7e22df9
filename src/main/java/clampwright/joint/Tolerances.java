package clampwright.joint;

/**
 * How far inputs may stray from what was given. 0 = not stated; such an input is taken as exact.
 *
 * @param thickness of each element, ± share [–]
 * @param modulus of each material, ± share [–]
 * @param friction of each friction coefficient and the nut factor, ± share [–]
 * @param introduction of the load-introduction factor, ± [–]
 * @param temperature of each service temperature, ± [K]
 * @param angleLow least half-angle [°]
 * @param angleHigh greatest half-angle [°]; equal to the least = not stated
 */
public record Tolerances(
    double thickness,
    double modulus,
    double friction,
    double introduction,
    double temperature,
    double angleLow,
    double angleHigh) {

  /** Only the half-angle, between the two that handbooks use. */
  public static final Tolerances USUAL = new Tolerances(0, 0, 0, 0, 0, 30, 45);

  public Tolerances {
    share("tolerance of thickness", thickness);
    share("tolerance of modulus", modulus);
    share("tolerance of friction", friction);
    Check.between("tolerance of the load-introduction factor", 0, introduction, 1);
    Check.notNegative("tolerance of temperature", "K", temperature);
    Check.between("least half-angle", 5, angleLow, 60);
    Check.between("greatest half-angle", 5, angleHigh, 60);
    if (angleLow > angleHigh) {
      throw Check.refused("least half-angle", "°", angleLow, "must not be above the greatest");
    }
  }

  private static void share(String what, double value) {
    Check.notNegative(what, "", value);
    if (value >= 1) {
      throw Check.refused(what, "", value, "must be below 1");
    }
  }

  public Tolerances withThickness(double thickness) {
    return new Tolerances(
        thickness, modulus, friction, introduction, temperature, angleLow, angleHigh);
  }

  public Tolerances withModulus(double modulus) {
    return new Tolerances(
        thickness, modulus, friction, introduction, temperature, angleLow, angleHigh);
  }

  public Tolerances withFriction(double friction) {
    return new Tolerances(
        thickness, modulus, friction, introduction, temperature, angleLow, angleHigh);
  }

  public Tolerances withIntroduction(double introduction) {
    return new Tolerances(
        thickness, modulus, friction, introduction, temperature, angleLow, angleHigh);
  }

  public Tolerances withTemperature(double temperature) {
    return new Tolerances(
        thickness, modulus, friction, introduction, temperature, angleLow, angleHigh);
  }

  public Tolerances withAngle(double angleLow, double angleHigh) {
    return new Tolerances(
        thickness, modulus, friction, introduction, temperature, angleLow, angleHigh);
  }
}

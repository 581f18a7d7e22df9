package clampwright.joint;

import java.util.Objects;
import java.util.Optional;

/**
 * One load on the joint, per bolt.
 *
 * @param name as the reader calls it
 * @param axialMin least axial load [N]; positive pulls the joint apart
 * @param axialMax greatest axial load [N], not below the least
 * @param shear across the bolt's axis [N], 0 or more
 * @param introduction where the axial load enters
 * @param friction μ between the members [–], 0 or more
 * @param slipFaces number of faces that carry the shear, 1 or more
 * @param temperature name of the temperature case it goes with; empty = any of them
 */
public record LoadCase(
    String name,
    double axialMin,
    double axialMax,
    double shear,
    Introduction introduction,
    double friction,
    int slipFaces,
    Optional<String> temperature) {

  /** Friction of bare or lightly oiled metal (NASA-STD-5020B, from memory: 0.1 unless cleaned). */
  public static final double USUAL_FRICTION = 0.1;

  public LoadCase {
    Objects.requireNonNull(name, "name");
    Check.finite("least axial load", "N", axialMin);
    Check.finite("axial load", "N", axialMax);
    if (axialMin > axialMax) {
      throw Check.refused("least axial load", "N", axialMin, "must not be above the greatest");
    }
    Check.notNegative("shear load", "N", shear);
    Objects.requireNonNull(introduction, "introduction");
    Check.notNegative("friction between the members", "", friction);
    if (slipFaces < 1) {
      throw Check.refused("number of slip faces", "", slipFaces, "must be 1 or more");
    }
    Objects.requireNonNull(temperature, "temperature");
  }

  /** A steady axial load [N] with a typed load-introduction factor [–]. */
  public static LoadCase steady(String name, double axial, double introduction) {
    return new LoadCase(
        name,
        axial,
        axial,
        0,
        new Introduction.Factor(introduction),
        USUAL_FRICTION,
        1,
        Optional.empty());
  }

  public LoadCase withName(String name) {
    return new LoadCase(
        name, axialMin, axialMax, shear, introduction, friction, slipFaces, temperature);
  }

  public LoadCase withAxial(double axialMin, double axialMax) {
    return new LoadCase(
        name, axialMin, axialMax, shear, introduction, friction, slipFaces, temperature);
  }

  /**
   * With another greatest axial load: a steady load stays steady, and the least of another never
   * gets above the greatest.
   */
  public LoadCase withGreatest(double axialMax) {
    boolean steady = axialMin == this.axialMax;
    return withAxial(steady ? axialMax : Math.min(axialMin, axialMax), axialMax);
  }

  public LoadCase withShear(double shear) {
    return new LoadCase(
        name, axialMin, axialMax, shear, introduction, friction, slipFaces, temperature);
  }

  public LoadCase withIntroduction(Introduction introduction) {
    return new LoadCase(
        name, axialMin, axialMax, shear, introduction, friction, slipFaces, temperature);
  }

  public LoadCase withFriction(double friction) {
    return new LoadCase(
        name, axialMin, axialMax, shear, introduction, friction, slipFaces, temperature);
  }

  public LoadCase withSlipFaces(int slipFaces) {
    return new LoadCase(
        name, axialMin, axialMax, shear, introduction, friction, slipFaces, temperature);
  }

  public LoadCase withTemperature(Optional<String> temperature) {
    return new LoadCase(
        name, axialMin, axialMax, shear, introduction, friction, slipFaces, temperature);
  }
}

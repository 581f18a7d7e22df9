package clampwright.joint;

import java.util.Objects;

/**
 * A 60° screw thread by its basic profile.
 *
 * @param designation as in its standard, such as M10 or 3/8-16 UNC
 * @param form metric or unified; decides the constant of the stress area
 * @param diameter nominal diameter d [mm], above 0
 * @param pitch P [mm], above 0 and small enough to leave a core
 */
public record ScrewThread(String designation, Form form, double diameter, double pitch) {

  /** The family of standards that a thread belongs to. */
  public enum Form {
    METRIC,
    UNIFIED
  }

  public ScrewThread {
    Objects.requireNonNull(designation, "designation");
    Objects.requireNonNull(form, "form");
    Check.positive("thread diameter", "mm", diameter);
    Check.positive("pitch", "mm", pitch);
    if (pitch > diameter / 2) {
      throw Check.refused("pitch", "mm", pitch, "must be at most half the thread diameter");
    }
  }

  /** Pitch diameter d2 = d − 0.649519 P [mm] (ISO 724). */
  public double pitchDiameter() {
    return diameter - 0.649519 * pitch;
  }

  /** Minor diameter of the external thread d3 = d − 1.226869 P [mm] (ISO 724). */
  public double minorDiameter() {
    return diameter - 1.226869 * pitch;
  }

  /**
   * Tensile stress area [mm²]: metric π/4·(d − 0.938194 P)² (ISO 898-1), unified π/4·(D −
   * 0.974279/n)² (ASME B1.1). The two constants are not interchangeable.
   */
  public double stressArea() {
    double reduction = form == Form.METRIC ? 0.938194 : 0.974279;
    double diameter = this.diameter - reduction * pitch;
    return Math.PI / 4 * diameter * diameter;
  }

  /** Area of the core π/4·d3² [mm²]. */
  public double minorArea() {
    return Math.PI / 4 * minorDiameter() * minorDiameter();
  }
}

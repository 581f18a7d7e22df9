package clampwright.mechanics;

import clampwright.joint.Outline;

/** The area that a disc of the pressure zone has inside an outline, less the hole. */
public final class ZoneArea {
  private ZoneArea() {}

  /**
   * |disc(R) ∩ outline| − π·d_h²/4 [mm²].
   *
   * @param radius of the zone [mm]
   * @param slice whose outline and hole count
   */
  static double at(double radius, Slice slice) {
    double hole = Math.PI / 4 * slice.hole() * slice.hole();
    return disc(radius, slice.outline()) - hole;
  }

  /** Area of the disc inside the outline [mm²]; a strip cuts two circular segments off. */
  public static double disc(double radius, Outline outline) {
    if (outline instanceof Outline.Strip strip) {
      return Math.PI * radius * radius
          - segment(radius, strip.left())
          - segment(radius, strip.right());
    }
    double inside =
        outline instanceof Outline.Round round ? Math.min(radius, round.diameter() / 2) : radius;
    return Math.PI * inside * inside;
  }

  /**
   * Circular segment beyond a chord, R²·acos(c/R) − c·√(R² − c²) [mm²]; 0 where the chord does not
   * cut the disc.
   *
   * @param chord distance of the chord from the centre [mm], 0 or more
   */
  public static double segment(double radius, double chord) {
    if (radius <= chord) {
      return 0;
    }
    return radius * radius * Math.acos(chord / radius)
        - chord * Math.sqrt((radius - chord) * (radius + chord));
  }
}

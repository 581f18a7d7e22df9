package clampwright.view.given;

import clampwright.joint.Material;

/** Materials whose modulus somebody has typed. */
final class OwnMaterial {
  private static final String MARK = ", own E";

  private OwnMaterial() {}

  /**
   * A material like another but for its modulus, and named so.
   *
   * @param modulus [MPa], above 0
   */
  static Material of(Material material, double modulus) {
    String name = material.name().endsWith(MARK) ? material.name() : material.name() + MARK;
    return new Material(
        name,
        material.family(),
        modulus,
        material.poisson(),
        material.expansion(),
        material.tensile(),
        material.pressureLimit());
  }
}

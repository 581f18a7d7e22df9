package clampwright.store;

import clampwright.joint.Material;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads a material. */
final class MaterialReader {
  private static final OptionalDouble NONE = OptionalDouble.empty();

  /** Stands in where one is needed only to try another value. */
  static final Material SOUND = new Material("", Material.Family.OTHER, 1, NONE, NONE);

  private MaterialReader() {}

  static Optional<Material> read(JsonObjectReader material) {
    String name = material.text("name", "name");
    Material.Family family =
        material.choice("family", "family", Words.FAMILIES, Material.Family.OTHER);
    double modulus =
        material.number("modulus", "modulus", value -> new Material("", family, value, NONE, NONE));
    OptionalDouble poisson =
        material.optional(
            "poisson",
            "Poisson's ratio",
            value -> new Material("", family, 1, OptionalDouble.of(value), NONE));
    OptionalDouble expansion =
        material.optional(
            "expansion",
            "expansion",
            value -> new Material("", family, 1, NONE, OptionalDouble.of(value)));
    OptionalDouble tensile =
        material.optional(
            "tensile", "tensile strength", value -> SOUND.withTensile(OptionalDouble.of(value)));
    OptionalDouble pressure =
        material.optional(
            "pressureLimit",
            "pressure limit",
            value -> SOUND.withPressureLimit(OptionalDouble.of(value)));
    return material.build(
        () -> new Material(name, family, modulus, poisson, expansion, tensile, pressure));
  }
}

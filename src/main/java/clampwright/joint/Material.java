package clampwright.joint;

import java.util.Objects;
import java.util.OptionalDouble;

/**
 * An isotropic elastic material.
 *
 * @param name as the reader knows it
 * @param family decides the hatching and which empirical constants apply
 * @param modulus Young's modulus [MPa], above 0
 * @param poisson Poisson's ratio [–], 0 … 0.5 exclusive; empty where the source gives none
 * @param expansion coefficient of thermal expansion [1/K]; empty where the source gives none
 * @param tensile tensile strength R_m [MPa]; empty where not given
 * @param pressureLimit pressure under a clamp face that it bears [MPa]; empty where not given
 */
public record Material(
    String name,
    Family family,
    double modulus,
    OptionalDouble poisson,
    OptionalDouble expansion,
    OptionalDouble tensile,
    OptionalDouble pressureLimit) {

  /** Groups of materials that are drawn alike. */
  public enum Family {
    STEEL,
    ALUMINIUM,
    COPPER,
    GREY_IRON,
    OTHER
  }

  public Material {
    Objects.requireNonNull(name, "name");
    Objects.requireNonNull(family, "family");
    Check.positive("modulus", "MPa", modulus);
    poisson.ifPresent(value -> Check.between("Poisson's ratio", 0, value, 0.4999));
    expansion.ifPresent(value -> Check.finite("expansion", "1/K", value));
    tensile.ifPresent(value -> Check.positive("tensile strength", "MPa", value));
    pressureLimit.ifPresent(value -> Check.positive("pressure limit", "MPa", value));
  }

  /** An elastic material whose strength is not given. */
  public Material(
      String name,
      Family family,
      double modulus,
      OptionalDouble poisson,
      OptionalDouble expansion) {
    this(name, family, modulus, poisson, expansion, OptionalDouble.empty(), OptionalDouble.empty());
  }

  public Material withTensile(OptionalDouble tensile) {
    return new Material(name, family, modulus, poisson, expansion, tensile, pressureLimit);
  }

  public Material withPressureLimit(OptionalDouble pressureLimit) {
    return new Material(name, family, modulus, poisson, expansion, tensile, pressureLimit);
  }
}

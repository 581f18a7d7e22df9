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
 */
public record Material(
    String name, Family family, double modulus, OptionalDouble poisson, OptionalDouble expansion) {

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
  }
}

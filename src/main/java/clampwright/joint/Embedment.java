package clampwright.joint;

import java.util.Objects;

/** How much the surfaces settle after tightening. */
public sealed interface Embedment {

  Embedment NONE = new Typed(0);

  /**
   * A typed amount.
   *
   * @param amount f_Z [mm], 0 or more; 0 = not counted
   */
  record Typed(double amount) implements Embedment {
    public Typed {
      Check.notNegative("embedment", "mm", amount);
    }
  }

  /**
   * From the roughness of the surfaces (VDI 2230-1, table 5).
   *
   * @param roughness class of R_z
   * @param sheared whether the joint carries shear
   */
  record FromRoughness(Roughness roughness, boolean sheared) implements Embedment {
    public FromRoughness {
      Objects.requireNonNull(roughness, "roughness");
    }
  }

  /** Classes of the mean roughness depth R_z. */
  enum Roughness {
    /** Below 10 µm. */
    FINE,
    /** 10 µm to below 40 µm. */
    MEDIUM,
    /** 40 µm to below 160 µm. */
    COARSE
  }
}

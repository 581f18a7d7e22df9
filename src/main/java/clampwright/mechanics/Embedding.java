package clampwright.mechanics;

import clampwright.joint.Embedment;

/**
 * How much the surfaces settle, f_Z (VDI 2230-1 table 5, from memory; steel, compact joints).
 *
 * <p>µm for the thread, for each head or nut face and for each inner interface, axial load: R_z
 * below 10: 3, 2.5, 1.5; to 40: 3, 3, 2; to 160: 3, 4, 3; with shear 3, 3, 2; 3, 4.5, 2.5; 3, 6.5,
 * 3.5.
 */
public final class Embedding {
  private Embedding() {}

  /**
   * f_Z of a joint [mm].
   *
   * @param faces number of head and nut faces, 2 with a nut, 1 in a tapped hole
   * @param interfaces number of inner interfaces between the parts
   */
  public static double amount(Embedment embedment, int faces, int interfaces) {
    if (embedment instanceof Embedment.Typed typed) {
      return typed.amount();
    }
    if (embedment instanceof Embedment.FromRoughness rough) {
      double[] row = row(rough.roughness(), rough.sheared());
      return (row[0] + faces * row[1] + interfaces * row[2]) / 1000;
    }
    return 0;
  }

  /** Thread, each outer face, each inner interface [µm]. */
  private static double[] row(Embedment.Roughness roughness, boolean shear) {
    return switch (roughness) {
      case FINE -> shear ? new double[] {3, 3, 2} : new double[] {3, 2.5, 1.5};
      case MEDIUM -> shear ? new double[] {3, 4.5, 2.5} : new double[] {3, 3, 2};
      case COARSE -> shear ? new double[] {3, 6.5, 3.5} : new double[] {3, 4, 3};
    };
  }
}

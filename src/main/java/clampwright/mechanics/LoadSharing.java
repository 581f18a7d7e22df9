package clampwright.mechanics;

/**
 * How the outside load of one case shares out between bolt and members.
 *
 * @param memberStiffness k_m by the chosen method [N/mm]
 * @param introduction n [–]
 * @param loadFactor Φ [–]
 * @param preload F_p in service [N]
 * @param axialMin least outside load F_A [N]; positive pulls the joint apart
 * @param axialMax greatest outside load F_A [N]
 */
public record LoadSharing(
    double memberStiffness,
    double introduction,
    double loadFactor,
    Band preload,
    double axialMin,
    double axialMax) {

  /** Greatest bolt load F_b = max(F_p + Φ·F_A, F_A, 0), with the greatest preload [N]. */
  public double boltLoad() {
    return boltLoad(preload.max(), axialMax);
  }

  /** Bolt load under any preload and outside load [N]; continuous, also where the joint parts. */
  public double boltLoad(double preload, double axial) {
    return boltLoad(preload, loadFactor, axial);
  }

  /** F_b = max(F_p + Φ·F_A, F_A, 0) [N]. */
  public static double boltLoad(double preload, double loadFactor, double axial) {
    return Math.max(Math.max(preload + loadFactor * axial, axial), 0);
  }

  /** Least clamp load left between the members F_c = F_b − F_A, with the least preload [N]. */
  public double clampLoad() {
    return boltLoad(preload.min(), axialMax) - axialMax;
  }

  /** Least outside load at which the members part, F_p/(1 − Φ) with the least preload [N]. */
  public double partingLoad() {
    return partingLoad(preload.min());
  }

  /** Outside load at which the members part under a preload [N]; a loose bolt parts at once. */
  public double partingLoad(double preload) {
    return Math.max(0, preload) / (1 - loadFactor);
  }
}

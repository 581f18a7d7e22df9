package clampwright.mechanics;

/**
 * How the outside load shares out between bolt and members.
 *
 * @param memberStiffness k_m by the chosen method [N/mm]
 * @param loadFactor Φ [–]
 * @param preload F_p [N]
 * @param axial outside load F_A [N], positive pulls the joint apart
 */
public record LoadSharing(double memberStiffness, double loadFactor, double preload, double axial) {

  /** Bolt load F_b = max(F_p + Φ·F_A, F_A, 0) [N]. */
  public double boltLoad() {
    return boltLoad(axial);
  }

  /** Bolt load under any outside load [N]; continuous, also where the joint parts. */
  public double boltLoad(double axial) {
    return Math.max(Math.max(preload + loadFactor * axial, axial), 0);
  }

  /** Clamp load left between the members F_c = F_b − F_A [N]. */
  public double clampLoad() {
    return boltLoad() - axial;
  }

  /** Outside load at which the members part, F_p/(1 − Φ) [N]. */
  public double partingLoad() {
    return preload / (1 - loadFactor);
  }
}

package clampwright.mechanics;

/**
 * A force that strays between two limits.
 *
 * @param min [N]
 * @param nominal [N]
 * @param max [N]
 */
public record Band(double min, double nominal, double max) {

  /** A force that does not stray [N]. */
  public static Band exact(double force) {
    return new Band(force, force, force);
  }
}

package clampwright.joint;

/**
 * The preload of one bolt.
 *
 * @param force [N], 0 or more
 */
public record Preload(double force) {
  public Preload {
    Check.notNegative("preload", "N", force);
  }
}

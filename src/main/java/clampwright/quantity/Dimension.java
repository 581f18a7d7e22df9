package clampwright.quantity;

/**
 * What a number measures. Values inside the program are in mm, N, MPa, N/mm, mm², rad only; this is
 * where they become what a reader sees.
 */
public enum Dimension {
  /** mm; in. */
  LENGTH,
  /** mm²; in². */
  AREA,
  /** N inside, kN shown; lbf. */
  FORCE,
  /** N/mm inside, kN/mm shown; Mlbf/in. */
  STIFFNESS,
  /** MPa; ksi. */
  STRESS,
  /** MPa inside, GPa shown; Mpsi. */
  MODULUS,
  /** Degrees in both. */
  ANGLE,
  /** A pure number in both. */
  RATIO
}

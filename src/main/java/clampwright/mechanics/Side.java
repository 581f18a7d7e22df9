package clampwright.mechanics;

/** Which clamp face governs an element. */
public enum Side {
  HEAD,
  NUT,
  BOTH
}

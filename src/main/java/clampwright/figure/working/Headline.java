package clampwright.figure.working;

/** The readouts that have a working of their own. */
public enum Headline {
  MEMBERS,
  BOLT,
  LOAD_FACTOR,
  PARTING_LOAD,
  BOLT_LOAD,
  CLAMP_LOAD,
  PRELOAD
}

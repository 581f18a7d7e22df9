package clampwright.mechanics.checks;

/** The checks, in the order in which they are read. */
public enum CheckKind {
  /** Equivalent stress while the bolt is being tightened. */
  YIELD_AT_TIGHTENING(Measure.STRESS, "VDI 2230-1, from memory"),
  /** Equivalent stress under the working load. */
  STRESS_IN_SERVICE(Measure.STRESS, "VDI 2230-1, from memory"),
  /** Bolt load at rupture. */
  RUPTURE(Measure.FORCE, "NASA-STD-5020B, from memory"),
  /** Bolt load at yield. */
  YIELD_UNDER_LOAD(Measure.FORCE, "NASA-STD-5020B, from memory"),
  /** The members part. */
  PARTING(Measure.FORCE, "NASA-STD-5020B eq. 6-23, from memory"),
  /** The members slip on each other. */
  SLIP(Measure.FORCE, "Coulomb friction; NASA-STD-5020B, from memory"),
  /** Shear and tension together. */
  SHEAR_WITH_TENSION(Measure.FORCE, "NASA-STD-5020B, from memory"),
  /** Pressure under head, nut and washers. */
  BEARING_PRESSURE(Measure.STRESS, "VDI 2230-1, from memory"),
  /** A part narrower than the zone is crushed. */
  CRUSHING(Measure.STRESS, "bolt load over smallest area; common practice, no source"),
  /** The shank presses into the hole, or tears out to the edge. */
  HOLE_BEARING(Measure.FORCE, "EN 1993-1-8 table 3.4, from memory, without γ_M2"),
  /** The engaged threads strip before the bolt breaks. */
  THREAD_STRIPPING(Measure.FORCE, "FED-STD-H28/2B, ASME B1.1 appendix B"),
  /** Stress amplitude of a load that comes and goes. */
  FATIGUE(Measure.STRESS, "VDI 2230-1, from memory, or Shigley table 8-17");

  /** What demand and capacity are measured in. */
  public enum Measure {
    /** [N]. */
    FORCE,
    /** [MPa]. */
    STRESS
  }

  private final Measure measure;
  private final String source;

  CheckKind(Measure measure, String source) {
    this.measure = measure;
    this.source = source;
  }

  public Measure measure() {
    return measure;
  }

  /** Where the rule comes from. */
  public String source() {
    return source;
  }
}

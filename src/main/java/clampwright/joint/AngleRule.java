package clampwright.joint;

/** How the half-angle of the pressure cones is set. */
public sealed interface AngleRule {

  /** 45°, common practice. */
  record Fixed45() implements AngleRule {}

  /** 30°, for softer members (Shigley). */
  record Fixed30() implements AngleRule {}

  /**
   * Typed half-angles, one per clamp face; equal unless the user parts them.
   *
   * @param headDegrees of the cone that fans from the head's face [°]
   * @param nutDegrees of the cone that fans from the nut's face [°]
   */
  record Typed(double headDegrees, double nutDegrees) implements AngleRule {
    public Typed {
      Check.finite("half-angle", "°", headDegrees);
      Check.finite("half-angle", "°", nutDegrees);
    }
  }

  /** Computed from the joint's proportions (VDI 2230-1). */
  record Vdi2230() implements AngleRule {}

  AngleRule FIXED_45 = new Fixed45();
  AngleRule FIXED_30 = new Fixed30();
  AngleRule VDI_2230 = new Vdi2230();
}

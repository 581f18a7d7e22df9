package clampwright.mechanics;

import clampwright.joint.ScrewThread;

/**
 * Areas over which engaged threads would strip, at the worst limits of size (FED-STD-H28/2B, ASME
 * B1.1 appendix B): external π n L K_n,max [1/(2n) + 0.57735 (E_s,min − K_n,max)], internal π n L
 * D_s,min [1/(2n) + 0.57735 (D_s,min − E_n,max)], n = 1/P. Basic sizes would overstate them by
 * about 30 %.
 *
 * @param external of the bolt's thread [mm²]
 * @param internal of the nut's or the tapped thread [mm²]
 */
public record StrippingAreas(double external, double internal) {
  private static final double TAN_FLANK = 0.57735;

  /**
   * Areas over an engaged length.
   *
   * @param engagement L [mm], 0 or more, already less any chamfer
   */
  public static StrippingAreas of(ScrewThread thread, double engagement) {
    return of(ThreadLimits.of(thread), thread.pitch(), engagement);
  }

  static StrippingAreas of(ThreadLimits limits, double pitch, double engagement) {
    double perPitch = Math.PI * engagement / pitch;
    double half = pitch / 2;
    double external =
        perPitch
            * limits.nutMinorMax()
            * (half + TAN_FLANK * (limits.boltPitchMin() - limits.nutMinorMax()));
    double internal =
        perPitch
            * limits.boltMajorMin()
            * (half + TAN_FLANK * (limits.boltMajorMin() - limits.nutPitchMax()));
    return new StrippingAreas(external, internal);
  }
}

package clampwright.edit;

/**
 * Where something was taken hold of.
 *
 * @param fromAxis signed, positive to the right [mm of the joint]
 * @param z under the head [mm of the joint]
 */
record Grab(double fromAxis, double z) {

  boolean isAt(double fromAxis, double z) {
    return this.fromAxis == fromAxis && this.z == z;
  }

  /** How much farther from the axis a position is, on the side of the grab. */
  double outwards(double fromAxis) {
    return fromAxis < 0 == this.fromAxis < 0
        ? Math.abs(fromAxis) - Math.abs(this.fromAxis)
        : -Math.abs(fromAxis) - Math.abs(this.fromAxis);
  }
}

package clampwright.mechanics;

import clampwright.joint.Joint;

/** Puts the parts of the calculation together. */
final class Assessor {
  private Assessor() {}

  static Assessment assess(Joint joint) {
    throw new UnsupportedOperationException("comes with the mechanics commit");
  }
}

package clampwright.figure;

import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness;

/** The load factor by every method as labelled dots on one axis. */
public final class MethodSpreadFigure {
  private MethodSpreadFigure() {}

  public static Figure of(
      MemberStiffness members, StiffnessMethod chosen, double width, double height) {
    throw new UnsupportedOperationException("comes with the figure commit");
  }
}

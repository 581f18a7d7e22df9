package clampwright.joint;

import java.util.Objects;
import java.util.OptionalDouble;

/**
 * The choices of method that belong to a joint.
 *
 * @param angle half-angle rule
 * @param bodyDiameter outside diameter of the clamped body for VDI 2230 [mm]; needed only where
 *     every layer is wide, otherwise empty
 * @param stiffness the method that the headline readouts follow
 * @param endsCounted whether head, engaged thread and nut give way with the bolt
 * @param threadArea which area the thread in the grip has
 */
public record Method(
    AngleRule angle,
    OptionalDouble bodyDiameter,
    StiffnessMethod stiffness,
    boolean endsCounted,
    ThreadArea threadArea) {

  /** The area that the threaded part of the bolt is given. */
  public enum ThreadArea {
    STRESS_AREA,
    MINOR_AREA
  }

  /** 45°, mid-plane cylinders, ends counted, stress area. */
  public static final Method USUAL =
      new Method(
          AngleRule.FIXED_45,
          OptionalDouble.empty(),
          StiffnessMethod.MID_PLANE_CYLINDERS,
          true,
          ThreadArea.STRESS_AREA);

  public Method {
    Objects.requireNonNull(angle, "angle");
    bodyDiameter.ifPresent(value -> Check.positive("body diameter", "mm", value));
    Objects.requireNonNull(stiffness, "stiffness");
    Objects.requireNonNull(threadArea, "threadArea");
  }

  public Method withAngle(AngleRule angle) {
    return new Method(angle, bodyDiameter, stiffness, endsCounted, threadArea);
  }

  public Method withBodyDiameter(OptionalDouble bodyDiameter) {
    return new Method(angle, bodyDiameter, stiffness, endsCounted, threadArea);
  }

  public Method withStiffness(StiffnessMethod stiffness) {
    return new Method(angle, bodyDiameter, stiffness, endsCounted, threadArea);
  }

  public Method withEndsCounted(boolean endsCounted) {
    return new Method(angle, bodyDiameter, stiffness, endsCounted, threadArea);
  }

  public Method withThreadArea(ThreadArea threadArea) {
    return new Method(angle, bodyDiameter, stiffness, endsCounted, threadArea);
  }
}

package clampwright.mechanics;

import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.mechanics.Reason.Cause;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The half-angles in force and the clamp faces that go with them, or the reasons why there are
 * none.
 *
 * @param head half-angle [rad]
 * @param nut half-angle [rad]
 * @param faces under the washer rule at these angles; empty when there are reasons
 * @param reasons empty when there are faces
 */
record Angles(double head, double nut, Optional<ClampFaces> faces, List<Reason> reasons) {

  static Angles of(Joint joint, List<Slice> slices) {
    return HalfAngle.isComputed(joint) ? computed(joint, slices) : fixed(joint);
  }

  private static Angles fixed(Joint joint) {
    double head = HalfAngle.head(joint.method().angle());
    double nut = HalfAngle.nut(joint.method().angle());
    List<Reason> reasons = new ArrayList<>();
    if (!HalfAngle.inRange(head)) {
      reasons.add(outOfRange(Part.HEAD_CONE, head));
    }
    if (!HalfAngle.inRange(nut)) {
      reasons.add(outOfRange(Part.NUT_CONE, nut));
    }
    return reasons.isEmpty()
        ? new Angles(
            head, nut, Optional.of(ClampFaces.of(joint, Math.tan(head), Math.tan(nut))), reasons)
        : new Angles(head, nut, Optional.empty(), reasons);
  }

  /**
   * The VDI angle needs the faces, and the automatic washer rule needs an angle: the washers are
   * decided once with the angle that the bare faces of head and nut give.
   */
  private static Angles computed(Joint joint, List<Slice> slices) {
    Result first = vdi(VdiProportions.of(joint, ClampFaces.bare(joint), slices));
    if (first.reason().isPresent()) {
      return failed(first.reason().get());
    }
    double tan = Math.tan(first.angle());
    ClampFaces faces = ClampFaces.of(joint, tan, tan);
    Result second = vdi(VdiProportions.of(joint, faces, slices));
    return second.reason().isPresent()
        ? failed(second.reason().get())
        : new Angles(second.angle(), second.angle(), Optional.of(faces), List.of());
  }

  private static Angles failed(Reason reason) {
    return new Angles(0, 0, Optional.empty(), List.of(reason));
  }

  private static Reason outOfRange(Part part, double angle) {
    return Reason.of(part, Cause.ANGLE_OUT_OF_RANGE, Math.toDegrees(angle));
  }

  /** An angle, or why there is none. */
  private record Result(double angle, Optional<Reason> reason) {}

  private static Result vdi(VdiProportions proportions) {
    if (proportions.bodyDiameter().isEmpty()) {
      return new Result(0, Optional.of(Reason.of(Part.JOINT, Cause.BODY_DIAMETER_NEEDED)));
    }
    if (proportions.clampLength() <= 0) {
      return new Result(0, Optional.of(Reason.of(Part.JOINT, Cause.EMPTY_STACK)));
    }
    double angle = proportions.halfAngle();
    return HalfAngle.inRange(angle)
        ? new Result(angle, Optional.empty())
        : new Result(angle, Optional.of(outOfRange(Part.JOINT, angle)));
  }
}

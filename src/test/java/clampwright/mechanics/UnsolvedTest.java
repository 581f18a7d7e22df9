package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import clampwright.joint.Anchor;
import clampwright.joint.AngleRule;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Method;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.ScrewThread;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness.Why;
import clampwright.mechanics.Reason.Cause;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** An impossible joint gives its reason, pointing at the part; never a number. */
class UnsolvedTest {
  private static final double E = 206_000;
  private static final Fastener BOLT =
      Stacks.bolt(new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5), 16, 16, E);
  private static final Element PLATE = Stacks.layer(20, 11, E);

  @Test
  void emptyStack() {
    check(joint(), Part.JOINT, Cause.EMPTY_STACK);
  }

  @Test
  void nothingBetweenTwoWholeWashers() {
    Element washer = Stacks.washer(3, 10.5, 18, E);
    check(joint(washer, washer), Part.JOINT, Cause.EMPTY_STACK);
  }

  @Test
  void holeWiderThanTheFace() {
    check(joint(PLATE, PLATE.withHole(17)), Part.element(1), Cause.FACE_INSIDE_HOLE, 16, 17);
  }

  @Test
  void zoneInsideTheHoleOfAnInnerLayer() {
    // The cone has 8 + 2·tan 45° = 10 where layer 2 begins; its hole takes 10.5.
    Joint joint = joint(Stacks.layer(2, 11, E), Stacks.layer(20, 21, E), Stacks.layer(20, 11, E));
    check(joint, Part.element(1), Cause.NO_BEARING, 20, 21);
  }

  @Test
  void outlineInsideTheHole() {
    check(
        joint(PLATE, PLATE.withOutline(new Outline.Round(10.5)), PLATE),
        Part.element(1),
        Cause.OUTLINE_INSIDE_HOLE,
        10.5,
        11);
  }

  @Test
  void stripEdgeInsideTheHole() {
    check(
        joint(PLATE.withOutline(new Outline.Strip(5.2, 30))),
        Part.element(0),
        Cause.EDGE_INSIDE_HOLE,
        5.2,
        5.5);
  }

  @Test
  void holeNarrowerThanTheBolt() {
    check(joint(PLATE.withHole(9)), Part.element(0), Cause.HOLE_NARROWER_THAN_BOLT, 10, 9);
  }

  @ParameterizedTest
  @CsvSource({"4.9, 45", "60.1, 45", "0, 45", "-3, 45", "90, 45"})
  void angleOutOfRange(double head, double nut) {
    Joint joint = Stacks.joint(BOLT, new AngleRule.Typed(head, nut), PLATE);
    Reason reason = Stacks.reasons(joint).get(0);
    assertEquals(Part.HEAD_CONE, reason.part());
    assertEquals(Cause.ANGLE_OUT_OF_RANGE, reason.cause());
    assertEquals(head, reason.values().get(0), 1e-9);
  }

  @ParameterizedTest
  @CsvSource({"5", "60"})
  void angleAtTheLimitIsInRange(double degrees) {
    Stacks.solved(Stacks.joint(BOLT, new AngleRule.Typed(degrees, degrees), PLATE));
  }

  @Test
  void boltTooShort() {
    Joint joint = joint(PLATE).withFastener(BOLT.withLength(OptionalDouble.of(20)));
    check(joint, Part.SHANK, Cause.BOLT_TOO_SHORT, 20, 20);
  }

  @Test
  void boreTooWide() {
    Joint joint = joint(PLATE).withFastener(BOLT.withBore(8.2));
    Reason reason = Stacks.reasons(joint).get(0);
    assertEquals(Cause.BORE_TOO_WIDE, reason.cause());
  }

  @Test
  void tappedIntoAWasher() {
    Element washer = Stacks.washer(3, 10.5, 18, E);
    Joint joint = joint(PLATE, washer).withFastener(BOLT.withAnchor(new Anchor.Tapped()));
    check(joint, Part.element(1), Cause.TAPPED_WASHER);
  }

  @Test
  void chosenMethodThatDoesNotApplySaysWhy() {
    Joint joint =
        joint(PLATE, Stacks.layer(20, 11, 71_000))
            .withMethod(Method.USUAL.withStiffness(StiffnessMethod.WILEMAN));
    Reason reason = Stacks.reasons(joint).get(0);
    assertEquals(Cause.METHOD_NOT_APPLICABLE, reason.cause());
    assertEquals(Optional.of(Why.SEVERAL_MATERIALS), reason.why());
  }

  @Test
  void everyReasonIsNamed() {
    Joint joint =
        joint(PLATE.withHole(9), PLATE.withOutline(new Outline.Round(8)), PLATE)
            .withFastener(BOLT.withBore(9));
    assertEquals(
        List.of(Cause.HOLE_NARROWER_THAN_BOLT, Cause.OUTLINE_INSIDE_HOLE, Cause.BORE_TOO_WIDE),
        Stacks.reasons(joint).stream().map(Reason::cause).toList());
  }

  private static Joint joint(Element... elements) {
    return Stacks.joint(BOLT, AngleRule.FIXED_45, elements);
  }

  private static void check(Joint joint, Part part, Cause cause, double... values) {
    List<Reason> reasons = Stacks.reasons(joint);
    Reason reason = reasons.get(0);
    assertEquals(1, reasons.size(), reasons::toString);
    assertEquals(part, reason.part());
    assertEquals(cause, reason.cause());
    assertEquals(values.length, reason.values().size());
    for (int i = 0; i < values.length; i++) {
      assertEquals(values[i], reason.values().get(i), 1e-9);
    }
  }
}

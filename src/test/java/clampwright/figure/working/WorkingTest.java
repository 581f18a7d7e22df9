package clampwright.figure.working;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import clampwright.joint.Joint;
import clampwright.joint.Joints;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.ElementFinding;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import clampwright.store.Samples;
import clampwright.store.Stored;
import java.util.stream.Stream;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What a working says is what the assessment found, and its arithmetic can be followed. */
class WorkingTest {

  static Stream<Sketch> samples() {
    return Samples.all().stream().map(sample -> ((Stored.Opened) Samples.open(sample)).sketch());
  }

  @ParameterizedTest
  @MethodSource("samples")
  void theNumbersPutInComeToTheResult(Sketch sketch) {
    Assessment assessment = Assessment.of(sketch.joint());
    for (UnitSystem units : UnitSystem.values()) {
      Follow.all(sketch.joint(), assessment, units).forEach(Follow::check);
    }
  }

  @ParameterizedTest
  @MethodSource("samples")
  void resultsAreThoseOfTheAssessment(Sketch sketch) {
    Joint joint = sketch.joint();
    Solved solved = (Solved) Assessment.of(joint);
    for (UnitSystem units : UnitSystem.values()) {
      checkElements(joint, solved, units);
      checkReadouts(joint, solved, units);
    }
  }

  @Property(tries = 300)
  void anyJointCanBeFollowed(@ForAll("fitting") Joint joint, @ForAll UnitSystem units) {
    Assessment assessment = Assessment.of(joint);
    Follow.all(joint, assessment, units).forEach(Follow::check);
    if (assessment instanceof Solved solved) {
      checkElements(joint, solved, units);
      checkReadouts(joint, solved, units);
    }
  }

  /** Whatever the records allow has a working that says something. */
  @Property(tries = 1000)
  void wildJointsHaveWorkingsToo(@ForAll("any") Joint joint, @ForAll UnitSystem units) {
    Assessment assessment = Assessment.of(joint);
    for (Working working : Follow.all(joint, assessment, units)) {
      assertFalse(working.steps().isEmpty(), working::title);
      assertFalse(working.toString().matches("(?s).*(NaN|Infinity).*"), working::toString);
    }
  }

  @Provide
  Arbitrary<Joint> fitting() {
    return Joints.fitting();
  }

  @Provide
  Arbitrary<Joint> any() {
    return Joints.any();
  }

  private static void checkElements(Joint joint, Solved solved, UnitSystem units) {
    for (int i = 0; i < solved.elements().size(); i++) {
      ElementFinding finding = solved.elements().get(i);
      Working working = Working.of(Part.element(i), joint, solved, units, 0);
      checkStep(working, "Area", Dimension.AREA, units, finding.area());
      checkStep(working, "Stiffness", Dimension.STIFFNESS, units, finding.stiffness());
      if (finding.wholeWasher()) {
        continue;
      }
      String nut = joint.fastener().isTapped() ? "lower" : "nut's";
      String nutCone = joint.fastener().isTapped() ? "Lower cone" : "Nut's cone";
      checkLength(working, "Depth from the head's face", units, finding.depthFromHead());
      checkLength(working, "Depth from the " + nut + " face", units, finding.depthFromNut());
      checkLength(working, "Head's cone", units, finding.headDiameter());
      checkLength(working, nutCone, units, finding.nutDiameter());
      checkLength(working, "Effective diameter", units, finding.effectiveDiameter());
      double frusta = finding.frustaStiffness();
      checkStep(working, "Full frusta", Dimension.STIFFNESS, units, frusta);
    }
  }

  private static void checkLength(Working working, String label, UnitSystem units, double value) {
    checkStep(working, label, Dimension.LENGTH, units, value);
  }

  private static void checkStep(
      Working working, String label, Dimension dimension, UnitSystem units, double value) {
    String expected = Quantities.text(dimension, units, value);
    assertEquals(expected, Follow.step(working, label).result(), label);
  }

  private static void checkReadouts(Joint joint, Solved solved, UnitSystem units) {
    checkLast(Headline.BOLT, joint, solved, units, Dimension.STIFFNESS, solved.bolt().stiffness());
    double clamp = solved.sharing().clampLoad();
    checkLast(Headline.CLAMP_LOAD, joint, solved, units, Dimension.FORCE, clamp);
    double parting = solved.sharing().partingLoad();
    checkLast(Headline.PARTING_LOAD, joint, solved, units, Dimension.FORCE, parting);
  }

  /** The last step that is not a note. */
  private static void checkLast(
      Headline headline,
      Joint joint,
      Solved solved,
      UnitSystem units,
      Dimension dimension,
      double value) {
    Working working = Working.of(headline, joint, solved, units, 0);
    String last =
        working.steps().stream()
            .filter(step -> !step.isRemark())
            .reduce((before, step) -> step)
            .orElseThrow()
            .result();
    assertEquals(Quantities.text(dimension, units, value), last);
  }
}

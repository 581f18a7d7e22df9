package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import clampwright.joint.AngleRule;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Method;
import clampwright.joint.Outline;
import clampwright.joint.ScrewThread;
import clampwright.joint.StiffnessMethod;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Worked examples of Shigley's Mechanical Engineering Design, ch. 8. Inch and Mlbf throughout: the
 * formulas need consistent units only.
 */
class ShigleyTest {
  private static final ScrewThread HALF_20 =
      new ScrewThread("1/2-20 UNF", ScrewThread.Form.UNIFIED, 0.5, 1 / 20.0);
  private static final Fastener BOLT = Stacks.bolt(HALF_20, 0.75, 0.75, 30);

  /** One frustum, eq. 8-20 (30°). Geometry seen in print; values from memory, recomputed. */
  @ParameterizedTest
  @CsvSource({
    "0.75,  0.595,  30,   30.80, 0.01", // ex. 8-2
    "1.437, 0.0775, 14.5, 285.5, 0.1", // ex. 8-2
    "0.75,  0.6725, 14.5, 14.15, 0.01", // ex. 8-2
    "0.75,  0.5,    30,   33.30, 0.01", // Shigley solutions, 8th ed., seen
    "1.327, 0.11,   14.5, 173.8, 0.1", // same
    "0.860, 0.515,  14.5, 21.47, 0.01", // same
    "0.75,  0.095,  30,   97.27, 0.01", // same
  })
  void frustum(double face, double thickness, double modulus, double expected, double within) {
    Slice slice = new Slice(0, 0, thickness, 0.5, Outline.WIDE, modulus);
    double wider = face / 2 + thickness * Math.tan(Math.toRadians(30));
    Zone.Piece piece = new Zone.Piece(0, 0, thickness, face / 2, wider, Side.HEAD);
    assertEquals(expected, 1 / Give.of(piece, slice), within);
  }

  /** Four frusta in series: 10.79 Mlbf/in (Shigley solutions, 8th ed., seen). */
  @Test
  void fourFrustaInSeries() {
    double give = 1 / 33.30 + 1 / 173.8 + 1 / 21.47 + 1 / 97.27;
    assertEquals(10.79, 1 / give, 0.01);
  }

  /** Ex. 8-2a: washer and two plates, 30°; 9.378 Mlbf/in (from memory, recomputed 9.3778). */
  @Test
  void twoMaterials() {
    Joint joint = example(30, 14.5);
    assertEquals(9.378, Stacks.stiffness(joint, StiffnessMethod.FULL_FRUSTA), 0.0005);
  }

  /** Ex. 8-2b: the same, all steel; 14.64 Mlbf/in (from memory, recomputed 14.638). */
  @Test
  void oneMaterial() {
    Joint joint = example(30, 30);
    assertEquals(14.64, Stacks.stiffness(joint, StiffnessMethod.FULL_FRUSTA), 0.003);
  }

  /** Ex. 8-2c: Wileman's fit for steel; 14.92 Mlbf/in (from memory, recomputed 14.916). */
  @Test
  void wileman() {
    assertEquals(14.92, Stacks.stiffness(example(30, 30), StiffnessMethod.WILEMAN), 0.005);
  }

  /** Ex. 8-2b at other angles: independent arithmetic, not published. */
  @ParameterizedTest
  @CsvSource({"25, 12.95", "33, 15.73", "45, 20.99"})
  void otherAngles(double degrees, double expected) {
    Joint joint =
        example(30, 30).withMethod(Method.USUAL.withAngle(new AngleRule.Typed(degrees, degrees)));
    assertEquals(expected, Stacks.stiffness(joint, StiffnessMethod.FULL_FRUSTA), 0.005);
  }

  /**
   * Ex. 8-2d: shank 0.25, thread 1.095 in the grip; 3.69 Mlbf/in (from memory; recomputed 3.694
   * with the table's stress area 0.1599 in², where the formula gives 0.15995).
   */
  @Test
  void boltWithoutEnds() {
    Fastener fastener = BOLT.withShankLength(OptionalDouble.of(0.25));
    Joint joint =
        example(30, 30).withFastener(fastener).withMethod(Method.USUAL.withEndsCounted(false));
    assertEquals(1.345, joint.stackThickness(), 1e-12);
    assertEquals(3.694, Stacks.solved(joint).bolt().stiffness(), 0.0015);
  }

  private static Joint example(double upper, double lower) {
    Element washer = Stacks.layer(0.095, 0.5, 30);
    Element steel = Stacks.layer(0.5, 0.5, upper);
    Element iron = Stacks.layer(0.75, 0.5, lower);
    return Stacks.joint(BOLT, AngleRule.FIXED_30, washer, steel, iron);
  }
}

package clampwright.view.given;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.edit.SketchModel;
import clampwright.joint.Embedment;
import clampwright.joint.Scatter;
import clampwright.joint.Strength;
import clampwright.joint.Target;
import clampwright.joint.Tightening;
import clampwright.mechanics.AssemblyPreload;
import clampwright.quantity.UnitSystem;
import clampwright.view.Sketches;
import java.util.List;
import java.util.OptionalDouble;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;

/** How tight the bolt is, through its fields. */
@ExtendWith(ApplicationExtension.class)
class TighteningSectionTest {
  private GivenRobot robot;

  @Start
  void start(Stage stage) {
    robot = new GivenRobot(stage, Sketches.cover());
  }

  private Tightening tightening() {
    return robot.joint().tightening();
  }

  private double preload() {
    return AssemblyPreload.of(robot.joint(), tightening().target()).getAsDouble();
  }

  private void tighten(Tightening tightening) {
    robot.run(
        () ->
            robot.model.change(
                "Tighten", sketch -> sketch.withJoint(joint -> joint.withTightening(tightening))));
  }

  @Test
  void everyWayToGiveThePreloadKeepsIt() {
    for (String kind : List.of("torque, K", "torque, µ", "share of proof", "torque, µ", "force")) {
      robot.choose("#target-kind", kind);

      assertEquals(kind, robot.label("#target-kind"));
      assertEquals(25_000, preload(), 25_000 * 1e-9);
      assertEquals("Preload given as", robot.model.undoNameProperty().get());
    }
    assertEquals(25_000, ((Target.Force) tightening().target()).force(), 25_000 * 1e-9);
  }

  @Test
  void aTorqueStartsWithAUsualNutFactor() {
    robot.choose("#target-kind", "torque, K");

    // 25 kN · 0.20 · 10 mm = 50 N·m
    Target.NutFactorTorque torque = (Target.NutFactorTorque) tightening().target();
    assertEquals(0.2, torque.nutFactor());
    assertEquals(50_000, torque.torque(), 1e-6);
    assertTrue(robot.isShown("#nut-factor"));
    assertFalse(robot.isShown("#preload"));
    assertFalse(robot.isShown("#thread-friction"));
  }

  @Test
  void aNutFactorFromFrictionIsTheArmOverTheDiameter() {
    robot.choose("#target-kind", "torque, µ");
    Target.FrictionTorque friction = (Target.FrictionTorque) tightening().target();
    double arm = AssemblyPreload.wrenchArm(robot.joint(), friction);

    robot.choose("#target-kind", "torque, K");

    Target.NutFactorTorque torque = (Target.NutFactorTorque) tightening().target();
    assertEquals(arm / 10, torque.nutFactor(), 1e-12);
    assertEquals(friction.torque(), torque.torque(), friction.torque() * 1e-12);
    assertEquals(OptionalDouble.of(0.12), tightening().threadFriction());
  }

  @Test
  void aShareIsOfferedOnlyOfAProofLoadThatIsKnownAndNotExceeded() {
    assertTrue(robot.offered("#target-kind").contains("share of proof"));

    tighten(Tightening.force(60_000));
    assertFalse(robot.offered("#target-kind").contains("share of proof"));

    tighten(Tightening.force(10_000));
    robot.run(() -> withoutProof(robot.model));
    assertEquals(List.of("force", "torque, K", "torque, µ"), robot.offered("#target-kind"));
  }

  private static void withoutProof(SketchModel model) {
    Strength none =
        new Strength("own", "none", OptionalDouble.empty(), OptionalDouble.empty(), 500);
    model.change(
        "Strength", sketch -> Fields.withFastener(sketch, bolt -> bolt.withStrength(none)));
  }

  @Test
  void saysWhatThePreloadWouldBeOtherwise() {
    // Class 8.8 to M16: 580 MPa (ISO 898-1) on 57.99 mm² is 33.6 kN.
    assertEquals("= 74 % of proof · 50.0 N·m at K 0.20", otherwise());

    robot.choose("#target-kind", "torque, K");
    robot.enter("#nut-factor", "0.25");
    assertEquals("= 20.0 kN · 59 % of proof", otherwise());

    robot.run(() -> robot.model.change("Units", sketch -> sketch.withUnits(UnitSystem.INCH)));
    assertEquals("= 4496 lbf · 59 % of proof", otherwise());
  }

  private String otherwise() {
    return robot.label("#preload-otherwise").replace('\u00a0', ' ');
  }

  @Test
  void everyNumberOfATargetIsOneStep() {
    robot.assertTakes("#preload", "30", "Preload", joint -> joint.tightening().target());
    robot.choose("#target-kind", "share of proof");
    robot.assertTakes("#proof-share", "70", "Share of proof", joint -> joint.tightening().target());
    assertEquals(new Target.ProofFraction(0.7), tightening().target());
    robot.choose("#target-kind", "torque, µ");
    robot.assertTakes("#torque", "48", "Torque", joint -> joint.tightening().target());
    robot.assertTakes(
        "#thread-friction", "0.1", "Friction in the thread", joint -> joint.tightening().target());
    robot.assertTakes(
        "#face-friction", "0.14", "Friction under the head", joint -> joint.tightening().target());
    assertEquals(new Target.FrictionTorque(48_000, 0.1, 0.14), tightening().target());
    robot.choose("#target-kind", "torque, K");
    robot.assertTakes("#nut-factor", "0.18", "Nut factor", joint -> joint.tightening().target());
    robot.assertTakes("#torque", "35 lbf·ft", "Torque", joint -> joint.tightening().target());
    // 35 lbf·ft = 35 · 4.4482216152605 N · 12 · 25.4 mm
    assertEquals(
        35 * 4.4482216152605 * 304.8,
        ((Target.NutFactorTorque) tightening().target()).torque(),
        1e-6);
  }

  @Test
  void scatterComesFromTheWayOfTighteningOrIsTyped() {
    robot.choose("#scatter-method", "torque, lubricated, ±25 %");
    assertEquals(new Scatter.PlusMinus(0.25), tightening().scatter());
    // (1 + 0.25)/(1 − 0.25)
    assertEquals("1.6667", robot.input("#tightening-factor").getText());

    robot.assertTakes("#scatter", "20", "Scatter", joint -> joint.tightening().scatter());
    assertEquals(new Scatter.PlusMinus(0.2), tightening().scatter());
    assertEquals("typed", robot.label("#scatter-method"));

    robot.assertTakes(
        "#tightening-factor", "1.6", "Tightening factor", joint -> joint.tightening().scatter());
    assertEquals(new Scatter.TighteningFactor(1.6), tightening().scatter());
    // (1.6 − 1)/(1.6 + 1)
    assertEquals("23.077", robot.input("#scatter").getText());
  }

  @Test
  void choosingTypedGoesToTheField() {
    robot.choose("#scatter-method", "typed");

    assertTrue(robot.input("#scatter").isFocused());
    assertEquals("", robot.model.undoNameProperty().get());
  }

  @Test
  void frictionForTorsionIsAskedForWhereTheTargetDoesNotNameIt() {
    assertEquals("not given", robot.input("#torsion-friction").getPromptText());
    robot.assertTakes(
        "#torsion-friction",
        "0.1",
        "Friction for torsion",
        joint -> joint.tightening().threadFriction());

    robot.choose("#target-kind", "torque, µ");

    assertFalse(robot.isShown("#torsion-friction"));
    assertEquals("0.1", robot.input("#thread-friction").getText());
  }

  @Test
  void lossesLieInAFold() {
    assertFalse(robot.isShown("#relaxation"));
    robot.press("#fold-losses");
    assertFalse(robot.isShown("#embedment-load"));

    robot.assertTakes("#relaxation", "5", "Relaxation", joint -> joint.tightening().relaxation());
    robot.assertTakes("#creep", "2", "Creep", joint -> joint.tightening().creep());
    robot.assertTakes("#embedment", "8", "Embedment", joint -> joint.tightening().embedment());

    assertEquals(0.05, tightening().relaxation());
    assertEquals(new Embedment.Typed(0.008), tightening().embedment());
    assertEquals("typed", robot.label("#embedment-kind"));
  }

  @Test
  void settlingFollowsFromTheRoughness() {
    robot.press("#fold-losses");

    robot.choose("#embedment-kind", "Rz 10–40 µm");
    robot.choose("#embedment-load", "shear");

    assertEquals(
        new Embedment.FromRoughness(Embedment.Roughness.MEDIUM, true), tightening().embedment());
    // VDI 2230-1 table 5, from memory: thread 3, two faces of 4.5, three interfaces of 2.5 µm.
    assertEquals("auto 19.5", robot.input("#embedment").getPromptText());

    robot.choose("#embedment-kind", "typed");
    assertEquals(new Embedment.Typed(0.0195), tightening().embedment());
    robot.choose("#embedment-kind", "none");
    assertEquals(Embedment.NONE, tightening().embedment());
  }

  @Test
  void wrongNumbersStayAndSayWhy() {
    robot.press("#fold-losses");
    robot.assertRefuses("#scatter", "-5", "Scatter must be 0 or more.");
    robot.assertRefuses("#tightening-factor", "0.9", "Tightening factor must be 1 or more.");
    robot.assertRefuses("#relaxation", "150", "Relaxation must lie between 0 and 100 %.");
    robot.choose("#target-kind", "share of proof");
    robot.assertRefuses(
        "#proof-share", "120", "Share of the proof load must lie between 0 and 100 %.");
    assertEquals("-5", robot.input("#scatter").getText());
  }
}

package clampwright.view.given;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Allowables;
import clampwright.joint.Criteria;
import clampwright.joint.Factors;
import clampwright.joint.Joint;
import clampwright.joint.Tolerances;
import clampwright.view.Sketches;
import java.util.OptionalDouble;
import java.util.function.Function;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;

/** What the joint is judged by, through its fields. */
@ExtendWith(ApplicationExtension.class)
class CriteriaSectionTest {
  private GivenRobot robot;

  @Start
  void start(Stage stage) {
    robot = new GivenRobot(stage, Sketches.cover());
  }

  private Criteria criteria() {
    return robot.joint().criteria();
  }

  @Test
  void everyFactorIsOneStep() {
    assertTrue(robot.isShown("#no-factors"));
    Function<Joint, Object> factors = joint -> joint.criteria().factors();

    robot.assertTakes("#factor-fitting", "1.15", "Fitting factor", factors);
    robot.assertTakes("#factor-ultimate", "1.4", "Factor against rupture", factors);
    robot.assertTakes("#factor-yield", "1,25", "Factor against yield", factors);
    robot.assertTakes("#factor-parting", "1.2", "Factor against parting", factors);
    robot.assertTakes("#factor-slip", "1.3", "Factor against slip", factors);

    assertEquals(new Factors(1.15, 1.4, 1.25, 1.2, 1.3), criteria().factors());
    assertFalse(robot.isShown("#no-factors"));
  }

  @Test
  void everyLimitIsOneStepAndMayBeLeftToTheStrengthClass() {
    robot.press("#fold-limits");
    Function<Joint, Object> limits = joint -> joint.criteria().allowables();
    assertEquals("by class", robot.input("#limit-ultimate").getPromptText());

    robot.assertTakes("#limit-ultimate", "46", "Ultimate load", limits);
    robot.assertTakes("#limit-yield", "37", "Yield load", limits);
    robot.assertTakes("#limit-shear", "500", "Shear strength", limits);
    robot.assertTakes("#limit-amplitude", "45", "Endurable amplitude", limits);
    assertEquals(
        new Allowables(
            OptionalDouble.of(46_000),
            OptionalDouble.of(37_000),
            OptionalDouble.of(500),
            OptionalDouble.of(45)),
        criteria().allowables());

    robot.enter("#limit-ultimate", "");
    assertEquals(OptionalDouble.empty(), criteria().allowables().ultimate());
  }

  @Test
  void basisFatigueRuleAndCyclesAreSteps() {
    robot.choose("#checks-basis", "as chosen");
    assertEquals(Criteria.Basis.CHOSEN, criteria().basis());
    assertEquals("Stiffness for checks", robot.model.undoNameProperty().get());

    robot.press("#fold-limits");
    robot.choose("#fatigue-rule", "Goodman line");
    assertEquals(Criteria.Fatigue.GOODMAN, criteria().fatigue());
    assertEquals("Fatigue rule", robot.model.undoNameProperty().get());

    robot.assertTakes("#cycles", "5e5", "Number of cycles", joint -> joint.criteria().cycles());
    assertEquals(500_000, criteria().cycles());
  }

  @Test
  void everyToleranceIsOneStep() {
    robot.press("#fold-tolerances");
    Function<Joint, Object> tolerances = joint -> joint.criteria().tolerances();

    robot.assertTakes("#tolerance-thickness", "2", "Tolerance of thickness", tolerances);
    robot.assertTakes("#tolerance-modulus", "5", "Tolerance of modulus", tolerances);
    robot.assertTakes("#tolerance-friction", "20", "Tolerance of friction", tolerances);
    robot.assertTakes("#tolerance-n", "0.1", "Tolerance of n", tolerances);
    robot.assertTakes("#tolerance-temperature", "18 °F", "Tolerance of temperature", tolerances);
    robot.assertTakes("#tolerance-angle-low", "25", "Least half-angle", tolerances);
    robot.assertTakes("#tolerance-angle-high", "40", "Greatest half-angle", tolerances);

    // A change of 18 °F is one of 10 K.
    assertEquals(new Tolerances(0.02, 0.05, 0.2, 0.1, 10, 25, 40), criteria().tolerances());
  }

  @Test
  void wrongNumbersStayAndSayWhy() {
    robot.press("#fold-limits");
    robot.press("#fold-tolerances");

    robot.assertRefuses("#factor-slip", "0", "Factor against slip must be above 0.");
    robot.assertRefuses("#limit-yield", "-3", "Yield load must be above 0.");
    robot.assertRefuses("#cycles", "500", "Number of cycles must be 10 000 or more.");
    robot.assertRefuses("#tolerance-modulus", "100", "Tolerance of modulus must be below 100 %.");
    robot.assertRefuses(
        "#tolerance-angle-low", "50", "Least half-angle must not be above the greatest.");
    robot.assertRefuses(
        "#tolerance-angle-high", "70", "Greatest half-angle must lie between 5 and 60.");
    assertEquals("0", robot.input("#factor-slip").getText());
  }
}

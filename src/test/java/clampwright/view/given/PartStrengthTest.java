package clampwright.view.given;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Material;
import clampwright.joint.Part;
import clampwright.view.Sketches;
import java.util.OptionalDouble;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;

/** The strength of a part, through its fields. */
@ExtendWith(ApplicationExtension.class)
class PartStrengthTest {
  private GivenRobot robot;

  @Start
  void start(Stage stage) {
    robot = new GivenRobot(stage, Sketches.cover());
  }

  @BeforeEach
  void unfold() {
    robot.run(() -> robot.model.select(Part.element(1)));
    assertFalse(robot.isShown("#part-tensile"));
    robot.press("#part-fold-strength");
    assertTrue(robot.isShown("#part-tensile"));
  }

  private Material material() {
    return robot.joint().elements().get(1).material();
  }

  @Test
  void strengthIsTypedForOnePartAlone() {
    Material table = material();
    robot.assertTakes("#part-tensile", "410", "Tensile strength", joint -> joint.elements());
    robot.assertTakes("#part-pressure-limit", "490", "Pressure limit", joint -> joint.elements());

    assertEquals(OptionalDouble.of(410), material().tensile());
    assertEquals(OptionalDouble.of(490), material().pressureLimit());
    assertEquals(table, robot.joint().elements().get(2).material());
    assertEquals("not given", robot.input("#part-tensile").getPromptText());
    robot.enter("#part-tensile", "");
    assertEquals(OptionalDouble.empty(), material().tensile());
  }

  @Test
  void wrongNumbersStayAndSayWhy() {
    robot.assertRefuses("#part-tensile", "0", "Tensile strength must be above 0.");
    robot.assertRefuses("#part-pressure-limit", "-1", "Pressure limit must be above 0.");
  }
}

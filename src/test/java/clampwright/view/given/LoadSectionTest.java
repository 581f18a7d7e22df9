package clampwright.view.given;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Introduction;
import clampwright.joint.LoadCase;
import clampwright.view.Sketches;
import java.util.List;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;

/** The loads, through their fields. */
@ExtendWith(ApplicationExtension.class)
class LoadSectionTest {
  private GivenRobot robot;

  @Start
  void start(Stage stage) {
    robot = new GivenRobot(stage, Sketches.cover());
  }

  private List<LoadCase> loads() {
    return robot.joint().service().loads();
  }

  private List<String> names() {
    return loads().stream().map(LoadCase::name).toList();
  }

  @Test
  void everyNumberOfALoadIsOneStep() {
    robot.assertTakes("#axial-least", "-2", "Least axial load", this::first);
    robot.assertTakes("#axial-load", "8", "Axial load", this::first);
    robot.assertTakes("#shear-load", "1,5", "Shear load", this::first);
    robot.assertTakes("#introduction", "0.5", "Load-introduction factor", this::first);
    robot.assertTakes("#slip-friction", "0.15", "Friction between the parts", this::first);
    robot.assertTakes("#slip-faces", "2", "Slip faces", this::first);

    LoadCase load = loads().get(0);
    assertEquals(-2_000, load.axialMin());
    assertEquals(8_000, load.axialMax());
    assertEquals(1_500, load.shear());
    assertEquals(new Introduction.Factor(0.5), load.introduction());
    assertEquals(0.15, load.friction());
    assertEquals(2, load.slipFaces());
  }

  private Object first(clampwright.joint.Joint joint) {
    return joint.service().loads().get(0);
  }

  @Test
  void anAddedCaseIsACopyAndIsShown() {
    robot.press("#add-load-case");

    assertEquals(List.of("Working load", "Load case 2"), names());
    assertEquals("Add load case", robot.model.undoNameProperty().get());
    assertEquals(1, robot.model.loadCase());
    assertEquals("Load case 2", robot.label("#load-case"));
    assertEquals("Load case 2", robot.input("#load-case-name").getText());

    robot.enter("#axial-load", "9");
    assertEquals(6_000, loads().get(0).axialMax());
    assertEquals(9_000, loads().get(1).axialMax());

    robot.choose("#load-case", "Working load");
    assertEquals("6", robot.input("#axial-load").getText());
    assertEquals("Axial load", robot.model.undoNameProperty().get());
  }

  @Test
  void addingAndRemovingCasesCanBeUndone() {
    robot.press("#add-load-case");
    robot.press("#add-load-case");
    robot.enter("#axial-load", "9");
    robot.choose("#load-case", "Load case 2");

    robot.press("#remove-load-case");
    assertEquals(List.of("Working load", "Load case 3"), names());
    assertEquals("Remove load case", robot.model.undoNameProperty().get());
    assertEquals("9", robot.input("#axial-load").getText());

    robot.undo();
    assertEquals(List.of("Working load", "Load case 2", "Load case 3"), names());
    assertEquals("6", robot.input("#axial-load").getText());

    robot.undo();
    robot.undo();
    robot.undo();
    assertEquals(List.of("Working load"), names());
    assertEquals("Working load", robot.label("#load-case"));
  }

  @Test
  void theLastCaseStays() {
    assertFalse(robot.isEnabled("#remove-load-case"));

    robot.press("#add-load-case");
    assertTrue(robot.isEnabled("#remove-load-case"));

    robot.press("#remove-load-case");
    assertFalse(robot.isEnabled("#remove-load-case"));
    assertEquals(List.of("Working load"), names());
  }

  @Test
  void aCaseCanBeRenamed() {
    robot.enter("#load-case-name", "Start-up");

    assertEquals(List.of("Start-up"), names());
    assertEquals("Start-up", robot.label("#load-case"));
    assertEquals("Load case name", robot.model.undoNameProperty().get());
    robot.undo();
    assertEquals("Working load", robot.label("#load-case"));
  }

  @Test
  void wrongTextDoesNotMoveToAnotherCase() {
    robot.press("#add-load-case");
    robot.assertRefuses("#shear-load", "-1", "Shear load must be 0 or more.");

    robot.choose("#load-case", "Working load");

    assertEquals("0", robot.input("#shear-load").getText());
    assertEquals(0, loads().get(1).shear());
  }

  @Test
  void aLoadCanEnterAtPartsDrawn() {
    robot.choose("#load-enters", "at the parts drawn");
    assertEquals(new Introduction.Planes(0, 3), loads().get(0).introduction());
    assertEquals("Load introduction", robot.model.undoNameProperty().get());
    assertFalse(robot.isShown("#introduction"));

    robot.choose("#load-in", "Cover");
    robot.choose("#load-out", "Spacer");
    assertEquals(new Introduction.Planes(1, 2), loads().get(0).introduction());
    assertEquals("Load leaves at", robot.model.undoNameProperty().get());

    robot.choose("#load-out", "Washer");
    assertEquals(new Introduction.Planes(0, 0), loads().get(0).introduction());
    assertEquals("n = 0", robot.label("#introduction-found").replaceAll("\\.0+", ""));
  }

  @Test
  void aTypedFactorStartsWithTheOneInForce() {
    robot.choose("#load-enters", "at the parts drawn");
    double inForce = IntroductionFields.inForce(robot.model).getAsDouble();
    assertTrue(inForce > 0 && inForce < 1, "n = " + inForce);

    robot.choose("#load-enters", "typed n");

    Introduction.Factor typed = (Introduction.Factor) loads().get(0).introduction();
    assertEquals(inForce, typed.factor(), 0.0005);
  }

  @Test
  void wrongNumbersStayAndSayWhy() {
    robot.assertRefuses("#slip-faces", "0", "Number of slip faces must be 1 or more.");
    robot.assertRefuses("#slip-faces", "1.5", "Number of slip faces must be a whole number.");
    robot.assertRefuses("#axial-least", "7", "Least axial load must not be above the greatest.");
    robot.assertRefuses(
        "#introduction", "1.2", "Load-introduction factor must lie between 0 and 1.");
    assertEquals("1.5", robot.input("#slip-faces").getText());
  }
}

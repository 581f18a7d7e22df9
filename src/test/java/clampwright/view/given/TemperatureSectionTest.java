package clampwright.view.given;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.LoadCase;
import clampwright.joint.Service;
import clampwright.joint.TemperatureCase;
import clampwright.quantity.UnitSystem;
import clampwright.view.Sketches;
import java.util.List;
import java.util.Optional;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;

/** The temperatures of service, through their fields. */
@ExtendWith(ApplicationExtension.class)
class TemperatureSectionTest {
  private GivenRobot robot;

  @Start
  void start(Stage stage) {
    robot = new GivenRobot(stage, Sketches.cover());
  }

  @BeforeEach
  void unfold() {
    assertFalse(robot.isShown("#assembly-temperature"));
    robot.press("#fold-temperatures");
    assertTrue(robot.isShown("#assembly-temperature"));
  }

  private Service service() {
    return robot.joint().service();
  }

  private LoadCase load() {
    return service().loads().get(0);
  }

  @Test
  void everyTemperatureIsOneStep() {
    robot.assertTakes(
        "#assembly-temperature",
        "15",
        "Temperature at assembly",
        joint -> joint.service().assembly());
    robot.press("#add-temperature-case");
    assertEquals(List.of(new TemperatureCase("Temperature 1", 15, 15)), service().temperatures());
    assertEquals("Add temperature case", robot.model.undoNameProperty().get());

    robot.assertTakes(
        "#temperature-members-0",
        "120",
        "Temperature of the members",
        joint -> joint.service().temperatures());
    robot.assertTakes(
        "#temperature-bolt-0",
        "-40",
        "Temperature of the bolt",
        joint -> joint.service().temperatures());
    robot.enter("#temperature-name-0", "Hot");
    assertEquals(List.of(new TemperatureCase("Hot", 120, -40)), service().temperatures());
    assertEquals("Temperature case name", robot.model.undoNameProperty().get());
  }

  @Test
  void addingAndRemovingCasesCanBeUndone() {
    robot.press("#add-temperature-case");
    robot.press("#add-temperature-case");
    robot.enter("#temperature-members-1", "80");

    robot.press("#remove-temperature-0");

    assertEquals(List.of(new TemperatureCase("Temperature 2", 80, 20)), service().temperatures());
    assertEquals("80", robot.input("#temperature-members-0").getText());
    assertFalse(robot.isShown("#temperature-members-1"));
    robot.undo();
    assertEquals(2, service().temperatures().size());
    assertEquals("20", robot.input("#temperature-members-0").getText());
    assertTrue(robot.isShown("#temperature-members-1"));
  }

  @Test
  void aLoadGoesWithATemperatureAndFollowsItsName() {
    assertFalse(robot.isShown("#load-temperature"));
    robot.press("#add-temperature-case");
    robot.press("#add-temperature-case");

    robot.choose("#load-temperature", "Temperature 2");
    assertEquals(Optional.of("Temperature 2"), load().temperature());
    assertEquals("Temperature of the load case", robot.model.undoNameProperty().get());

    // On the way the text passes through "Temperature 1", the name of the other case.
    robot.enter("#temperature-name-1", "Temperature 1");
    robot.enter("#temperature-name-1", "Temperature 10");
    assertEquals(Optional.of("Temperature 10"), load().temperature());
    assertEquals("Temperature 1", service().temperatures().get(0).name());

    robot.press("#remove-temperature-1");
    assertEquals(Optional.empty(), load().temperature());
    assertEquals("any", robot.label("#load-temperature"));
  }

  @Test
  void readsFahrenheitWhereTheSketchShowsInches() {
    robot.run(() -> robot.model.change("Units", sketch -> sketch.withUnits(UnitSystem.INCH)));
    assertEquals("68", robot.input("#assembly-temperature").getText());

    robot.enter("#assembly-temperature", "77");

    assertEquals(25, service().assembly(), 1e-9);
  }

  @Test
  void nothingIsColderThanAbsoluteZero() {
    robot.press("#add-temperature-case");

    robot.assertRefuses(
        "#temperature-bolt-0",
        "-273.2",
        "Temperature of the bolt must not be below absolute zero, −273.15 °C.");
    robot.assertRefuses(
        "#assembly-temperature",
        "-300",
        "Temperature at assembly must not be below absolute zero, −273.15 °C.");
    assertEquals("-273.2", robot.input("#temperature-bolt-0").getText());
  }
}

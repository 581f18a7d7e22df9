package clampwright.view.section;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Introduction;
import clampwright.joint.Part;
import clampwright.view.Sketches;
import java.util.OptionalDouble;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** The card beside a part. */
@ExtendWith(ApplicationExtension.class)
class CardPlaceTest {
  private static final int FLANGE = 3;

  private SectionScene section;
  private FxRobot robot;

  @Start
  void start(Stage stage) {
    section = new SectionScene(stage, Sketches.cover());
  }

  @BeforeEach
  void takeRobot(FxRobot robot) {
    this.robot = robot;
    WaitForAsyncUtils.waitForFxEvents();
  }

  private void open(Part part) {
    robot.interact(() -> section.model.select(part));
    robot.interact(() -> section.pane.openCard());
    WaitForAsyncUtils.waitForFxEvents();
  }

  private double bottomOfCard() {
    Node card = robot.lookup("#part-card").query();
    return card.getBoundsInParent().getMaxY();
  }

  @Test
  void staysOnThePaneWhenMoreFieldsShow() {
    open(Part.element(FLANGE));
    Node card = robot.lookup("#part-card").query();
    robot.interact(() -> card.setLayoutY(SectionScene.HEIGHT - card.getLayoutBounds().getHeight()));
    double height = card.getLayoutBounds().getHeight();

    robot.interact(() -> ((Button) robot.lookup("#card-fold-strength").query()).fire());
    WaitForAsyncUtils.waitForFxEvents();

    assertTrue(card.getLayoutBounds().getHeight() > height);
    assertTrue(bottomOfCard() <= SectionScene.HEIGHT, "its lower edge is at " + bottomOfCard());
  }

  @Test
  void takesTheStrengthOfThePart() {
    open(Part.element(FLANGE));
    robot.interact(
        () -> {
          ((Button) robot.lookup("#card-fold-strength").query()).fire();
          TextField tensile = robot.lookup("#card-tensile").query();
          tensile.requestFocus();
        });

    robot.write("410").type(KeyCode.ENTER);

    assertEquals(OptionalDouble.of(410), section.element(FLANGE).material().tensile());
    assertEquals("Tensile strength", section.model.undoNameProperty().get());
  }

  @Test
  void asksForNoFactorWhereTheLoadIsDrawnAtParts() {
    open(Part.LOAD);
    assertTrue(robot.lookup("#card-n").query().getParent().getParent().isVisible());

    robot.interact(
        () ->
            section.model.change(
                "Planes",
                sketch ->
                    sketch.withJoint(
                        joint ->
                            joint.withService(
                                joint
                                    .service()
                                    .withLoad(
                                        0,
                                        load ->
                                            load.withIntroduction(
                                                new Introduction.Planes(0, 1)))))));

    assertFalse(robot.lookup("#card-n").query().getParent().getParent().isVisible());
  }
}

package clampwright.view.spread;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.edit.SketchModel;
import clampwright.joint.Scatter;
import clampwright.joint.Sketch;
import clampwright.mechanics.spread.Input;
import clampwright.mechanics.spread.Sensitivity;
import clampwright.view.Sketches;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.scene.Scene;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** The bars and the random joints, by mouse. */
@ExtendWith(ApplicationExtension.class)
class SpreadPaneTest {
  private final List<Sensitivity.Bar> opened = new ArrayList<>();
  private SketchModel model;
  private FxRobot robot;

  @Start
  void start(Stage stage) {
    Sketch cover = Sketches.cover();
    model =
        new SketchModel(
            cover.withJoint(
                joint ->
                    joint.withTightening(
                        joint.tightening().withScatter(new Scatter.PlusMinus(0.25)))));
    stage.setScene(new Scene(new SpreadPane(model, opened::add), 1200, 320));
    stage.show();
  }

  @BeforeEach
  void takeRobot(FxRobot robot) {
    this.robot = robot;
    WaitForAsyncUtils.waitForFxEvents();
  }

  private String text(String query) {
    return robot.lookup(query).queryLabeled().getText();
  }

  @Test
  void aBarOpensItsWorking() {
    robot.clickOn("#spread-bar-0");
    assertEquals(1, opened.size());
    assertEquals(Input.Kind.PRELOAD, opened.get(0).input().kind());
  }

  @Test
  void aRunSaysWhichShareFails() throws TimeoutException {
    robot.clickOn("#trial-start");
    WaitForAsyncUtils.waitFor(60, TimeUnit.SECONDS, () -> text("#trial-start").equals("Run again"));
    WaitForAsyncUtils.waitForFxEvents();
    assertTrue(text("#trial-answer").contains("of 100\u2009000 fail"), text("#trial-answer"));
  }

  @Test
  void aRunCanBeCancelled() {
    robot.clickOn("#trial-start");
    robot.clickOn("#trial-start");
    assertEquals("Run again", text("#trial-start"));
  }

  @Test
  void aChangedSketchForgetsTheRun() throws TimeoutException {
    robot.clickOn("#trial-start");
    robot.interact(
        () ->
            model.change(
                "Scatter",
                sketch ->
                    sketch.withJoint(
                        joint ->
                            joint.withTightening(
                                joint.tightening().withScatter(new Scatter.PlusMinus(0.1))))));
    WaitForAsyncUtils.waitFor(10, TimeUnit.SECONDS, () -> text("#trial-start").startsWith("Run 1"));
    assertTrue(text("#trial-answer").startsWith("Random joints"), text("#trial-answer"));
  }

  @Test
  void withoutASolutionThereIsNothingToAsk() {
    robot.interact(
        () -> model.open(model.sketch().withJoint(joint -> joint.withElements(List.of()))));
    WaitForAsyncUtils.waitForFxEvents();
    assertEquals("No solution yet", text("#spread-given"));
    assertTrue(robot.lookup("#spread-bar-0").tryQuery().isEmpty());
  }
}

package clampwright.view.given;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.edit.SketchModel;
import clampwright.joint.Anchor;
import clampwright.joint.AngleRule;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Material;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.WasherRule;
import clampwright.mechanics.Assessment;
import clampwright.view.Sketches;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.Labeled;
import javafx.scene.control.ListCell;
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

/** The inputs, each through its field. */
@ExtendWith(ApplicationExtension.class)
class GivenPaneTest {
  private SketchModel model;
  private FxRobot robot;

  @Start
  void start(Stage stage) {
    model = new SketchModel(Sketches.cover());
    stage.setScene(new Scene(new GivenPane(model), 300, 1100));
    stage.show();
  }

  @BeforeEach
  void takeRobot(FxRobot robot) {
    this.robot = robot;
  }

  private Fastener fastener() {
    return model.sketch().joint().fastener();
  }

  private void enter(String field, String text) {
    robot.interact(
        () -> {
          TextField input = robot.lookup(field).query();
          input.requestFocus();
          input.selectAll();
        });
    robot.write(text).type(KeyCode.ENTER);
    WaitForAsyncUtils.waitForFxEvents();
  }

  /** Opens the list of a field that may lie outside what the pane shows, and clicks a value. */
  private void choose(String field, String label) {
    robot.interact(() -> ((ButtonBase) robot.lookup(field).query()).fire());
    robot.clickOn(cell(label));
    WaitForAsyncUtils.waitForFxEvents();
  }

  private Node cell(String label) {
    return robot.lookup(".list-cell").queryAll().stream()
        .filter(node -> label.equals(((ListCell<?>) node).getText()))
        .findFirst()
        .orElseThrow(() -> new AssertionError("no " + label + " in the list"));
  }

  private String text(String query) {
    return robot.lookup(query).queryLabeled().getText();
  }

  private String prompt(String query) {
    return ((TextField) robot.lookup(query).query()).getPromptText();
  }

  private boolean isShown(String query) {
    Optional<Node> found = robot.lookup(query).tryQuery();
    for (Node at = found.orElse(null); at != null; at = at.getParent()) {
      if (!at.isVisible()) {
        return false;
      }
    }
    return found.isPresent();
  }

  @Test
  void aLargerThreadTakesHeadNutAndHolesAlong() {
    choose("#thread", "M12");

    assertEquals("M12", fastener().thread().designation());
    // ISO 4014: across flats of M12 is 18 mm; ISO 273, medium: hole 13.5 mm.
    assertEquals(18, fastener().head().width());
    assertEquals(13.5, model.sketch().joint().elements().get(1).hole());
    assertEquals("Thread", model.undoNameProperty().get());
    assertEquals("M12", text("#thread"));
  }

  @Test
  void choosesByKeyboardAndSkipsHeadings() {
    robot.interact(() -> robot.lookup("#head").query().requestFocus());
    robot.type(KeyCode.DOWN);

    robot.type(KeyCode.DOWN).type(KeyCode.ENTER);

    assertEquals(Head.Style.SOCKET, fastener().head().style());
    assertEquals("socket", text("#head"));
  }

  @Test
  void escapeClosesTheListAndChangesNothing() {
    robot.clickOn("#strength");
    assertTrue(isShown(".choice-list"));

    robot.type(KeyCode.DOWN).type(KeyCode.ESCAPE);

    assertFalse(isShown(".choice-list"));
    assertEquals("", model.undoNameProperty().get());
  }

  @Test
  void showsTheAutomaticLengthsAsPrompts() {
    Assessment.Solved solved = (Assessment.Solved) model.assessment();
    // Grip 33 + nut 8.4 (ISO 4032, M10) + 2 pitches of 1.5 = 44.4: the next length is 45 mm.
    assertEquals(45, solved.bolt().length());
    assertEquals("auto 45", prompt("#bolt-length"));
    // ISO 4014: thread 2d + 6 = 26 mm of the 45.
    assertEquals("auto 19", prompt("#shank-length"));
  }

  @Test
  void aTypedFaceIsAnOwnSize() {
    robot.clickOn("#fold-faces-bore-material");

    enter("#head-face", "15");

    assertEquals(15, fastener().head().bearingDiameter());
    assertEquals("own size", fastener().head().standard());
    assertEquals("hexagon, own", text("#head"));
  }

  @Test
  void aTappedHoleNeedsNoNut() {
    robot.clickOn("#fold-faces-bore-material");
    choose("#anchor", "thread in the last layer");

    assertEquals(new Anchor.Tapped(), fastener().anchor());
    assertTrue(robot.lookup("#nut-face").query().isDisabled());
  }

  @Test
  void typedAnglesStartWithThoseInForceAndStayEqualUntilParted() {
    choose("#angle-rule", "typed");
    assertEquals(new AngleRule.Typed(45, 45), model.sketch().joint().method().angle());

    enter("#head-angle", "38");
    assertEquals(new AngleRule.Typed(38, 38), model.sketch().joint().method().angle());
    assertEquals("auto 38", prompt("#nut-angle"));

    enter("#nut-angle", "30");
    enter("#head-angle", "40");
    assertEquals(new AngleRule.Typed(40, 30), model.sketch().joint().method().angle());
  }

  @Test
  void anAngleOutsideTheRangeIsRefusedByTheJointNotTheField() {
    choose("#angle-rule", "typed");

    enter("#head-angle", "70");

    assertTrue(model.assessment() instanceof Assessment.Unsolved);
    assertEquals("70", ((TextField) robot.lookup("#head-angle").query()).getText());
  }

  @Test
  void asksForTheBodyOnlyWhereVdiNeedsIt() {
    assertFalse(isShown("#body-diameter"));

    robot.interact(
        () ->
            model.change(
                "Wide",
                sketch ->
                    sketch.withJoint(
                        joint ->
                            joint
                                .withElement(2, joint.elements().get(2).withOutline(Outline.WIDE))
                                .withElement(
                                    3, joint.elements().get(3).withOutline(Outline.WIDE)))));
    WaitForAsyncUtils.waitForFxEvents();

    assertTrue(isShown("#body-diameter"));
  }

  @Test
  void saysWhatBecameOfAWasherAndWhy() {
    assertTrue(text("#head-washer-why").startsWith("from the head's edge: overhang"));

    choose("#head-washer-rule", "whole washer");

    assertEquals(WasherRule.WHOLE_WASHER, model.sketch().joint().headWasherRule());
    assertFalse(isShown("#head-washer-why"));
  }

  @Test
  void theSelectedPartHasItsFields() {
    assertFalse(isShown("#part-section"));

    robot.interact(() -> model.select(Part.element(3)));
    assertEquals("Layer, no. 4", text("#part-section .section-heading"));
    assertFalse(isShown("#part-diameter"));
    enter("#part-left", "24");
    assertEquals(new Outline.Strip(24, 60), model.sketch().joint().elements().get(3).outline());

    robot.interact(() -> model.select(Part.element(0)));
    assertEquals("Washer, no. 1", text("#part-section .section-heading"));
    assertFalse(isShown("#part-left"));
    assertEquals("20", ((TextField) robot.lookup("#part-diameter").query()).getText());
  }

  @Test
  void typingInOnePartThenAnotherIsTwoSteps() {
    robot.interact(() -> model.select(Part.element(1)));
    enter("#part-thickness", "12");
    robot.interact(() -> model.select(Part.element(2)));
    enter("#part-thickness", "7");

    robot.interact(model::undo);

    assertEquals(12, model.sketch().joint().elements().get(1).thickness());
    assertEquals(6, model.sketch().joint().elements().get(2).thickness());
  }

  @Test
  void theOutlineOfAPartCanChangeItsKind() {
    robot.interact(() -> model.select(Part.element(1)));

    choose("#part-outline", "round");
    enter("#part-diameter", "44");

    assertEquals(new Outline.Round(44), model.sketch().joint().elements().get(1).outline());
  }

  @Test
  void namesMaterialAndHoleArriveInThePart() {
    robot.interact(() -> model.select(Part.element(1)));

    enter("#part-name", "Lid");
    choose("#part-material", "aluminium 6061");
    enter("#part-hole", "12");

    assertEquals("Lid", model.sketch().joint().elements().get(1).name());
    assertEquals("aluminium 6061", model.sketch().joint().elements().get(1).material().name());
    assertEquals(12, model.sketch().joint().elements().get(1).hole());
  }

  @Test
  void aTypedModulusMakesAnOwnMaterial() {
    robot.interact(() -> model.select(Part.element(1)));

    enter("#part-modulus", "195");
    enter("#part-modulus", "30 Mpsi");

    Material own = model.sketch().joint().elements().get(1).material();
    assertEquals("carbon steel (generic), own E", own.name());
    // 1 psi = 4.4482216152605 N / (25.4 mm)²
    assertEquals(30e6 * 4.4482216152605 / (25.4 * 25.4), own.modulus(), 1e-6);

    robot.clickOn("#fold-faces-bore-material");
    enter("#bolt-modulus", "193");
    assertEquals(193_000, fastener().material().modulus());
  }

  @Test
  void tellsWhereAValueComesFrom() {
    robot.moveTo("#strength");
    WaitForAsyncUtils.waitForFxEvents();
    Labeled field = robot.lookup("#strength").queryLabeled();

    assertEquals("8.8", field.getText());
    assertTrue(
        ((javafx.scene.control.Control) field)
            .getProperties().values().stream()
                .filter(javafx.scene.control.Tooltip.class::isInstance)
                .map(tooltip -> ((javafx.scene.control.Tooltip) tooltip).getText())
                .anyMatch(text -> text.contains("ISO 898-1")));
  }
}

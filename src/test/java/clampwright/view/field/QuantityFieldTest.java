package clampwright.view.field;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.edit.SketchModel;
import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.joint.Tightening;
import clampwright.quantity.Dimension;
import clampwright.quantity.UnitSystem;
import clampwright.view.Sketches;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.scene.Scene;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.VBox;
import javafx.stage.Stage;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** What a person can do with a number field. */
@ExtendWith(ApplicationExtension.class)
class QuantityFieldTest {
  private static final SketchNumber THICKNESS =
      SketchNumber.required(
          "Thickness",
          Dimension.LENGTH,
          sketch -> sketch.joint().elements().get(1).thickness(),
          (sketch, value) ->
              sketch.withJoint(
                  joint -> joint.withElement(1, joint.elements().get(1).withThickness(value))));
  private static final SketchNumber PRELOAD =
      SketchNumber.required(
          "Preload",
          Dimension.FORCE,
          sketch -> ((Target.Force) sketch.joint().tightening().target()).force(),
          (sketch, value) ->
              sketch.withJoint(joint -> joint.withTightening(Tightening.force(value))));
  private static final SketchNumber LENGTH =
      SketchNumber.optional(
          "Bolt length",
          Dimension.LENGTH,
          sketch -> sketch.joint().fastener().length(),
          (sketch, value) ->
              sketch.withJoint(joint -> joint.withFastener(joint.fastener().withLength(value))));

  private SketchModel model;
  private QuantityField thickness;
  private QuantityField preload;
  private QuantityField length;
  private FxRobot robot;

  @Start
  void start(Stage stage) {
    model = new SketchModel(Sketches.cover());
    thickness = new QuantityField(model, THICKNESS);
    preload = new QuantityField(model, PRELOAD);
    length = new QuantityField(model, LENGTH);
    stage.setScene(new Scene(new VBox(10, thickness, preload, length), 400, 300));
    stage.show();
  }

  @BeforeEach
  void takeRobot(FxRobot robot) {
    this.robot = robot;
  }

  private void type(QuantityField field, String text) {
    robot.interact(
        () -> {
          field.text().requestFocus();
          field.text().selectAll();
        });
    robot.write(text);
  }

  private void enter(QuantityField field, String text) {
    type(field, text);
    robot.type(KeyCode.ENTER);
  }

  private double millimetres() {
    return THICKNESS.read().apply(model.sketch()).getAsDouble();
  }

  private double newtons() {
    return PRELOAD.read().apply(model.sketch()).getAsDouble();
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "6; 6",
        "6,5; 6.5",
        "6.5; 6.5",
        "6.5 mm; 6.5",
        "1/4 in; 6.35",
        "0.25in; 6.35",
        "0,25 in; 6.35",
        "1 1/4 in; 31.75",
      })
  void takesEveryFormOfALength(String text, double millimetres) {
    enter(thickness, text);

    assertEquals(millimetres, millimetres(), 1e-12);
    assertFalse(thickness.isWrong());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {"1/4; 6.35", "0,5; 12.7", "6.5 mm; 6.5"})
  void readsInchesWhereTheSketchShowsThem(String text, double millimetres) {
    robot.interact(() -> model.change("Units", sketch -> sketch.withUnits(UnitSystem.INCH)));

    enter(thickness, text);

    assertEquals(millimetres, millimetres(), 1e-12);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "abc; 'abc' is not a number",
        "3,14abc; 'abc' is no unit here",
        "1.234,5; One decimal mark only",
        "12 kN; 'kN' is no unit here",
        "0; Thickness must be above 0",
        "-2; Thickness must be above 0",
      })
  void keepsWrongTextAndSaysWhy(String text, String sentence) {
    Sketch before = model.sketch();

    enter(thickness, text);

    assertEquals(text, thickness.text().getText());
    assertTrue(
        thickness.problemProperty().get().startsWith(sentence), thickness.problemProperty().get());
    assertEquals(thickness.problemProperty().get(), thickness.text().getAccessibleHelp());
    assertEquals(before, model.sketch());
  }

  @Test
  void showsWhatIsWrongUnderTheFieldWhileItHasTheFocus() {
    enter(thickness, "abc");

    assertTrue(robot.lookup(".problem-note").tryQuery().isPresent());

    robot.interact(() -> preload.text().requestFocus());

    assertFalse(robot.lookup(".problem-note").tryQuery().isPresent());
    assertEquals("abc", thickness.text().getText());
  }

  @Test
  void wrongTextStaysWhileOtherNumbersChange() {
    enter(thickness, "abc");

    enter(preload, "30");

    assertEquals(30_000, newtons());
    assertEquals("abc", thickness.text().getText());
    assertTrue(thickness.isWrong());
  }

  @Test
  void takesEffectAfterAPauseWithoutEnter() throws TimeoutException {
    type(preload, "31");

    WaitForAsyncUtils.waitFor(5, TimeUnit.SECONDS, () -> newtons() == 31_000);
    assertEquals("31", preload.text().getText());
  }

  @Test
  void typingInOneFieldIsOneStep() throws TimeoutException {
    type(preload, "3");
    WaitForAsyncUtils.waitFor(5, TimeUnit.SECONDS, () -> newtons() == 3_000);
    robot.write("1");
    WaitForAsyncUtils.waitFor(5, TimeUnit.SECONDS, () -> newtons() == 31_000);
    robot.type(KeyCode.ENTER);

    robot.interact(model::undo);

    assertEquals(25_000, newtons());
    assertEquals("", model.undoNameProperty().get());
  }

  @Test
  void losingTheFocusTakesOver() {
    type(preload, "12,5");

    robot.interact(() -> thickness.text().requestFocus());

    assertEquals(12_500, newtons());
    assertEquals("12.5", preload.text().getText());
  }

  @Test
  void escapeGivesTheTextUp() {
    type(preload, "12x");

    robot.type(KeyCode.ESCAPE);

    assertEquals("25", preload.text().getText());
    assertEquals(25_000, newtons());
    assertEquals("", model.undoNameProperty().get());
  }

  @Test
  void escapeTakesBackWhatTookEffectWhileTyping() throws TimeoutException {
    type(preload, "31");
    WaitForAsyncUtils.waitFor(5, TimeUnit.SECONDS, () -> newtons() == 31_000);

    robot.type(KeyCode.ESCAPE);

    assertEquals(25_000, newtons());
    assertEquals("25", preload.text().getText());
  }

  @Test
  void arrowKeysStep() {
    robot.interact(() -> thickness.text().requestFocus());

    robot.type(KeyCode.UP);
    assertEquals(9.5, millimetres(), 1e-12);
    robot.type(KeyCode.DOWN);
    robot.type(KeyCode.DOWN);
    assertEquals(8.5, millimetres(), 1e-12);
  }

  @Test
  void arrowKeysDoNotStepBelowWhatIsPossible() {
    enter(thickness, "0.5");

    robot.type(KeyCode.DOWN);

    assertEquals(0.5, millimetres());
    assertEquals("Thickness must be above 0.", thickness.problemProperty().get());
  }

  @Test
  void emptyLeavesAnOptionalNumberToTheProgram() {
    robot.interact(() -> length.setAutomatic(java.util.OptionalDouble.of(60)));
    enter(length, "55");
    assertEquals(55, model.sketch().joint().fastener().length().getAsDouble());

    robot.interact(() -> length.text().selectAll());
    robot.type(KeyCode.BACK_SPACE).type(KeyCode.ENTER);

    assertTrue(model.sketch().joint().fastener().length().isEmpty());
    assertEquals("auto 60", length.text().getPromptText());
  }

  @Test
  void emptyIsWrongWhereANumberIsNeeded() {
    robot.interact(
        () -> {
          preload.text().requestFocus();
          preload.text().selectAll();
        });
    robot.type(KeyCode.BACK_SPACE).type(KeyCode.ENTER);

    assertTrue(preload.problemProperty().get().startsWith("Type a number"));
    assertEquals(25_000, newtons());
  }

  @Test
  void followsTheUnitsOfTheSketch() {
    TextField text = thickness.text();
    assertEquals("9", text.getText());

    robot.interact(() -> model.change("Units", sketch -> sketch.withUnits(UnitSystem.INCH)));

    assertEquals("0.35433", text.getText());
    assertEquals(9, millimetres());
  }

  @Test
  void lookingAtARoundedNumberDoesNotChangeIt() {
    robot.interact(() -> model.change("Units", sketch -> sketch.withUnits(UnitSystem.INCH)));
    robot.interact(() -> preload.text().requestFocus());

    robot.interact(() -> thickness.text().requestFocus());
    robot.type(KeyCode.ENTER);
    robot.interact(() -> preload.text().requestFocus());

    assertEquals(9, millimetres());
    assertEquals("Units", model.undoNameProperty().get());
  }

  @Test
  void undoElsewhereShowsInTheField() {
    enter(preload, "30");
    assertEquals("Preload", model.undoNameProperty().get());

    robot.interact(model::undo);

    assertEquals("25", preload.text().getText());
  }
}

package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.edit.SketchModel;
import clampwright.figure.Sentences;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.mechanics.checks.Verdict;
import clampwright.quantity.UnitSystem;
import clampwright.store.SketchFile;
import clampwright.store.Stored;
import clampwright.view.MathText;
import clampwright.view.Sketches;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.scene.Node;
import javafx.scene.control.Labeled;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.stage.Stage;
import javafx.stage.WindowEvent;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** The window as a whole, by mouse and keyboard. */
@ExtendWith(ApplicationExtension.class)
class WindowTest {
  @TempDir static Path folder;

  private final Answers answers = new Answers();
  private Stage stage;
  private SketchModel model;
  private Settings settings;
  private MainWindow window;
  private FxRobot robot;

  @Start
  void start(Stage stage) {
    this.stage = stage;
    model = new SketchModel(Sketches.cover());
    settings = Settings.of(folder.resolve("none").resolve(getClass().getName() + hashCode()));
    window = new MainWindow(stage, model, settings, answers, answers);
    stage.show();
  }

  @BeforeEach
  void waitForAllParts(FxRobot robot) throws TimeoutException {
    this.robot = robot;
    WaitForAsyncUtils.waitFor(10, TimeUnit.SECONDS, () -> window.isComplete());
    WaitForAsyncUtils.waitForFxEvents();
  }

  private String text(String query) {
    return robot.lookup(query).queryLabeled().getText();
  }

  private boolean isShown(String query) {
    Optional<Node> node = robot.lookup(query).tryQuery();
    return node.isPresent() && isTreeVisible(node.get());
  }

  private static boolean isTreeVisible(Node node) {
    for (Node at = node; at != null; at = at.getParent()) {
      if (!at.isVisible()) {
        return false;
      }
    }
    return true;
  }

  private void enter(String field, String text) {
    focus(field);
    robot.write(text).type(KeyCode.ENTER);
    WaitForAsyncUtils.waitForFxEvents();
  }

  private void focus(String field) {
    robot.interact(
        () -> {
          TextField text = robot.lookup(field).query();
          text.requestFocus();
          text.selectAll();
        });
  }

  private void press(KeyCode... keys) {
    robot.push(keys);
    WaitForAsyncUtils.waitForFxEvents();
  }

  private double newtons() {
    return ((Target.Force) model.sketch().joint().tightening().target()).force();
  }

  @Test
  void namesTheSketchInItsTitle() {
    assertEquals("Pump cover — Clampwright", stage.getTitle());

    enter("#sketch-name", "Valve body");

    assertEquals("Valve body — Clampwright", stage.getTitle());
    assertTrue(isShown("#unsaved"));
  }

  @Test
  void undoAndRedoNameTheirStep() {
    enter("#preload", "30");

    robot.clickOn("Edit");
    assertTrue(robot.lookup("Undo: Preload").tryQuery().isPresent());
    robot.clickOn("Undo: Preload");
    assertEquals(25_000, newtons());

    robot.clickOn("Edit");
    robot.clickOn("Redo: Preload");
    assertEquals(30_000, newtons());
  }

  @Test
  void undoInATextFieldUndoesTheSketch() {
    enter("#preload", "30");
    enter("#axial-load", "8");

    press(KeyCode.SHORTCUT, KeyCode.Z);
    assertEquals(6_000, model.sketch().joint().service().loads().get(0).axialMax());
    assertEquals("6", ((TextField) robot.lookup("#axial-load").query()).getText());

    press(KeyCode.SHORTCUT, KeyCode.Z);
    assertEquals(25_000, newtons());

    press(KeyCode.SHORTCUT, KeyCode.Y);
    assertEquals(30_000, newtons());
  }

  @Test
  void undoTakesTextThatIsWrongBackFirst() {
    enter("#preload", "30");
    enter("#preload", "abc");

    press(KeyCode.SHORTCUT, KeyCode.Z);
    assertEquals("30", ((TextField) robot.lookup("#preload").query()).getText());
    assertEquals(30_000, newtons());

    press(KeyCode.SHORTCUT, KeyCode.Z);
    assertEquals(25_000, newtons());
  }

  @Test
  void deleteInATextFieldDeletesTextNotParts() {
    robot.interact(() -> model.select(Part.element(1)));
    focus("#preload");

    press(KeyCode.DELETE);

    assertEquals(4, model.sketch().joint().elements().size());
    assertEquals("", ((TextField) robot.lookup("#preload").query()).getText());
  }

  @Test
  void switchingUnitsDoesNotChangeTheJoint() {
    Joint joint = model.sketch().joint();
    assertTrue(text("#found-members .readout-unit").equals("kN/mm"));

    robot.clickOn("#inch");

    assertEquals(joint, model.sketch().joint());
    assertEquals(UnitSystem.INCH, model.sketch().units());
    assertEquals("Mlbf/in", text("#found-members .readout-unit"));
    assertEquals("lbf", text("#found-parting-load .readout-unit"));
    assertEquals("5620.2", ((TextField) robot.lookup("#preload").query()).getText());

    press(KeyCode.SHORTCUT, KeyCode.U);
    assertEquals(joint, model.sketch().joint());
    assertEquals("25", ((TextField) robot.lookup("#preload").query()).getText());
  }

  @Test
  void anImpossibleJointShowsReasonsAndNoNumbersAndRecovers() {
    assertTrue(isShown("#found-members"));
    robot.interact(() -> model.select(Part.element(1)));

    enter("#part-hole", "40");

    assertFalse(isShown("#found-members"));
    assertFalse(isShown(".method-list"));
    assertTrue(isShown("#reasons .remark"));
    assertEquals("", text("#schedule-2 .effective"));

    robot.interact(() -> model.select(Part.JOINT));
    robot.clickOn("#reasons .remark");
    assertEquals(Part.element(1), model.selection());

    enter("#part-hole", "11");
    assertTrue(isShown("#found-members"));
    assertFalse(isShown("#reasons .remark"));
  }

  @Test
  void theScheduleAndTheSelectionAreOne() {
    robot.clickOn("#schedule-4 .part");
    assertEquals(Part.element(3), model.selection());
    assertEquals("Layer, no. 4", text("#part-section .section-heading"));

    robot.interact(() -> model.select(Part.element(2)));
    assertTrue(
        robot.lookup("#schedule-3").query().getPseudoClassStates().toString().contains("selected"));
    assertFalse(
        robot.lookup("#schedule-4").query().getPseudoClassStates().toString().contains("selected"));

    robot.clickOn("#schedule-1 .part");
    press(KeyCode.DOWN);
    assertEquals(Part.element(1), model.selection());
  }

  @Test
  void aCellOfTheScheduleTakesATypedThickness() {
    robot.clickOn("#schedule-2 .thickness");
    robot.clickOn("#schedule-2 .thickness");
    robot.write("12,5").type(KeyCode.ENTER);
    WaitForAsyncUtils.waitForFxEvents();

    assertEquals(12.5, model.sketch().joint().elements().get(1).thickness());
    assertEquals("12.50", text("#schedule-2 .thickness"));
    assertEquals("Thickness", model.undoNameProperty().get());
  }

  @Test
  void wrongTextInACellStaysThere() {
    robot.clickOn("#schedule-2 .thickness");
    robot.clickOn("#schedule-2 .thickness");
    robot.write("x").type(KeyCode.ENTER);
    robot.clickOn("#schedule-3 .part");

    TextField text = robot.lookup("#schedule-2 .text-field").query();
    assertEquals("x", text.getText());
    assertEquals(9, model.sketch().joint().elements().get(1).thickness());
  }

  @Test
  void movesDeletesAndInsertsByKey() {
    robot.clickOn("#schedule-2 .part");

    press(KeyCode.ALT, KeyCode.DOWN);
    assertEquals("Cover", model.sketch().joint().elements().get(2).name());
    assertEquals(Part.element(2), model.selection());
    press(KeyCode.DELETE);
    assertEquals(3, model.sketch().joint().elements().size());
    assertEquals("Delete Cover", model.undoNameProperty().get());
    press(KeyCode.SHORTCUT, KeyCode.J);
    assertTrue(model.sketch().joint().elements().get(3).isWasher());
  }

  @Test
  void switchesBetweenLightAndDark() {
    assertTrue(stage.getScene().getStylesheets().toString().contains("light.css"));

    robot.clickOn("#look");

    assertTrue(stage.getScene().getStylesheets().toString().contains("dark.css"));
    assertTrue(settings.values().dark);
  }

  @Test
  void savingTakesOverWhatIsBeingTyped() {
    Path file = folder.resolve("typed.joint.json");
    answers.save = Optional.of(file);
    focus("#preload");
    robot.write("31,5");

    press(KeyCode.SHORTCUT, KeyCode.S);

    Stored.Opened stored = (Stored.Opened) SketchFile.read(file);
    assertEquals(31_500, ((Target.Force) stored.sketch().joint().tightening().target()).force());
    assertFalse(model.unsavedProperty().get());
  }

  @Test
  void savingSaysWhatCouldNotBeTakenOver() {
    answers.save = Optional.of(folder.resolve("untaken.joint.json"));
    enter("#preload", "abc");

    press(KeyCode.SHORTCUT, KeyCode.S);

    assertTrue(text("#hint").startsWith("Saved as untaken.joint.json."), text("#hint"));
    assertTrue(text("#hint").contains("could not be taken over"), text("#hint"));
    assertEquals("abc", ((TextField) robot.lookup("#preload").query()).getText());
  }

  @Test
  void savedAndOpenedThroughTheWindowIsTheSame() {
    Path file = folder.resolve("round-trip.joint.json");
    answers.save = Optional.of(file);
    enter("#preload", "28");
    Sketch saved = model.sketch();
    press(KeyCode.SHORTCUT, KeyCode.S);
    press(KeyCode.SHORTCUT, KeyCode.N);
    assertFalse(saved.equals(model.sketch()));
    answers.open = Optional.of(file);

    press(KeyCode.SHORTCUT, KeyCode.O);

    assertEquals(saved, model.sketch());
    assertEquals("28", ((TextField) robot.lookup("#preload").query()).getText());
  }

  @Test
  void anOpenedSketchClearsTextThatWasWrong() {
    enter("#preload", "abc");

    press(KeyCode.SHORTCUT, KeyCode.N);

    assertFalse("abc".equals(((TextField) robot.lookup("#preload").query()).getText()));
  }

  @Test
  void closingAsksForUnsavedWork() {
    enter("#preload", "30");
    answers.unsaved = Questions.Unsaved.CANCEL;

    robot.interact(() -> stage.fireEvent(new WindowEvent(stage, WindowEvent.WINDOW_CLOSE_REQUEST)));
    assertEquals(1, answers.asked.size());
    assertTrue(stage.isShowing());

    answers.unsaved = Questions.Unsaved.DISCARD;
    robot.interact(window::close);
    assertEquals(2, answers.asked.size());
    assertFalse(stage.isShowing());
  }

  @Test
  void noTwoCommandsShareAKey() {
    List<KeyCombination> keys =
        new WindowCommands(window, model, window.documents())
            .commands().menus().values().stream()
                .flatMap(List::stream)
                .flatMap(command -> command.keys().stream())
                .toList();

    assertEquals(new HashSet<>(keys).size(), keys.size(), keys.toString());
  }

  @Test
  void theKeyboardPageListsTheBindings() {
    press(KeyCode.SHORTCUT, KeyCode.K);

    assertTrue(robot.lookup("Insert layer").tryQuery().isPresent());
    assertTrue(robot.lookup("Suspend snapping").tryQuery().isPresent());
    assertTrue(
        robot.lookup(".keys .label").queryAll().stream()
            .anyMatch(node -> ((Labeled) node).getText().contains("Ctrl+Shift+S")));
  }

  @Test
  void aReadoutOpensItsWorkingUntilAPartIsSelected() {
    String effective = text("#schedule-2 .effective");
    robot.clickOn("#found-parting-load");
    assertEquals("Parting load", title());
    assertTrue(results().contains("= " + text("#found-parting-load-value") + " kN"));

    robot.interact(() -> model.select(Part.element(1)));
    WaitForAsyncUtils.waitForFxEvents();
    assertTrue(title().startsWith("Cover"), title());
    assertTrue(results().contains("= " + effective + " mm"));
  }

  @Test
  void theWorkingFollowsTheSketchAlsoAfterItWasHidden() {
    press(KeyCode.SHORTCUT, KeyCode.DIGIT2);
    press(KeyCode.SHORTCUT, KeyCode.DIGIT1);
    enter("#preload", "30");
    robot.clickOn("#found-parting-load");

    assertTrue(results().contains("= " + text("#found-parting-load-value") + " kN"));
  }

  private String title() {
    return robot.lookup("#working-title").queryAs(MathText.class).text();
  }

  private List<String> results() {
    return robot.lookup(".step-result").queryAllAs(MathText.class).stream()
        .map(MathText::text)
        .toList();
  }

  @Test
  void aCheckOpensItsWorking() {
    robot.interact(
        () -> ((javafx.scene.control.Button) robot.lookup("#check-parting").query()).fire());
    WaitForAsyncUtils.waitForFxEvents();
    assertEquals("Check: parting", title());
  }

  /** Of all checks of this sketch thread stripping leaves the least. */
  @Test
  void theLeastMarginStandsUnderTheReadouts() {
    double least = Double.POSITIVE_INFINITY;
    String name = "";
    for (Verdict verdict : model.verdicts()) {
      if (verdict instanceof Verdict.Judged judged && judged.margin() < least) {
        least = judged.margin();
        name = Sentences.check(judged.kind());
      }
    }
    javafx.scene.control.Button worst = robot.lookup("#check-worst").query();
    assertTrue(worst.getAccessibleText().startsWith("least margin: " + name + ", margin"));
    robot.interact(worst::fire);
    WaitForAsyncUtils.waitForFxEvents();
    assertEquals("Check: " + name, title());
  }

  @Test
  void theFigureIsExportedWithWhatWasChosen() throws java.io.IOException {
    Path file = folder.resolve("figure-" + hashCode() + ".png");
    answers.save = Optional.of(file);
    press(KeyCode.SHORTCUT, KeyCode.P);
    assertTrue(isShown("#picture-preview"));
    robot.clickOn("#picture-show-ladder");
    robot.clickOn("#picture-save");
    byte[] bytes = java.nio.file.Files.readAllBytes(file);
    assertEquals("PNG", new String(bytes, 1, 3, java.nio.charset.StandardCharsets.US_ASCII));
    assertEquals(List.of("Pump cover.png"), answers.suggested);
    assertFalse(isShown("#picture-preview"));
  }

  @Test
  void theScheduleIsExported() throws java.io.IOException {
    Path file = folder.resolve("schedule-" + hashCode() + ".csv");
    answers.save = Optional.of(file);
    press(KeyCode.SHORTCUT, KeyCode.SHIFT, KeyCode.P);
    assertEquals(5, java.nio.file.Files.readAllLines(file).size());
  }

  @Test
  void theDrawerClosesAndOpens() {
    robot.clickOn("#close-drawer");
    assertFalse(isShown("#schedule-1"));

    press(KeyCode.SHORTCUT, KeyCode.E);
    assertTrue(isShown("#schedule-1"));
  }
}

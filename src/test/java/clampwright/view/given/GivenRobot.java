package clampwright.view.given;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.edit.SketchModel;
import clampwright.joint.Joint;
import clampwright.joint.Sketch;
import clampwright.view.field.QuantityField;
import clampwright.view.field.Typed;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.ListCell;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.testfx.api.FxRobot;
import org.testfx.util.WaitForAsyncUtils;

/** Fills in the fields of a given pane as a person does. */
final class GivenRobot {
  final SketchModel model;
  private final FxRobot robot = new FxRobot();

  GivenRobot(Stage stage, Sketch sketch) {
    model = new SketchModel(sketch);
    stage.setScene(new Scene(new GivenPane(model), 300, 1150));
    stage.show();
  }

  Joint joint() {
    return model.sketch().joint();
  }

  void run(Runnable change) {
    robot.interact(change);
    WaitForAsyncUtils.waitForFxEvents();
  }

  void undo() {
    run(model::undo);
  }

  void focus(String field) {
    run(
        () -> {
          TextField input = robot.lookup(field).query();
          input.requestFocus();
          input.selectAll();
        });
  }

  void enter(String field, String text) {
    focus(field);
    if (text.isEmpty()) {
      robot.type(KeyCode.BACK_SPACE);
    }
    robot.write(text).type(KeyCode.ENTER);
    WaitForAsyncUtils.waitForFxEvents();
  }

  /** Presses a button that may lie outside what the pane shows. */
  void press(String button) {
    run(() -> ((Button) robot.lookup(button).query()).fire());
  }

  List<String> offered(String field) {
    press(field);
    List<String> labels =
        robot.lookup(".list-cell").queryAll().stream()
            .map(node -> ((ListCell<?>) node).getText())
            .filter(label -> label != null)
            .toList();
    robot.type(KeyCode.ESCAPE);
    return labels;
  }

  void choose(String field, String label) {
    press(field);
    Node cell =
        robot.lookup(".list-cell").queryAll().stream()
            .filter(node -> label.equals(((ListCell<?>) node).getText()))
            .findFirst()
            .orElseThrow(() -> new AssertionError("no " + label + " in the list"));
    robot.clickOn(cell);
    WaitForAsyncUtils.waitForFxEvents();
  }

  String label(String query) {
    return robot.lookup(query).queryLabeled().getText();
  }

  TextField input(String query) {
    return robot.lookup(query).query();
  }

  boolean isEnabled(String query) {
    return !robot.lookup(query).query().isDisabled();
  }

  boolean isShown(String query) {
    Optional<Node> found = robot.lookup(query).tryQuery();
    for (Node at = found.orElse(null); at != null; at = at.getParent()) {
      if (!at.isVisible()) {
        return false;
      }
    }
    return found.isPresent();
  }

  /** Types a right number: it arrives, as one step of this name, and undo takes it back. */
  void assertTakes(String field, String text, String step, Function<Joint, Object> read) {
    Object before = read.apply(joint());
    run(() -> model.endTyping());

    enter(field, text);

    Object after = read.apply(joint());
    assertNotEquals(before, after);
    assertEquals(step, model.undoNameProperty().get());
    undo();
    assertEquals(before, read.apply(joint()));
    run(model::redo);
    assertEquals(after, read.apply(joint()));
  }

  /** Types a wrong number: the text stays, a sentence says why, nothing else changes. */
  void assertRefuses(String field, String text, String sentence) {
    Sketch before = model.sketch();
    String step = model.undoNameProperty().get();

    enter(field, text);

    QuantityField around = (QuantityField) Typed.around(input(field));
    assertEquals(sentence, around.problemProperty().get());
    assertTrue(around.isWrong());
    assertEquals(text, input(field).getText());
    assertEquals(before, model.sketch());
    assertEquals(step, model.undoNameProperty().get());
  }
}

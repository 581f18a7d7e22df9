package clampwright.view.field;

import clampwright.edit.SketchModel;
import clampwright.joint.Sketch;
import clampwright.quantity.Quantities;
import clampwright.quantity.Reading;
import clampwright.quantity.UnitSystem;
import java.util.List;
import java.util.OptionalDouble;
import javafx.animation.PauseTransition;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.css.PseudoClass;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.StackPane;
import javafx.util.Duration;

/**
 * A field for one number of the sketch, in the reader's units. What is typed takes effect after a
 * short pause, on Enter and when the field loses the focus, as one step of the history; Escape
 * takes it back; the up and down keys step. A text that cannot be taken over stays, with a red edge
 * and a sentence that says why.
 */
public final class QuantityField extends StackPane implements Typed {
  private static final PseudoClass WRONG = PseudoClass.getPseudoClass("wrong");

  /** Long enough not to take "6.5 m" on the way to "6.5 mm". */
  private static final Duration PAUSE = Duration.millis(450);

  private final SketchModel model;
  private final SketchNumber number;
  private final TextField text = new TextField();
  private final Label unit = new Label();
  private final ReadOnlyStringWrapper problem = new ReadOnlyStringWrapper("");
  private final PauseTransition pause = new PauseTransition(PAUSE);

  /** What the sketch holds, as last seen; decides whether text that is wrong is out of date. */
  private OptionalDouble held = OptionalDouble.empty();

  private OptionalDouble before = OptionalDouble.empty();
  private UnitSystem units = UnitSystem.METRIC;
  private OptionalDouble automatic = OptionalDouble.empty();
  private String open = "auto";
  private boolean typing;
  private boolean showing;

  public QuantityField(SketchModel model, SketchNumber number) {
    this.model = model;
    this.number = number;
    getStyleClass().add("quantity-field");
    unit.getStyleClass().add("unit");
    unit.setMouseTransparent(true);
    text.setAlignment(Pos.CENTER_RIGHT);
    StackPane.setAlignment(unit, Pos.CENTER_RIGHT);
    getChildren().addAll(text, unit);
    text.setAccessibleText(number.name());
    text.textProperty().addListener(observable -> edited());
    text.focusedProperty().addListener((observable, was, is) -> focusMoved(is));
    text.setOnAction(event -> commit());
    text.addEventFilter(KeyEvent.KEY_PRESSED, this::keyPressed);
    pause.setOnFinished(event -> takeOver());
    model.sketchProperty().addListener((observable, old, sketch) -> follow(sketch));
    new ProblemNote(this, text);
    refresh();
    showUnit();
  }

  /** Reads the sketch again, as when the number now stands for another part. */
  public void refresh() {
    follow(model.sketch());
  }

  /** The text field itself, to be given an id or the focus. */
  public TextField text() {
    return text;
  }

  /** What is wrong with the text; empty when nothing is. */
  public ReadOnlyStringProperty problemProperty() {
    return problem.getReadOnlyProperty();
  }

  /** Shows what an empty field comes to [units inside the program]. */
  public void setAutomatic(OptionalDouble automatic) {
    this.automatic = automatic;
    showPrompt();
  }

  /** Says what an empty field means where the program has no number for it. */
  public void setOpen(String open) {
    this.open = open;
    showPrompt();
  }

  @Override
  public boolean isWrong() {
    return !problem.get().isEmpty();
  }

  @Override
  public void commit() {
    if (typing && takeOver()) {
      typing = false;
      model.endTyping();
      show();
    }
  }

  @Override
  public void restore() {
    pause.stop();
    typing = false;
    say("");
    show();
  }

  private void edited() {
    if (showing) {
      return;
    }
    if (!typing) {
      typing = true;
      before = held;
    }
    say("");
    pause.playFromStart();
  }

  /** Whether the text could be taken over. */
  private boolean takeOver() {
    pause.stop();
    if (number.optional() && text.getText().isBlank()) {
      return write(OptionalDouble.empty());
    }
    Reading reading = Reading.of(text.getText(), number.dimension(), units);
    if (reading instanceof Reading.Wrong wrong) {
      say(wrong.problem());
      return false;
    }
    return write(OptionalDouble.of(((Reading.Value) reading).value()));
  }

  private boolean write(OptionalDouble value) {
    try {
      number.write().apply(model.sketch(), value);
    } catch (IllegalArgumentException refused) {
      say(FieldText.refusal(number.dimension(), refused));
      return false;
    }
    say("");
    if (!value.equals(held)) {
      List<Object> place = List.of(this, model.selectionProperty().get());
      model.type(number.name(), place, sketch -> number.write().apply(sketch, value));
    }
    return true;
  }

  private void say(String sentence) {
    problem.set(sentence);
    pseudoClassStateChanged(WRONG, !sentence.isEmpty());
    text.setAccessibleHelp(sentence);
  }

  private void focusMoved(boolean focused) {
    if (!focused) {
      commit();
    }
    if (!typing) {
      show();
    }
  }

  private void keyPressed(KeyEvent event) {
    switch (event.getCode()) {
      case ESCAPE -> {
        if (typing) {
          takeBack();
          event.consume();
        }
      }
      case UP, DOWN -> {
        boolean up = event.getCode() == KeyCode.UP;
        step((up ? 1 : -1) * (event.isShiftDown() ? 10 : 1));
        event.consume();
      }
      default -> {
        // Everything else is the text field's own.
      }
    }
  }

  private void takeBack() {
    OptionalDouble original = before;
    boolean changed = !original.equals(held);
    restore();
    if (changed) {
      write(original);
      model.endTyping();
      show();
    }
  }

  private void step(int steps) {
    if (typing && !takeOver()) {
      return;
    }
    OptionalDouble from = held.isPresent() ? held : automatic;
    if (from.isPresent()) {
      double to = FieldText.stepped(number.dimension(), units, from.getAsDouble(), steps);
      typing = false;
      write(OptionalDouble.of(to));
      show();
    }
  }

  private void follow(Sketch sketch) {
    OptionalDouble value = number.read().apply(sketch);
    boolean unitsChanged = sketch.units() != units;
    boolean changed = !value.equals(held);
    held = value;
    units = sketch.units();
    boolean mine = !changed || text.isFocused() && !isWrong();
    if (typing && mine) {
      showUnit();
      return;
    }
    if (changed || unitsChanged) {
      restore();
    }
  }

  private void show() {
    String shown =
        held.isEmpty() ? "" : FieldText.of(number.dimension(), units, held.getAsDouble());
    showing = true;
    if (!shown.equals(text.getText())) {
      text.setText(shown);
    }
    showing = false;
    showUnit();
  }

  private void showUnit() {
    String symbol = Quantities.unit(number.dimension(), units);
    if (!symbol.equals(unit.getText())) {
      unit.setText(symbol);
      getStyleClass().remove("with-unit");
      if (!symbol.isEmpty()) {
        getStyleClass().add("with-unit");
      }
    }
    showPrompt();
  }

  private void showPrompt() {
    text.setPromptText(
        !number.optional()
            ? ""
            : automatic.isEmpty()
                ? open
                : "auto " + FieldText.of(number.dimension(), units, automatic.getAsDouble()));
  }
}

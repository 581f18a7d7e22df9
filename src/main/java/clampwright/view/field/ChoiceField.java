package clampwright.view.field;

import clampwright.edit.SketchModel;
import clampwright.joint.Sketch;
import clampwright.view.Hover;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Button;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;

/**
 * A field for one value of the sketch that is chosen from a list. The list is made when it opens,
 * so that the tables need not be read before anyone asks for them. Its tooltip tells where the
 * value comes from.
 */
public final class ChoiceField<T> extends Button {
  private final SketchModel model;
  private final SketchChoice<T> choice;
  private final Consumer<T> taken;
  private Optional<T> held = Optional.empty();

  public ChoiceField(SketchModel model, SketchChoice<T> choice) {
    this(model, choice, value -> change(model, choice, value));
  }

  /**
   * A field whose choice need not change the sketch, such as what is shown of it.
   *
   * @param taken told what has been chosen, also when it is chosen already
   */
  public ChoiceField(SketchModel model, SketchChoice<T> choice, Consumer<T> taken) {
    this.model = model;
    this.choice = choice;
    this.taken = taken;
    getStyleClass().setAll("choice-field");
    setAccessibleRole(AccessibleRole.COMBO_BOX);
    setMnemonicParsing(false);
    Region chevron = new Region();
    chevron.getStyleClass().add("chevron");
    setGraphic(chevron);
    setMaxWidth(Double.MAX_VALUE);
    setOnAction(event -> open());
    addEventHandler(KeyEvent.KEY_PRESSED, this::keyPressed);
    Hover.tell(this, this::description);
    model.sketchProperty().addListener((observable, old, sketch) -> follow(sketch));
    refresh();
  }

  /** Reads the sketch again, as when the value now stands for another part. */
  public void refresh() {
    follow(model.sketch());
  }

  /** Opens the list under the field. */
  public void open() {
    List<Choice<T>> choices = choice.choices().apply(model.sketch());
    new ChoiceList<>(this, choices, held, taken).show();
  }

  private static <T> void change(SketchModel model, SketchChoice<T> choice, T value) {
    if (!choice.read().apply(model.sketch()).equals(Optional.of(value))) {
      model.change(choice.name(), sketch -> choice.write().apply(sketch, value));
    }
  }

  private void follow(Sketch sketch) {
    Optional<T> value = choice.read().apply(sketch);
    String label = value.map(choice.label()).orElse("");
    held = value;
    if (!label.equals(getText())) {
      setText(label);
      setAccessibleText(choice.name() + ", " + getText());
    }
  }

  private String description() {
    String origin = held.map(value -> choice.origin().apply(model.sketch(), value)).orElse("");
    return origin.isEmpty() ? getText() : getText() + "\n" + origin;
  }

  private void keyPressed(KeyEvent event) {
    switch (event.getCode()) {
      case DOWN, UP, F4 -> {
        open();
        event.consume();
      }
      default -> {
        // Enter and space are the button's own.
      }
    }
  }
}

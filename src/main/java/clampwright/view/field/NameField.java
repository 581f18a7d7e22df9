package clampwright.view.field;

import clampwright.edit.SketchModel;
import clampwright.joint.Sketch;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;

/** A field for one text of the sketch, such as a name. Every text is right. */
public final class NameField extends TextField implements Typed {
  private final SketchModel model;
  private final String step;
  private final Function<Sketch, Optional<String>> read;
  private final BiFunction<Sketch, String, Sketch> write;
  private String before = "";
  private boolean showing;

  public NameField(
      SketchModel model,
      String step,
      Function<Sketch, Optional<String>> read,
      BiFunction<Sketch, String, Sketch> write) {
    this.model = model;
    this.step = step;
    this.read = read;
    this.write = write;
    getStyleClass().add("name-field");
    setAccessibleText(step);
    textProperty().addListener(observable -> edited());
    focusedProperty().addListener((observable, was, is) -> focusMoved(is));
    setOnAction(event -> commit());
    addEventFilter(KeyEvent.KEY_PRESSED, this::keyPressed);
    model.sketchProperty().addListener(observable -> refresh());
    refresh();
  }

  /** Reads the sketch again, as when the name now stands for another part. */
  public void refresh() {
    String held = read.apply(model.sketch()).orElse("");
    if (!held.equals(getText())) {
      showing = true;
      setText(held);
      showing = false;
    }
  }

  @Override
  public void commit() {
    before = getText();
    model.endTyping();
  }

  @Override
  public void restore() {
    refresh();
  }

  @Override
  public boolean isWrong() {
    return false;
  }

  private void edited() {
    if (!showing) {
      String typed = getText();
      List<Object> place = List.of(this, model.selectionProperty().get());
      model.type(step, place, sketch -> write.apply(sketch, typed));
    }
  }

  private void focusMoved(boolean focused) {
    if (focused) {
      before = getText();
    } else {
      commit();
    }
  }

  private void keyPressed(KeyEvent event) {
    if (event.getCode() == KeyCode.ESCAPE && !getText().equals(before)) {
      setText(before);
      model.endTyping();
      event.consume();
    }
  }
}

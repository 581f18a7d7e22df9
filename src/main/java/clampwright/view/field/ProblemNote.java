package clampwright.view.field;

import javafx.geometry.Bounds;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.stage.Popup;

/** The sentence under a field whose text cannot be taken over; shown while the field is in use. */
final class ProblemNote {
  private final QuantityField field;
  private final TextField text;
  private Popup popup;
  private Label sentence;

  ProblemNote(QuantityField field, TextField text) {
    this.field = field;
    this.text = text;
    field.problemProperty().addListener(observable -> update());
    text.focusedProperty().addListener(observable -> update());
    field.hoverProperty().addListener(observable -> update());
  }

  private void update() {
    boolean wanted =
        field.isWrong() && (text.isFocused() || field.isHover()) && field.getScene() != null;
    if (wanted) {
      show();
    } else if (popup != null) {
      popup.hide();
    }
  }

  private void show() {
    if (popup == null) {
      sentence = new Label();
      sentence.getStyleClass().add("problem-note");
      sentence.setWrapText(true);
      sentence.setMaxWidth(280);
      popup = new Popup();
      popup.getContent().add(sentence);
      popup.setHideOnEscape(false);
    }
    sentence.setText(field.problemProperty().get());
    Bounds place = field.localToScreen(field.getBoundsInLocal());
    if (place != null && !popup.isShowing()) {
      popup.show(field, place.getMinX(), place.getMaxY() + 2);
    }
  }
}

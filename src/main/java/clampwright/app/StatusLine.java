package clampwright.app;

import clampwright.figure.Sentences;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;

/** The line at the foot of the window: a hint for what can be done now, and the caution. */
final class StatusLine extends HBox {
  StatusLine(ObservableValue<String> hint) {
    getStyleClass().add("status-line");
    setAlignment(Pos.CENTER_LEFT);
    Label left = new Label();
    left.setId("hint");
    left.textProperty().bind(hint);
    left.setMinWidth(80);
    Region gap = new Region();
    HBox.setHgrow(gap, Priority.ALWAYS);
    Label caution = new Label(Sentences.CAUTION);
    caution.setId("caution");
    caution.setMinWidth(Region.USE_PREF_SIZE);
    getChildren().addAll(left, gap, caution);
  }
}

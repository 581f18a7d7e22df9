package clampwright.view.section;

import javafx.css.PseudoClass;
import javafx.scene.control.Label;
import javafx.scene.layout.VBox;

/** The value at the pointer during a drag, and what is wrong with typed digits. */
final class ValueLabel extends VBox {
  private static final PseudoClass TYPED = PseudoClass.getPseudoClass("typed");
  private static final double OFF_POINTER = 16;

  private Label value;
  private Label problem;

  ValueLabel() {
    getStyleClass().add("drag-value");
    setManaged(false);
    setMouseTransparent(true);
    setVisible(false);
  }

  /** Labels need the theme; the window's first frame, which has none, does without them. */
  private void make() {
    value = new Label();
    value.getStyleClass().add("value");
    value.setId("drag-value");
    problem = new Label();
    problem.getStyleClass().add("problem");
    problem.setId("drag-problem");
    getChildren().addAll(value, problem);
  }

  void show(String caption, Pointer at) {
    place(caption, "", at, false);
  }

  void showTyped(String label, String text, String sentence, Pointer at) {
    place(label + " " + text + "\u2502", sentence, at, true);
  }

  void hide() {
    setVisible(false);
  }

  private void place(String text, String sentence, Pointer at, boolean typed) {
    if (value == null) {
      make();
    }
    value.setText(text);
    tell(sentence);
    pseudoClassStateChanged(TYPED, typed);
    setVisible(true);
    applyCss();
    autosize();
    double right = getParent().getLayoutBounds().getWidth() - getWidth() - 4;
    double above = at.y() - getHeight() - OFF_POINTER;
    relocate(
        Math.max(4, Math.min(right, at.x() + OFF_POINTER)),
        above < 4 ? at.y() + OFF_POINTER : above);
  }

  private void tell(String sentence) {
    problem.setText(sentence);
    problem.setVisible(!sentence.isEmpty());
    problem.setManaged(!sentence.isEmpty());
  }
}

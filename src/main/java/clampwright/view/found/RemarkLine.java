package clampwright.view.found;

import clampwright.view.PartName;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.AccessibleAction;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/**
 * One sentence with a sign and the part it concerns. It can be pressed like a button, but is none:
 * a button does not wrap its content.
 */
final class RemarkLine extends HBox {
  private final Runnable action;

  RemarkLine(String part, String sentence, Runnable action) {
    super(7);
    this.action = action;
    getStyleClass().add("remark");
    setAlignment(Pos.TOP_LEFT);
    Region sign = new Region();
    sign.getStyleClass().add("remark-sign");
    HBox.setMargin(sign, new Insets(3, 0, 0, 0));
    Label who = new Label(part);
    who.getStyleClass().add("remark-part");
    Label what = new Label(sentence);
    what.setWrapText(true);
    what.setMinHeight(USE_PREF_SIZE);
    what.getStyleClass().add("remark-sentence");
    VBox text = part.isEmpty() ? new VBox(what) : new VBox(who, what);
    HBox.setHgrow(text, Priority.ALWAYS);
    getChildren().addAll(sign, text);
    setFocusTraversable(true);
    setAccessibleRole(AccessibleRole.BUTTON);
    setAccessibleText(PartName.before(part, sentence));
    setOnMouseClicked(event -> fire());
    addEventHandler(KeyEvent.KEY_PRESSED, this::keyPressed);
  }

  private void fire() {
    requestFocus();
    action.run();
  }

  private void keyPressed(KeyEvent event) {
    if (event.getCode() == KeyCode.ENTER || event.getCode() == KeyCode.SPACE) {
      fire();
      event.consume();
    }
  }

  @Override
  public void executeAccessibleAction(AccessibleAction wanted, Object... parameters) {
    if (wanted == AccessibleAction.FIRE) {
      fire();
    } else {
      super.executeAccessibleAction(wanted, parameters);
    }
  }
}

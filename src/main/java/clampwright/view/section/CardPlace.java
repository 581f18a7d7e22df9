package clampwright.view.section;

import clampwright.edit.SketchModel;
import clampwright.joint.Part;
import clampwright.view.field.Typed;
import clampwright.view.given.PartCards;
import java.util.Optional;
import javafx.event.ActionEvent;
import javafx.geometry.Bounds;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;

/** The small card at the selected part with its fields; one at a time. */
final class CardPlace {
  private static final double GAP = 14;

  private final SectionPane pane;
  private final SketchModel model;
  private PartCards cards;
  private final StackPane frame = new StackPane();
  private Part part = Part.JOINT;

  CardPlace(SectionPane pane, SketchModel model) {
    this.pane = pane;
    this.model = model;
    frame.getStyleClass().add("part-card");
    frame.setId("part-card");
    frame.setVisible(false);
    frame.addEventHandler(MouseEvent.ANY, MouseEvent::consume);
    frame.addEventHandler(ScrollEvent.ANY, ScrollEvent::consume);
    frame.addEventHandler(KeyEvent.KEY_PRESSED, this::keyPressed);
    frame.addEventHandler(ActionEvent.ACTION, this::entered);
  }

  /** The card of the selected part; the cards are made when the first is wanted. */
  private Optional<Region> card() {
    if (cards == null) {
      cards = new PartCards(model);
    }
    return cards.ofSelection();
  }

  Node node() {
    return frame;
  }

  boolean isOpen() {
    return frame.isVisible();
  }

  /** Opens the card of the selected part, with the focus in its first number. */
  void open(Pointer at) {
    Optional<Region> card = card();
    if (card.isPresent()) {
      part = model.selection();
      frame.getChildren().setAll(card.get());
      frame.setVisible(true);
      place(at);
      Node thickness = card.get().lookup("#card-thickness");
      Optional.ofNullable(thickness).or(() -> firstField(card.get())).ifPresent(Node::requestFocus);
    }
  }

  /** Closes it; a field whose text cannot be taken over keeps it open. */
  boolean close() {
    if (!isOpen()) {
      return true;
    }
    if (holdsFocus()) {
      pane.requestFocus();
    }
    if (isWrong(frame)) {
      return false;
    }
    frame.setVisible(false);
    frame.getChildren().clear();
    return true;
  }

  private boolean holdsFocus() {
    Node owner = pane.getScene() == null ? null : pane.getScene().getFocusOwner();
    for (Node node = owner; node != null; node = node.getParent()) {
      if (node == frame) {
        return true;
      }
    }
    return false;
  }

  private static boolean isWrong(Node node) {
    if (node instanceof Typed typed && typed.isWrong()) {
      return true;
    }
    return node instanceof Parent parent
        && parent.getChildrenUnmodifiable().stream().anyMatch(CardPlace::isWrong);
  }

  /** Follows the selection: the card of another part is not left standing. */
  void follow() {
    if (isOpen() && !model.selection().equals(part)) {
      part = model.selection();
      Optional<Region> card = card();
      if (card.isEmpty()) {
        close();
      } else if (!frame.getChildren().contains(card.get())) {
        frame.getChildren().setAll(card.get());
      }
    }
  }

  private void place(Pointer at) {
    frame.applyCss();
    frame.autosize();
    Bounds room = pane.getLayoutBounds();
    boolean left = at.x() + GAP + frame.getWidth() > room.getWidth();
    double x = left ? at.x() - GAP - frame.getWidth() : at.x() + GAP;
    double y = at.y() - 20;
    frame.relocate(Math.rint(Math.max(4, x)), Math.rint(Math.max(4, Math.min(lowest(), y))));
  }

  /** Keeps the frame as large as its fields need, and on the pane when more of them show. */
  void layout() {
    if (isOpen()) {
      frame.autosize();
      frame.setLayoutY(Math.min(frame.getLayoutY(), lowest()));
    }
  }

  /** The lowest place at which the whole frame is on the pane. */
  private double lowest() {
    return Math.rint(Math.max(4, pane.getLayoutBounds().getHeight() - frame.getHeight() - 4));
  }

  private static Optional<Node> firstField(Node node) {
    if (node.isFocusTraversable() && node.isVisible()) {
      return Optional.of(node);
    }
    if (node instanceof Parent parent && node.isManaged()) {
      for (Node child : parent.getChildrenUnmodifiable()) {
        Optional<Node> found = firstField(child);
        if (found.isPresent()) {
          return found;
        }
      }
    }
    return Optional.empty();
  }

  private void keyPressed(KeyEvent event) {
    if (event.getCode() == KeyCode.ESCAPE) {
      close();
      event.consume();
    }
  }

  /** Enter in a text field takes the text over and is done with the card. */
  private void entered(ActionEvent event) {
    if (event.getTarget() instanceof TextInputControl) {
      close();
    }
  }
}

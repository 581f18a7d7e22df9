package clampwright.view.section;

import clampwright.edit.SketchModel;
import clampwright.figure.Tag;
import clampwright.joint.Part;
import java.util.Optional;
import javafx.scene.Cursor;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.input.ZoomEvent;

/** Hands what mouse and keyboard do on the section to the gesture that goes on, or begins one. */
final class SectionInput {
  /** One notch of the wheel [px] zooms by this. */
  private static final double NOTCH = 40;

  private static final double ZOOM = 1.15;

  private final SectionPane pane;
  private final SketchModel model;
  private final SectionKeys keys;
  private Optional<Gesture> gesture = Optional.empty();
  private Pointer pointer = new Pointer(-1, -1, false, false);
  private boolean inside;
  private boolean spaceHeld;

  /** Why the last press came to nothing; said until the next one. */
  private String refusal = "";

  SectionInput(SectionPane pane, SketchModel model) {
    this.pane = pane;
    this.model = model;
    keys = new SectionKeys(pane, model);
    pane.addEventHandler(MouseEvent.MOUSE_PRESSED, this::pressed);
    pane.addEventHandler(MouseEvent.MOUSE_DRAGGED, this::dragged);
    pane.addEventHandler(MouseEvent.MOUSE_RELEASED, this::released);
    pane.addEventHandler(MouseEvent.MOUSE_MOVED, this::hovered);
    pane.addEventHandler(MouseEvent.MOUSE_EXITED, this::left);
    pane.addEventHandler(ScrollEvent.SCROLL, this::scrolled);
    pane.addEventHandler(ZoomEvent.ZOOM, this::pinched);
    pane.addEventHandler(KeyEvent.KEY_PRESSED, this::keyPressed);
    pane.addEventHandler(KeyEvent.KEY_RELEASED, this::keyReleased);
    pane.addEventHandler(KeyEvent.KEY_TYPED, this::keyTyped);
    pane.focusedProperty().subscribe(this::focusMoved);
  }

  /** Puts a gesture in the place of the press that it has come from. */
  void goOn(Gesture gesture) {
    this.gesture = Optional.of(gesture);
  }

  private void pressed(MouseEvent event) {
    pane.requestFocus();
    refusal = "";
    event.consume();
    if (!pane.clearDesk()) {
      refuse(Hints.WRONG_CARD);
      return;
    }
    pointer = Pointer.of(event);
    gesture.ifPresent(this::finish);
    boolean moves =
        event.getButton() == MouseButton.MIDDLE
            || event.getButton() == MouseButton.PRIMARY && spaceHeld;
    if (moves) {
      goOn(new PanGesture(pane, pointer));
    } else if (event.getButton() == MouseButton.PRIMARY) {
      Optional<Tag> tag = pane.hit(pointer);
      goOn(new Press(pane, model, pane.tool(), tag, pointer));
    }
  }

  /** Ends a gesture that waits for typed digits: as it stands, or else not at all. */
  private void finish(Gesture open) {
    if (!open.confirmed()) {
      open.cancel();
    }
    over();
  }

  private void over() {
    gesture = Optional.empty();
    pane.value().hide();
    pane.followSketch();
    pointAgain();
  }

  private void dragged(MouseEvent event) {
    pointer = Pointer.of(event);
    gesture.ifPresent(open -> open.moved(pointer));
    event.consume();
  }

  private void released(MouseEvent event) {
    pointer = Pointer.of(event);
    boolean click = gesture.filter(open -> open instanceof Press).isPresent();
    if (gesture.isPresent() && gesture.get().released(pointer)) {
      over();
    }
    boolean twice = event.getButton() == MouseButton.PRIMARY && event.getClickCount() == 2;
    if (click && twice && !model.selection().equals(Part.JOINT)) {
      pane.openCard(pointer);
    }
    event.consume();
  }

  private void hovered(MouseEvent event) {
    pointer = Pointer.of(event);
    inside = true;
    pointAgain();
  }

  private void left(MouseEvent event) {
    inside = false;
    pointAgain();
  }

  /** Shows what lies under the pointer now: its mark, the cursor and the hint. */
  void pointAgain() {
    if (gesture.isPresent()) {
      return;
    }
    boolean points = inside && pane.getScene() != null;
    Optional<Tag> tag = points ? pane.hit(pointer) : Optional.empty();
    pane.setHot(pane.tool() == Tool.SELECT ? tag : Optional.empty());
    boolean draws = points && pane.isBesideStack(pointer);
    pane.setCursor(spaceHeld ? Cursor.OPEN_HAND : Cursors.over(pane.tool(), tag, draws));
    pane.say(hint(tag, draws));
  }

  /** Says why something cannot be done, until the next press or key. */
  void refuse(String sentence) {
    refusal = sentence;
    pane.say(sentence);
  }

  private String hint(Optional<Tag> tag, boolean draws) {
    if (!refusal.isEmpty()) {
      return refusal;
    }
    return switch (pane.tool()) {
      case LAYER -> Hints.LAYER_TOOL;
      case WASHER -> Hints.WASHER_TOOL;
      case SELECT ->
          tag.isPresent()
              ? Hints.under(model.sketch(), tag.get())
              : draws
                  ? Hints.DRAW
                  : inside || model.selection().equals(Part.JOINT)
                      ? Hints.PAPER
                      : Hints.selected(model.sketch(), model.selection());
    };
  }

  private void scrolled(ScrollEvent event) {
    if (gesture.isEmpty() && event.getDeltaY() != 0) {
      double factor = Math.pow(ZOOM, event.getDeltaY() / NOTCH);
      pane.viewport().zoom(factor, event.getX(), event.getY());
      pointAgain();
    }
    event.consume();
  }

  private void pinched(ZoomEvent event) {
    if (gesture.isEmpty()) {
      pane.viewport().zoom(event.getZoomFactor(), event.getX(), event.getY());
    }
    event.consume();
  }

  /** Keys typed in a card that lies on the sheet are the card's own. */
  private boolean isForSheet(KeyEvent event) {
    return event.getTarget() == pane;
  }

  private void keyPressed(KeyEvent event) {
    if (!isForSheet(event)) {
      return;
    }
    refusal = "";
    if (event.getCode() == KeyCode.SPACE && gesture.isEmpty()) {
      spaceHeld = true;
      pointAgain();
      event.consume();
    } else if (gesture.isPresent() ? inGesture(event, gesture.get()) : keys.pressed(event)) {
      event.consume();
    }
  }

  private boolean inGesture(KeyEvent event, Gesture open) {
    switch (event.getCode()) {
      case ESCAPE -> {
        open.cancel();
        over();
      }
      case ENTER -> {
        if (open.confirmed()) {
          over();
        }
      }
      case BACK_SPACE -> open.erased();
      case ALT, CONTROL -> open.moved(pointer.held(event.isAltDown(), event.isControlDown()));
      default -> {
        return !event.isShortcutDown();
      }
    }
    return true;
  }

  private void keyReleased(KeyEvent event) {
    if (!isForSheet(event)) {
      return;
    }
    boolean held = event.getCode() == KeyCode.ALT || event.getCode() == KeyCode.CONTROL;
    if (event.getCode() == KeyCode.SPACE) {
      spaceHeld = false;
      pointAgain();
    } else if (held && gesture.isPresent()) {
      gesture.get().moved(pointer.held(event.isAltDown(), event.isControlDown()));
      event.consume();
    }
  }

  private void keyTyped(KeyEvent event) {
    String character = event.getCharacter();
    boolean text = !character.isEmpty() && character.charAt(0) >= ' ' && character.charAt(0) != 127;
    if (!text
        || !isForSheet(event)
        || event.isControlDown()
        || event.isAltDown()
        || event.isMetaDown()) {
      return;
    }
    if (gesture.isEmpty()) {
      typedAlone(character);
    }
    gesture.ifPresent(
        open -> {
          open.typed(character);
          event.consume();
        });
  }

  /** Digits typed with a part selected set its number, as if it were being dragged. */
  private void typedAlone(String character) {
    if (character.equals("+") || character.equals("-")) {
      keys.thicken(character.equals("+") ? 1 : -1);
    } else if (character.matches("[0-9.,]")) {
      Pointer at = pane.besideSelection();
      keys.typed(at)
          .ifPresent(drag -> goOn(new DragGesture(pane, model, drag, Optional.empty(), at)));
    }
  }

  private void focusMoved(boolean focused) {
    if (!focused) {
      spaceHeld = false;
      gesture.ifPresent(this::finish);
    }
  }
}

package clampwright.view.section;

import javafx.scene.input.MouseEvent;

/**
 * Where the pointer is on the pane, and which keys are held with it.
 *
 * @param x from the left [px]
 * @param y from the top [px]
 * @param free whether snapping is suspended
 * @param alone whether one of a pair is moved alone
 */
record Pointer(double x, double y, boolean free, boolean alone) {

  static Pointer of(MouseEvent event) {
    return new Pointer(event.getX(), event.getY(), event.isAltDown(), event.isControlDown());
  }

  Pointer held(boolean free, boolean alone) {
    return new Pointer(x, y, free, alone);
  }

  double distance(Pointer other) {
    return Math.hypot(x - other.x, y - other.y);
  }
}

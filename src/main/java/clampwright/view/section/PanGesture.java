package clampwright.view.section;

import clampwright.figure.Sheet;
import javafx.scene.Cursor;

/** Moves the sheet with the pointer. */
final class PanGesture implements Gesture {
  private final SectionPane pane;
  private final Sheet start;
  private final Pointer grab;

  PanGesture(SectionPane pane, Pointer grab) {
    this.pane = pane;
    this.grab = grab;
    start = pane.viewport().sheet();
    pane.setCursor(Cursor.CLOSED_HAND);
  }

  @Override
  public void moved(Pointer pointer) {
    pane.viewport().pan(start, pointer.x() - grab.x(), pointer.y() - grab.y());
  }

  @Override
  public boolean released(Pointer pointer) {
    return true;
  }

  @Override
  public void cancel() {
    pane.viewport().pan(start, 0, 0);
  }
}

package clampwright.view.section;

import clampwright.figure.Tag;
import clampwright.joint.Feature;
import java.util.Optional;
import javafx.scene.Cursor;

/** The pointer's shape tells what a press would take hold of. */
final class Cursors {
  private Cursors() {}

  static Cursor over(Tool tool, Optional<Tag> tag, boolean drawsHere) {
    if (tool != Tool.SELECT) {
      return Cursor.CROSSHAIR;
    }
    if (tag.isEmpty()) {
      return drawsHere ? Cursor.CROSSHAIR : Cursor.DEFAULT;
    }
    return tag.get().feature().map(Cursors::over).orElse(Cursor.DEFAULT);
  }

  private static Cursor over(Feature feature) {
    return switch (feature) {
      case FACE, LOAD_AT_HEAD, LOAD_AT_NUT, LOAD_ENTERS, LOAD_LEAVES, PRELOAD_SIZE ->
          Cursor.V_RESIZE;
      case LEFT_EDGE, RIGHT_EDGE, HOLE_EDGE, SHANK_EDGE, FLANK -> Cursor.H_RESIZE;
      case BODY, NOTE -> Cursor.OPEN_HAND;
      case INSERT -> Cursor.HAND;
    };
  }
}

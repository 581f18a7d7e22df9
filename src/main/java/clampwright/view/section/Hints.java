package clampwright.view.section;

import clampwright.edit.Names;
import clampwright.figure.Tag;
import clampwright.joint.Feature;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import java.util.Locale;
import java.util.Optional;

/** What can be done, in a sentence for the status line. */
final class Hints {
  static final String NO_WASHER = "A tapped hole leaves no room for a washer at that end.";
  static final String WRONG_CARD =
      "A value in the card cannot be taken over: put it right, or take it back with Esc.";
  static final String DRAW =
      "Drag down to draw a layer here, and sideways as well to give it an edge;"
          + " drag sideways alone to move the sheet.";
  static final String PAPER =
      "Drag to move the sheet, wheel to zoom, F to fit; L draws a layer, W a washer.";
  static final String LAYER_TOOL =
      "Drag to draw a layer as thick as the drag, or click for a usual one; Esc leaves the tool.";
  static final String WASHER_TOOL =
      "Click at the head or the nut for a washer of the table, or drag to draw its thickness;"
          + " Esc leaves the tool.";
  static final String DRAGGING =
      "Type a number to set it exactly, Alt suspends snapping, Esc takes it back.";
  static final String DRAGGING_FLANK =
      "Both cones swing together, with Ctrl this one alone; type degrees, Alt suspends snapping,"
          + " Esc takes it back.";
  static final String DRAGGING_SHANK =
      "Clearance holes and washers of the table follow the thread, others stay; Esc takes it back.";
  static final String TYPING = "Enter sets it, Esc takes it back; mm and in are understood.";

  private Hints() {}

  /** For what lies under the pointer. */
  static String under(Sketch sketch, Tag tag) {
    String name = Names.of(sketch.joint(), tag.part());
    if (tag.feature().isEmpty()) {
      return "Click to select the " + name + ", double-click for its card.";
    }
    return switch (tag.feature().get()) {
      case FACE -> "Drag the face to change the thickness of " + name + ".";
      case LEFT_EDGE, RIGHT_EDGE -> "Drag the edge to change how far " + name + " reaches.";
      case HOLE_EDGE -> "Drag to change the hole of " + name + ".";
      case BODY -> "Drag " + name + " to change its place, double-click for its card.";
      case FLANK -> "Drag the flank to change the half-angle; it catches at 30° and 45°.";
      case SHANK_EDGE -> "Drag to step through the thread sizes; holes of the table follow.";
      case LOAD_AT_HEAD, LOAD_AT_NUT ->
          "Drag the arrow out or in to change the axial load, or type a number.";
      case LOAD_ENTERS ->
          "Drag to the part where the load enters; n follows from the parts between.";
      case LOAD_LEAVES ->
          "Drag to the part where the load leaves; n follows from the parts between.";
      case PRELOAD_SIZE -> "Drag the arrow out or in to change the preload, or type a number.";
      case NOTE -> "Drag the note where it reads well; double-click to change its words.";
      case INSERT -> "Click to insert a layer here, or drag to draw its thickness.";
    };
  }

  /** For what is being dragged. */
  static String dragging(Optional<Tag> held) {
    Optional<Feature> feature = held.flatMap(Tag::feature);
    if (feature.equals(Optional.of(Feature.FLANK))) {
      return DRAGGING_FLANK;
    }
    return feature.equals(Optional.of(Feature.SHANK_EDGE)) ? DRAGGING_SHANK : DRAGGING;
  }

  /** For the selected part, while the pointer is elsewhere. */
  static String selected(Sketch sketch, Part part) {
    String name = capital(Names.of(sketch.joint(), part));
    if (part.isElement()) {
      return name + " selected. Drag its face to change the thickness, or type a number.";
    }
    return switch (part.kind()) {
      case HEAD_CONE, NUT_CONE -> name + " selected. Drag its flank, or type degrees.";
      case SHANK -> name + " selected. Drag its edge to change the thread.";
      case JOINT -> "";
      default -> name + " selected. Enter opens its card.";
    };
  }

  /** Why something cannot be dragged. */
  static String held(Sketch sketch, Tag tag) {
    return switch (tag.feature().orElse(Feature.BODY)) {
      case HOLE_EDGE -> "The hole of the tapped layer is the thread: change the thread instead.";
      case SHANK_EDGE -> "This thread is of no series: choose one of the table first.";
      case FLANK -> "There is no cone to drag while the joint has no solution.";
      default -> capital(Names.of(sketch.joint(), tag.part())) + " cannot be dragged here.";
    };
  }

  private static String capital(String text) {
    return text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
  }
}

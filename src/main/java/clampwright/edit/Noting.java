package clampwright.edit;

import clampwright.joint.Joint;
import clampwright.joint.Note;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import java.util.ArrayList;
import java.util.List;
import java.util.function.IntUnaryOperator;

/** Steps on the notes, and where a note points. */
public final class Noting {
  private Noting() {}

  /** A new note at a part, beside the stack; at the head where the part cannot have one. */
  public static Change added(Sketch sketch, Part part) {
    Part at =
        switch (part.kind()) {
          case ELEMENT, HEAD, SHANK, ANCHOR -> part;
          default -> Part.HEAD;
        };
    double diameter = sketch.joint().fastener().thread().diameter();
    Note note = new Note("Note", at, 1.6 * diameter, at.isElement() ? 0 : -0.3 * diameter);
    List<Note> notes = new ArrayList<>(sketch.notes());
    notes.add(note);
    return new Change("Add note", sketch.withNotes(notes), Part.note(notes.size() - 1));
  }

  /** The sketch without a note. */
  public static Change deleted(Sketch sketch, int index) {
    List<Note> notes = new ArrayList<>(sketch.notes());
    notes.remove(index);
    return new Change("Delete note", sketch.withNotes(notes), Part.JOINT);
  }

  /**
   * Notes that stay with their elements in a changed stack; those of an element that is gone go
   * with it.
   *
   * @param gone index of that element; −1 for none
   * @param place where an element of the old stack lies in the new one
   */
  static List<Note> followed(List<Note> notes, int gone, IntUnaryOperator place) {
    List<Note> followed = new ArrayList<>();
    for (Note note : notes) {
      if (!note.part().isElement()) {
        followed.add(note);
      } else if (note.part().index() != gone) {
        int to = place.applyAsInt(note.part().index());
        followed.add(note.withPart(Part.element(to)));
      }
    }
    return followed;
  }

  /** z of the middle of what a note points at [mm from under the head]. */
  static double middle(Joint joint, Part part) {
    return switch (part.kind()) {
      case ELEMENT ->
          part.index() < joint.elements().size() ? Interfaces.middle(joint, part.index()) : 0;
      case HEAD -> -joint.fastener().head().height() / 2;
      case SHANK -> joint.stackThickness() / 2;
      default -> joint.stackThickness();
    };
  }
}

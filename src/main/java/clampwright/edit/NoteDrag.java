package clampwright.edit;

import clampwright.joint.Note;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import java.util.Optional;

/**
 * The words of a note, moved about; they go on pointing at their part.
 *
 * @param start sketch taken hold of
 * @param grab where it was taken hold of
 * @param index of the note
 */
record NoteDrag(Sketch start, Grab grab, int index) implements Drag {

  @Override
  public Dragged at(double fromAxis, double z, Snap snap) {
    Note note = start.notes().get(index);
    Note moved = note.at(note.fromAxis() + fromAxis - grab.fromAxis(), note.z() + z - grab.z());
    return dragged(start.withNote(index, ignored -> moved));
  }

  @Override
  public Dragged set(double value) {
    return dragged(start);
  }

  private Dragged dragged(Sketch sketch) {
    return new Dragged(sketch, Part.note(index), "note", Dimension.LENGTH, 0, "", "Move note");
  }

  @Override
  public Optional<String> problem(double value) {
    return Optional.of("A note has no number to be typed.");
  }

  @Override
  public Dimension dimension() {
    return Dimension.LENGTH;
  }
}

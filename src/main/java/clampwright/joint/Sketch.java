package clampwright.joint;

import clampwright.quantity.UnitSystem;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.function.UnaryOperator;

/**
 * The document: a joint with what belongs to its presentation.
 *
 * @param name of the sketch, as it stands above the drawing
 * @param joint what is sketched
 * @param units in which the reader sees it; the joint itself never changes with them
 * @param notes the reader's own words at its parts
 */
public record Sketch(String name, Joint joint, UnitSystem units, List<Note> notes) {
  public Sketch {
    Objects.requireNonNull(name, "name");
    Objects.requireNonNull(joint, "joint");
    Objects.requireNonNull(units, "units");
    notes = List.copyOf(notes);
  }

  /** A sketch without notes. */
  public Sketch(String name, Joint joint, UnitSystem units) {
    this(name, joint, units, List.of());
  }

  public Sketch withName(String name) {
    return new Sketch(name, joint, units, notes);
  }

  public Sketch withJoint(Joint joint) {
    return new Sketch(name, joint, units, notes);
  }

  public Sketch withJoint(UnaryOperator<Joint> change) {
    return withJoint(change.apply(joint));
  }

  public Sketch withUnits(UnitSystem units) {
    return new Sketch(name, joint, units, notes);
  }

  public Sketch withNotes(List<Note> notes) {
    return new Sketch(name, joint, units, notes);
  }

  /** The sketch with one note changed. */
  public Sketch withNote(int index, UnaryOperator<Note> change) {
    List<Note> changed = new ArrayList<>(notes);
    changed.set(index, change.apply(changed.get(index)));
    return withNotes(changed);
  }
}

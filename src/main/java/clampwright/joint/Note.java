package clampwright.joint;

import java.util.Objects;

/**
 * A reader's own words at a part. Its place is relative to the part, so that it goes where the part
 * goes.
 *
 * @param text what it says, in one line
 * @param part it points at: an element, the head, the shank or the anchor
 * @param fromAxis where its words begin, positive to the right of the axis [mm]
 * @param z of its words, from the middle of the part, positive towards the nut [mm]
 */
public record Note(String text, Part part, double fromAxis, double z) {
  public Note {
    Objects.requireNonNull(text, "text");
    Objects.requireNonNull(part, "part");
    boolean known =
        switch (part.kind()) {
          case ELEMENT, HEAD, SHANK, ANCHOR -> true;
          default -> false;
        };
    if (!known) {
      throw new IllegalArgumentException("a note points at a part of the bolt or of the stack");
    }
    Check.finite("place of the note", "mm", fromAxis);
    Check.finite("place of the note", "mm", z);
  }

  public Note withText(String text) {
    return new Note(text, part, fromAxis, z);
  }

  public Note withPart(Part part) {
    return new Note(text, part, fromAxis, z);
  }

  public Note at(double fromAxis, double z) {
    return new Note(text, part, fromAxis, z);
  }
}

package clampwright.joint;

import java.util.Objects;

/**
 * Names a part of the joint, so that a finding, a mark on the drawing and the selection mean the
 * same thing.
 *
 * @param kind what it is
 * @param index of the element, 0 at the head, or of the note; −1 for the other kinds
 */
public record Part(Kind kind, int index) {

  /** The parts that can be pointed at. */
  public enum Kind {
    /** The joint as a whole, or nothing in particular. */
    JOINT,
    HEAD,
    SHANK,
    /** The nut, or the tapped hole. */
    ANCHOR,
    ELEMENT,
    HEAD_CONE,
    NUT_CONE,
    LOAD,
    PRELOAD,
    /** A note of the reader's own, by its index. */
    NOTE
  }

  public static final Part JOINT = new Part(Kind.JOINT, -1);
  public static final Part HEAD = new Part(Kind.HEAD, -1);
  public static final Part SHANK = new Part(Kind.SHANK, -1);
  public static final Part ANCHOR = new Part(Kind.ANCHOR, -1);
  public static final Part HEAD_CONE = new Part(Kind.HEAD_CONE, -1);
  public static final Part NUT_CONE = new Part(Kind.NUT_CONE, -1);
  public static final Part LOAD = new Part(Kind.LOAD, -1);
  public static final Part PRELOAD = new Part(Kind.PRELOAD, -1);

  public Part {
    Objects.requireNonNull(kind, "kind");
    boolean counted = kind == Kind.ELEMENT || kind == Kind.NOTE;
    if (counted ? index < 0 : index != -1) {
      throw new IllegalArgumentException("index " + index + " does not fit a part of kind " + kind);
    }
  }

  public static Part element(int index) {
    return new Part(Kind.ELEMENT, index);
  }

  public static Part note(int index) {
    return new Part(Kind.NOTE, index);
  }

  public boolean isNote() {
    return kind == Kind.NOTE;
  }

  public boolean isElement() {
    return kind == Kind.ELEMENT;
  }
}

package clampwright.edit;

/** What digits typed during a drag come to. */
public sealed interface Typed {

  /** A value that can be shown. */
  record Value(Dragged dragged) implements Typed {}

  /**
   * Not a value; the drag stays where it was.
   *
   * @param problem a short sentence for the person who typed it
   */
  record Wrong(String problem) implements Typed {}
}

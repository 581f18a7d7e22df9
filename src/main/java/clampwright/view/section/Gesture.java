package clampwright.view.section;

/** What goes on between a press and its end. */
interface Gesture {

  /** The pointer has moved, or a key held with it has changed. */
  void moved(Pointer pointer);

  /**
   * The button was let go.
   *
   * @return whether the gesture is over; one that waits for typed digits is not
   */
  boolean released(Pointer pointer);

  /** Takes everything back. */
  void cancel();

  /** A character was typed. */
  default void typed(String character) {}

  /** The last character is taken back. */
  default void erased() {}

  /**
   * Ends it as it stands.
   *
   * @return whether it is over; what cannot stand keeps it open and says why
   */
  default boolean confirmed() {
    return false;
  }
}

package clampwright.app;

import java.util.List;

/** Asks and tells the user. The window does so in dialogs. */
interface Questions {

  /** What to do with work that has not been saved. */
  enum Unsaved {
    SAVE,
    DISCARD,
    CANCEL
  }

  /** Asks what to do with the unsaved work on a sketch. */
  Unsaved unsaved(String name);

  /**
   * Says something that must be read before going on.
   *
   * @param title what has happened
   * @param lines the particulars
   */
  void tell(String title, List<String> lines);
}

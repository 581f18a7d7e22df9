package clampwright.view.field;

import javafx.scene.Node;

/** Something that holds typed text which the sketch may not have taken over yet. */
public interface Typed {

  /** Takes the text over if it is right; if not, the text stays and says what is wrong. */
  void commit();

  /** Gives the typed text up and shows the sketch's value. */
  void restore();

  /** Whether there is text that the sketch could not take over. */
  boolean isWrong();

  /** The typed text's holder at or around a node, or null where there is none. */
  static Typed around(Node node) {
    for (Node at = node; at != null; at = at.getParent()) {
      if (at instanceof Typed typed) {
        return typed;
      }
    }
    return null;
  }
}

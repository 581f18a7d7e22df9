package clampwright.view.given;

import java.util.List;

/** Names for what is added to a list. */
final class FreeName {
  private FreeName() {}

  /** The first of "stem from", "stem from + 1", … that is not taken. */
  static String of(String stem, int from, List<String> taken) {
    int number = from;
    while (taken.contains(stem + number)) {
      number++;
    }
    return stem + number;
  }
}

package clampwright.store;

import java.util.ArrayList;
import java.util.List;

/**
 * What reading a sketch has found, each line with its place: problems refuse the sketch, remarks do
 * not. Beyond a hundred lines only their number is kept.
 */
final class Notes {
  private static final int MOST = 100;

  private final Lines problems = new Lines();
  private final Lines remarks = new Lines();

  /** Lines for a reader, with an end. */
  private static final class Lines {
    private final List<String> kept = new ArrayList<>();
    private int count;

    void add(String line) {
      count++;
      if (kept.size() < MOST) {
        kept.add(printable(line));
      }
    }

    List<String> all() {
      List<String> all = new ArrayList<>(kept);
      if (count > MOST) {
        all.add("and " + (count - MOST) + " more");
      }
      return all;
    }
  }

  void problem(String line) {
    problems.add(line);
  }

  void problem(String place, String what) {
    problem(place + ": " + what);
  }

  void remark(String place, String what) {
    remarks.add(place + ": " + what);
  }

  int problemCount() {
    return problems.count;
  }

  List<String> problems() {
    return problems.all();
  }

  List<String> remarks() {
    return remarks.all();
  }

  /** A text from a file, cut to what a sentence can bear. */
  static String shortened(String text) {
    int most = 40;
    if (text.length() <= most) {
      return text;
    }
    int end = Character.isHighSurrogate(text.charAt(most - 2)) ? most - 2 : most - 1;
    return text.substring(0, end) + "…";
  }

  /** One line stays one line, whatever a file holds. */
  private static String printable(String line) {
    return line.replaceAll("[\\p{Cntrl}\\u0085\\u2028\\u2029]", "\uFFFD");
  }
}

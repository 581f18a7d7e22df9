package clampwright.figure.working;

/**
 * One line of a working. A remark has words only: its sentence stands as formula, numbers and
 * result are empty.
 *
 * @param label what is worked out
 * @param formula in symbols, without the equals sign
 * @param numbers the formula with the numbers put in; empty where there is nothing to put in
 * @param result with its unit; equal to the readout elsewhere on the screen
 * @param source standard, handbook, or that it is a rule of the trade
 */
public record Step(String label, String formula, String numbers, String result, String source) {

  static Step remark(String label, String sentence, String source) {
    return new Step(label, sentence, "", "", source);
  }

  /** Whether it only says something. */
  public boolean isRemark() {
    return result.isEmpty();
  }
}

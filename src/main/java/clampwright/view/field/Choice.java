package clampwright.view.field;

/**
 * One of the values that a field offers.
 *
 * @param label as listed
 * @param group heading under which it is listed; empty for none
 * @param value what it stands for
 * @param origin where it comes from, for the tooltip; empty for none
 */
public record Choice<T>(String label, String group, T value, String origin) {

  /** A choice that needs no heading and no origin. */
  public static <T> Choice<T> of(String label, T value) {
    return new Choice<>(label, "", value, "");
  }
}

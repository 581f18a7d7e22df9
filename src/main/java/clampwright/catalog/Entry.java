package clampwright.catalog;

/**
 * A row of a table.
 *
 * @param label as offered in a list
 * @param group heading under which it is offered, such as "ISO coarse"
 * @param value what it stands for
 * @param source standard or handbook
 * @param provenance how sure the number is, such as "published table" or "from memory"
 */
public record Entry<T>(String label, String group, T value, String source, String provenance) {

  /** Source and provenance in one line, for a tooltip. */
  public String origin() {
    return source + " · " + provenance;
  }
}

package clampwright.edit;

/** The two ends of a stack. */
public enum End {
  HEAD,
  NUT
}

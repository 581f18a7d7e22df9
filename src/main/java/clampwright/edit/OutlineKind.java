package clampwright.edit;

import clampwright.joint.Outline;

/** The kinds of outline that a part can be given. */
public enum OutlineKind {
  WIDE,
  ROUND,
  STRIP;

  public static OutlineKind of(Outline outline) {
    if (outline instanceof Outline.Wide) {
      return WIDE;
    }
    return outline instanceof Outline.Round ? ROUND : STRIP;
  }

  /**
   * An outline of this kind that is as near to another as can be.
   *
   * @param usual diameter where the other is wide [mm]
   */
  public Outline from(Outline other, double usual) {
    if (of(other) == this) {
      return other;
    }
    boolean wide = other instanceof Outline.Wide;
    double left = wide ? usual / 2 : other.leftReach();
    double right = wide ? usual / 2 : other.rightReach();
    return switch (this) {
      case WIDE -> Outline.WIDE;
      case ROUND -> new Outline.Round(left + right);
      case STRIP -> new Outline.Strip(left, right);
    };
  }
}

package clampwright.mechanics;

import java.util.List;

/**
 * The bolt as springs in series.
 *
 * @param stiffness k_b [N/mm]
 * @param pieces from the head on; each with its own stiffness
 * @param length nominal length in force [mm]
 * @param shankLength length of the plain shank in force [mm]
 * @param grip length over which the bolt stretches, without its end pieces [mm]
 * @param engagement length of thread in the nut or the tapped hole [mm]
 */
public record BoltStiffness(
    double stiffness,
    List<Piece> pieces,
    double length,
    double shankLength,
    double grip,
    double engagement) {

  /**
   * One spring of the bolt.
   *
   * @param kind which
   * @param length that gives way [mm]
   * @param area that carries [mm²]
   * @param modulus of its material [MPa]
   */
  public record Piece(Kind kind, double length, double area, double modulus) {
    /** Stiffness E·A/l [N/mm]; infinite for a piece of no length. */
    public double stiffness() {
      return modulus * area / length;
    }
  }

  /** The springs a bolt is made of. */
  public enum Kind {
    HEAD,
    SHANK,
    THREAD_IN_GRIP,
    ENGAGED_THREAD,
    NUT,
    TAPPED_THREAD
  }

  public BoltStiffness {
    pieces = List.copyOf(pieces);
  }
}

package clampwright.joint;

/** The edge of a part as seen along the bolt axis. */
public sealed interface Outline {

  /** A part that continues past anything drawn. */
  record Wide() implements Outline {}

  /**
   * A boss, bushing, spacer or washer.
   *
   * @param diameter [mm], above 0
   */
  record Round(double diameter) implements Outline {
    public Round {
      Check.positive("outside diameter", "mm", diameter);
    }
  }

  /**
   * A plate or flange with straight edges on two sides of the axis, endless along them.
   *
   * @param left distance of the left edge from the axis [mm], above 0
   * @param right distance of the right edge from the axis [mm], above 0
   */
  record Strip(double left, double right) implements Outline {
    public Strip {
      Check.positive("edge distance, left", "mm", left);
      Check.positive("edge distance, right", "mm", right);
    }
  }

  Outline WIDE = new Wide();

  /** Distance of the drawn edge from the axis on the left [mm]; infinite for a wide part. */
  default double leftReach() {
    if (this instanceof Round round) {
      return round.diameter / 2;
    }
    return this instanceof Strip strip ? strip.left : Double.POSITIVE_INFINITY;
  }

  /** Distance of the drawn edge from the axis on the right [mm]; infinite for a wide part. */
  default double rightReach() {
    return this instanceof Strip strip ? strip.right : leftReach();
  }
}

package clampwright.joint;

/** Where an axial load enters the stack and leaves it. */
public sealed interface Introduction {

  /** Under head and nut, n = 1. */
  Introduction ENDS = new Factor(1);

  /**
   * A typed load-introduction factor.
   *
   * @param factor n [–], 0 … 1
   */
  record Factor(double factor) implements Introduction {
    public Factor {
      Check.between("load-introduction factor", 0, factor, 1);
    }
  }

  /**
   * At the mid-planes of two elements; n follows from the give between those planes.
   *
   * @param upper index of the element nearer the head, 0 or more
   * @param lower index of the element nearer the nut, not before the upper
   */
  record Planes(int upper, int lower) implements Introduction {
    public Planes {
      if (upper < 0 || lower < upper) {
        throw new IllegalArgumentException(
            "the load must leave at or below the part where it enters");
      }
    }
  }
}

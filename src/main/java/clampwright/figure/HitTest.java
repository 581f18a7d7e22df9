package clampwright.figure;

import java.util.Optional;

/** Finds what lies under a point of a figure, by the marks that were painted. */
public final class HitTest {
  private HitTest() {}

  /**
   * The topmost thing within reach. Grips and edges win over bodies; of edges the nearest wins.
   *
   * @param reach how near counts as on it [sheet mm]
   * @return empty on bare paper
   */
  public static Optional<Tag> at(Figure figure, Point point, double reach) {
    throw new UnsupportedOperationException("comes with the figure commit");
  }
}

package clampwright.joint;

import java.util.Objects;

/** What the bolt is screwed into. */
public sealed interface Anchor {

  /**
   * A nut below the stack.
   *
   * @param standard where its size comes from; "own size" when typed
   * @param bearingDiameter diameter of the bearing face [mm], above 0
   * @param height [mm], above 0
   * @param width across flats [mm], above 0
   */
  record Nut(String standard, double bearingDiameter, double height, double width)
      implements Anchor {
    public Nut {
      Objects.requireNonNull(standard, "standard");
      Check.positive("bearing face diameter", "mm", bearingDiameter);
      Check.positive("nut height", "mm", height);
      Check.positive("nut width", "mm", width);
    }

    public Nut withBearingDiameter(double bearingDiameter) {
      return new Nut(standard, bearingDiameter, height, width);
    }
  }

  /** A thread tapped into the last layer. */
  record Tapped() implements Anchor {}
}

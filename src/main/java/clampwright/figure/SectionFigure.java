package clampwright.figure;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import java.util.Optional;

/** The cross-section: hand method on the left half, the matter on the right half. */
public final class SectionFigure {
  private SectionFigure() {}

  /**
   * What is shown besides the joint itself.
   *
   * @param selected part, JOINT when nothing is
   * @param hot what lies under the pointer or is being dragged
   * @param interactive whether grips are drawn
   */
  public record Options(Part selected, Optional<Tag> hot, boolean interactive) {
    public static final Options PLAIN = new Options(Part.JOINT, Optional.empty(), false);
  }

  /** Draws a sketch on a sheet. An unsolved joint shows its parts and the reasons, no cones. */
  public static Figure of(Sketch sketch, Assessment assessment, Sheet sheet, Options options) {
    throw new UnsupportedOperationException("comes with the figure commit");
  }

  /** The sheet of this size on which the whole joint and its call-outs fit. */
  public static Sheet fitted(Sketch sketch, double width, double height) {
    throw new UnsupportedOperationException("comes with the figure commit");
  }
}

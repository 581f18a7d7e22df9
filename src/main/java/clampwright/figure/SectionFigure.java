package clampwright.figure;

import clampwright.joint.LoadCase;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import java.util.Optional;

/** The cross-section: hand method on the left half, the matter on the right half. */
public final class SectionFigure {
  private static final double LEFT_COLUMN = CallOuts.LEFT + CallOuts.WIDTH + 8;
  private static final double TOP_MARGIN = 14;
  private static final double BOTTOM_MARGIN = 12;
  private static final double LARGEST_SCALE = 12;

  /** An empty sketch leaves room for what will be drawn. */
  private static final double LARGEST_EMPTY_SCALE = 3.5;

  private SectionFigure() {}

  /**
   * What is shown besides the joint itself.
   *
   * @param selected part, JOINT when nothing is
   * @param hot what lies under the pointer or is being dragged
   * @param interactive whether grips are drawn
   * @param loadCase index of the load case whose arrows are drawn
   */
  public record Options(Part selected, Optional<Tag> hot, boolean interactive, int loadCase) {
    public static final Options PLAIN = new Options(Part.JOINT, Optional.empty(), false, 0);
  }

  /** Draws a sketch on a sheet. An unsolved joint shows its parts and the reasons, no cones. */
  public static Figure of(Sketch sketch, Assessment assessment, Sheet sheet, Options options) {
    StackLayout layout = StackLayout.of(sketch.joint(), assessment);
    Drawing drawing = new Drawing(sheet);
    LayerDrawing layers = new LayerDrawing(drawing, layout);
    int count = sketch.joint().elements().size();
    for (int i = 0; i < count; i++) {
      layers.body(i);
    }
    if (assessment instanceof Assessment.Solved solved) {
      new ConeDrawing(drawing, layout, solved).fills();
    }
    for (int i = 0; i < count; i++) {
      layers.edges(i);
    }
    new BoltDrawing(drawing, layout).draw();
    if (assessment instanceof Assessment.Solved solved) {
      ConeDrawing cones = new ConeDrawing(drawing, layout, solved);
      cones.cylinders();
      cones.flanks();
      new CallOuts(drawing, layout, solved, sketch.units()).draw();
    }
    new Dimensions(drawing, layout, sketch).draw();
    new EdgeDistances(drawing, layout, sketch, load(sketch, options)).draw();
    new ForceDrawing(drawing, layout, sketch, load(sketch, options)).draw(options.interactive());
    new NoteDrawing(drawing, layout, sketch).draw();
    captions(drawing);
    if (count == 0) {
      beginning(drawing, layout);
    }
    if (options.interactive()) {
      new Handles(drawing, layout).draw(options);
    }
    if (assessment instanceof Assessment.Unsolved unsolved) {
      new Problems(drawing, layout, sketch).draw(unsolved);
    }
    return new Figure(
        "Cross-section of " + sketch.name(), sheet.width(), sheet.height(), drawing.marks());
  }

  private static void captions(Drawing drawing) {
    Tag tag = Tag.of(Role.CAPTION, Part.JOINT);
    double right = drawing.sheet().width() - 3.5;
    drawing.text(tag, CallOuts.LEFT, 5, "hand method", Mark.Anchor.START, 2.8);
    drawing.text(tag, right, 5, "parts and dimensions", Mark.Anchor.END, 2.8);
  }

  /** Says in an empty sketch where to begin: beside the bolt, where a layer will be. */
  private static void beginning(Drawing drawing, StackLayout layout) {
    Tag tag = Tag.of(Role.CAPTION, Part.JOINT);
    double beside = Math.max(layout.joint().fastener().head().rim() / 2, layout.nutReach());
    double x = drawing.sheet().x(beside) + 5;
    double y = drawing.sheet().headY();
    drawing.text(tag, x, y, "press here and drag down", Mark.Anchor.START, 3.3);
    drawing.text(tag, x, y + 4.6, "to draw a layer", Mark.Anchor.START, 3.3);
  }

  private static LoadCase load(Sketch sketch, Options options) {
    return sketch.joint().service().loads().get(options.loadCase());
  }

  /** The sheet of this size on which the whole joint and its call-outs fit. */
  public static Sheet fitted(Sketch sketch, double width, double height) {
    StackLayout layout = StackLayout.of(sketch.joint(), Assessment.of(sketch.joint()));
    double across = Math.max(20, width - LEFT_COLUMN - Dimensions.column(sketch.joint()));
    double down = Math.max(20, height - TOP_MARGIN - BOTTOM_MARGIN);
    double tall = layout.bottom() - layout.top();
    double largest = layout.stack() == 0 ? LARGEST_EMPTY_SCALE : LARGEST_SCALE;
    double scale = Math.min(largest, Math.min(across / (2 * layout.reach()), down / tall));
    double headY = TOP_MARGIN + (down - tall * scale) / 2 - layout.top() * scale;
    return new Sheet(width, height, scale, LEFT_COLUMN + across / 2, headY);
  }
}

package clampwright.figure;

import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * A picture that leaves the program: the section with what is asked beside it, caption and caution
 * below, on the sheet of a preset.
 */
public final class PictureFigure {
  private static final double MARGIN = 3;
  private static final double SIDE = 66;
  private static final double DIAGRAM = 46;
  private static final double CAPTION_SIZE = 3.3;
  private static final double CAUTION_SIZE = 2.3;
  private static final double LADDER = 44;
  private static final double UNDER = 68;
  private static final double SHORTEST_LADDER = 24;

  private final Sketch sketch;
  private final Assessment assessment;
  private final Request request;
  private final double width;
  private final double height;
  private final List<Mark> marks = new ArrayList<>();

  /**
   * What is asked of a picture.
   *
   * @param preset decides its size
   * @param shown what it shows
   * @param caption below it; may be empty
   * @param loadCase index of the load case shown
   */
  public record Request(Preset preset, Set<Show> shown, String caption, int loadCase) {
    public Request {
      shown = Set.copyOf(shown);
    }
  }

  private PictureFigure(Sketch sketch, Assessment assessment, Request request) {
    this.sketch = sketch;
    this.assessment = assessment;
    this.request = request;
    width = request.preset().width() / request.preset().scale();
    height = request.preset().height(request.shown()) / request.preset().scale();
  }

  /** Draws it. An unsolved joint shows its parts and the reasons. */
  public static Figure of(Sketch sketch, Assessment assessment, Request request) {
    PictureFigure picture = new PictureFigure(sketch, assessment, request);
    picture.draw();
    Preset preset = request.preset();
    Figure drawn = new Figure(sketch.name(), picture.width, picture.height, picture.marks);
    return new Figure(
        sketch.name(),
        preset.width(),
        preset.height(request.shown()),
        new Moved(0, 0, preset.scale()).of(drawn));
  }

  private void draw() {
    double inset = request.preset().isFramed() ? 10 : 0;
    double left = MARGIN + inset;
    double top = MARGIN + inset;
    double right = width - MARGIN - inset;
    double bottom = words(left, right, height - MARGIN - inset);
    Optional<Solved> solved =
        assessment instanceof Solved found ? Optional.of(found) : Optional.empty();
    boolean narrow = request.preset().isNarrow();
    if (solved.isPresent() && hasSide() && narrow) {
      bottom -= UNDER;
      under(solved.get(), left, bottom, right);
    } else if (solved.isPresent() && hasSide()) {
      right -= SIDE;
      double below = top + (request.preset().isFramed() ? TitleBlock.TALL : 0);
      side(solved.get(), right + 4, below, bottom);
    }
    if (solved.isPresent() && request.shown().contains(Show.DIAGRAM)) {
      bottom -= DIAGRAM;
      place(
          JointDiagramFigure.of(sketch, solved.get(), request.loadCase(), right - left, DIAGRAM),
          left,
          bottom);
    }
    section(left, top, right - left, bottom - top);
    if (request.preset().isFramed()) {
      new TitleBlock(sketch, width, height).marks().forEach(marks::add);
    }
  }

  private boolean hasSide() {
    return request.shown().contains(Show.READOUTS) || request.shown().contains(Show.LADDER);
  }

  private void place(Figure figure, double x, double y) {
    marks.addAll(new Moved(x, y, 1).of(figure));
  }

  private void section(double x, double y, double wide, double tall) {
    Sheet sheet = SectionFigure.fitted(sketch, wide, tall);
    SectionFigure.Options options =
        new SectionFigure.Options(Part.JOINT, Optional.empty(), false, request.loadCase());
    Figure figure = SectionFigure.of(sketch, assessment, sheet, options);
    List<Mark> shown =
        figure.marks().stream()
            .filter(mark -> Show.isShown(mark.role(), request.shown()))
            .filter(mark -> mark.role() != Role.CAPTION)
            .toList();
    place(new Figure(figure.title(), wide, tall, shown), x, y);
  }

  /** Readouts and ladder side by side below the section. */
  private void under(Solved solved, double left, double top, double right) {
    double wide = (right - left - 6) / 2;
    double x = left;
    if (request.shown().contains(Show.READOUTS)) {
      Figure readouts = ReadoutsFigure.of(sketch, solved, request.loadCase(), wide);
      double scale = Math.min(1, (UNDER - 3) / readouts.height());
      marks.addAll(new Moved(x, top, scale).of(readouts));
      x = right - wide;
    }
    if (request.shown().contains(Show.LADDER)) {
      place(LoadLadderFigure.of(sketch, solved, request.loadCase(), wide, LADDER), x, top + 4);
    }
  }

  /** Readouts and ladder, one below the other, made smaller where there is not room enough. */
  private void side(Solved solved, double x, double top, double bottom) {
    double wide = SIDE - 6;
    List<Mark> side = new ArrayList<>();
    double tall = 0;
    if (request.shown().contains(Show.READOUTS)) {
      Figure readouts = ReadoutsFigure.of(sketch, solved, request.loadCase(), wide);
      side.addAll(readouts.marks());
      tall = readouts.height() + 4;
    }
    if (request.shown().contains(Show.LADDER)) {
      double room = Math.max(SHORTEST_LADDER, Math.min(LADDER, bottom - top - tall));
      Figure ladder = LoadLadderFigure.of(sketch, solved, request.loadCase(), wide, room);
      side.addAll(new Moved(0, tall, 1).of(ladder));
      tall += room;
    }
    double scale = Math.min(1, (bottom - top) / tall);
    marks.addAll(new Moved(x, top, scale).of(new Figure("Side", wide, tall, side)));
  }

  /** Caption and caution at the bottom; gives where what is above them must end. */
  private double words(double left, double right, double bottom) {
    Tag tag = Tag.of(Role.CAPTION, Part.JOINT);
    List<String> caution =
        TextWidth.wrapped(Sentences.CAUTION, right - left, CAUTION_SIZE, Mark.Weight.REGULAR);
    double y = bottom;
    for (int i = caution.size() - 1; i >= 0; i--) {
      marks.add(line(tag, left, y, caution.get(i), CAUTION_SIZE));
      y -= 1.25 * CAUTION_SIZE;
    }
    if (!request.caption().isBlank()) {
      List<String> caption =
          TextWidth.wrapped(request.caption(), right - left, CAPTION_SIZE, Mark.Weight.REGULAR);
      y -= 0.8;
      for (int i = caption.size() - 1; i >= 0; i--) {
        Tag name = Tag.of(Role.NAME, Part.JOINT);
        marks.add(line(name, left, y, caption.get(i), CAPTION_SIZE));
        y -= 1.3 * CAPTION_SIZE;
      }
    }
    return y - 1;
  }

  private static Mark line(Tag tag, double x, double y, String text, double size) {
    return new Mark.Text(tag, new Point(x, y), text, Mark.Anchor.START, size, Mark.Weight.REGULAR);
  }
}

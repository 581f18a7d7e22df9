package clampwright.app;

import clampwright.figure.PictureFigure;
import clampwright.figure.Preset;
import clampwright.figure.Show;
import clampwright.joint.Sketch;
import clampwright.quantity.UnitSystem;
import clampwright.store.PictureFormat;
import clampwright.store.SketchFile;
import clampwright.store.Stored;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Writes pictures of sketches without a display, many at once. */
@Command(
    name = "figure",
    description = "Write a picture of each sketch: PNG, SVG or PDF.",
    mixinStandardHelpOptions = true,
    versionProvider = CommandLineTool.Version.class,
    exitCodeListHeading = "%nExit codes:%n",
    exitCodeList = {
      "0:all pictures were written",
      "2:a file cannot be read or written, or the command was not understood"
    })
final class FigureCommand implements Callable<Integer> {
  private static final int FAILED = 2;
  private static final double MM_PER_INCH = 25.4;

  private final PrintStream out;
  private final PrintStream err;

  @Parameters(arity = "1..*", paramLabel = "FILE", description = "*.joint.json sketches")
  private List<Path> files;

  @Option(
      names = {"-o", "--output"},
      required = true,
      paramLabel = "OUT",
      description =
          "picture to write, its ending says which kind: .png, .svg, .pdf; for many sketches a"
              + " folder, with --kind")
  private Path output;

  @Option(
      names = "--kind",
      paramLabel = "KIND",
      description = "png, svg or pdf, where the output is a folder; png unless said")
  private String kind = "png";

  @Option(names = "--preset", paramLabel = "PRESET", description = "slide, column, page or sheet")
  private String preset = Preset.PAGE.word();

  @Option(
      names = "--show",
      split = ",",
      paramLabel = "WHAT",
      description =
          "cones, cylinders, governing, dimensions, names, forces, readouts, ladder, diagram")
  private List<String> show = List.of();

  @Option(names = "--theme", paramLabel = "THEME", description = "light, dark or bw")
  private String theme = "light";

  @Option(names = "--dpi", paramLabel = "DPI", description = "resolution of a PNG, 300 unless said")
  private double dpi = 300;

  @Option(
      names = "--without-sketch",
      description = "leave the sketch out, which else lies inside, so that the picture opens again")
  private boolean withoutSketch;

  @Option(
      names = "--width",
      paramLabel = "PX",
      description = "width of a PNG in pixels, in place of --dpi")
  private int width;

  @Option(
      names = "--units",
      paramLabel = "UNITS",
      description = "mm-N or in-lbf; those of the sketch unless said")
  private String units = "";

  @Option(names = "--caption", paramLabel = "TEXT", description = "a sentence below the picture")
  private String caption = "";

  FigureCommand(PrintStream out, PrintStream err) {
    this.out = out;
    this.err = err;
  }

  @Override
  public Integer call() {
    Optional<Picture> picture = picture();
    if (picture.isEmpty()) {
      return FAILED;
    }
    boolean single = files.size() == 1 && !Files.isDirectory(output);
    AtomicInteger done = new AtomicInteger();
    AtomicInteger failed = new AtomicInteger();
    files.parallelStream()
        .forEach(
            file -> {
              Path to = single ? output : output.resolve(named(file, picture.get()));
              if (!write(file, to, picture.get())) {
                failed.incrementAndGet();
              }
              progress(done.incrementAndGet());
            });
    return failed.get() == 0 ? 0 : FAILED;
  }

  private synchronized void progress(int done) {
    if (files.size() > 1) {
      out.println(done + " of " + files.size());
      out.flush();
    }
  }

  private static String named(Path sketch, Picture picture) {
    String name = sketch.getFileName().toString();
    String bare =
        name.endsWith(SketchFile.EXTENSION)
            ? name.substring(0, name.length() - SketchFile.EXTENSION.length())
            : name;
    return bare + picture.format().ending();
  }

  /** What was asked; empty when a word is not known, which is said then. */
  private Optional<Picture> picture() {
    boolean folder = files.size() > 1 || Files.isDirectory(output);
    String name = output.getFileName() == null ? "" : output.getFileName().toString();
    String ending = folder ? kind : name.substring(name.lastIndexOf('.') + 1);
    Optional<PictureFormat> of =
        find(Stream.of(PictureFormat.values()), format -> format.ending().substring(1), ending);
    Optional<Preset> size = find(Stream.of(Preset.values()), Preset::word, preset);
    Optional<Picture.Theme> look =
        find(Stream.of(Picture.Theme.values()), Picture.Theme::word, theme);
    Set<Show> shown = show.isEmpty() ? Show.USUAL : EnumSet.noneOf(Show.class);
    Optional<UnitSystem> system =
        units.isEmpty()
            ? Optional.empty()
            : find(Stream.of(UnitSystem.values()), FigureCommand::word, units);
    boolean known = units.isEmpty() || system.isPresent();
    for (String word : show) {
      Optional<Show> found = find(Stream.of(Show.values()), Show::word, word);
      found.ifPresent(shown::add);
      known &= found.isPresent();
    }
    if (of.isEmpty() || size.isEmpty() || look.isEmpty() || !known) {
      return Optional.empty();
    }
    double resolution = width == 0 ? dpi : width / (size.get().width() / MM_PER_INCH);
    if (!(resolution >= 10 && resolution <= 2400)) {
      err.println(
          width == 0
              ? "--dpi must lie between 10 and 2400"
              : "--width comes to a resolution outside 10 to 2400 dpi");
      return Optional.empty();
    }
    PictureFigure.Request request = new PictureFigure.Request(size.get(), shown, caption, 0);
    return Optional.of(
        new Picture(of.get(), look.get(), resolution, !withoutSketch, system, request));
  }

  private static String word(UnitSystem system) {
    return system == UnitSystem.METRIC ? "mm-N" : "in-lbf";
  }

  private <T> Optional<T> find(
      Stream<T> all, java.util.function.Function<T, String> word, String asked) {
    List<T> list = all.toList();
    Optional<T> found =
        list.stream().filter(each -> word.apply(each).equalsIgnoreCase(asked)).findFirst();
    if (found.isEmpty()) {
      err.println(
          "'"
              + asked
              + "' is not known here; there are: "
              + list.stream().map(word).collect(Collectors.joining(", ")));
    }
    return found;
  }

  private boolean write(Path file, Path to, Picture picture) {
    Stored stored = SketchFile.read(file);
    if (stored instanceof Stored.Refused refused) {
      complain(file, String.join("; ", refused.problems()));
      return false;
    }
    Sketch sketch = ((Stored.Opened) stored).sketch();
    try {
      Files.write(to, picture.bytes(sketch));
      return true;
    } catch (IOException e) {
      complain(to, "cannot be written: " + e.getMessage());
      return false;
    }
  }

  private synchronized void complain(Path file, String what) {
    err.println(file + ": " + what);
  }
}

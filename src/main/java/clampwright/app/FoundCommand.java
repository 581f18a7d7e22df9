package clampwright.app;

import clampwright.figure.Sentences;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.Assessment.Unsolved;
import clampwright.store.SketchFile;
import clampwright.store.Stored;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Prints the readouts of a sketch without a display. */
@Command(
    name = "found",
    description = "Print what a sketch comes to, without a display.",
    mixinStandardHelpOptions = true,
    versionProvider = CommandLineTool.Version.class,
    exitCodeListHeading = "%nExit codes:%n",
    exitCodeList = {
      "0:the readouts were printed; remarks on the file, if any, went to standard error",
      "2:the file cannot be read, or the command was not understood",
      "3:the joint has no solution"
    })
final class FoundCommand implements Callable<Integer> {
  static final int UNREADABLE = 2;
  static final int UNSOLVED = 3;

  private final PrintStream out;
  private final PrintStream err;

  @Parameters(
      index = "0",
      paramLabel = "FILE",
      description = "a *.joint.json sketch, or a picture with one inside")
  private Path file;

  @Option(names = "--json", description = "for programs: JSON in mm, mm², N, N/mm, degrees; UTF-8")
  private boolean json;

  FoundCommand(PrintStream out, PrintStream err) {
    this.out = out;
    this.err = err;
  }

  @Override
  public Integer call() {
    Stored stored = SketchFile.read(file);
    if (stored instanceof Stored.Refused refused) {
      complain(line(refused.problems()));
      return UNREADABLE;
    }
    Stored.Opened opened = (Stored.Opened) stored;
    opened.remarks().forEach(this::complain);
    return found(opened.sketch());
  }

  /** One line, however many problems there are. */
  private static String line(List<String> problems) {
    int most = 10;
    String told = problems.stream().limit(most).collect(Collectors.joining("; "));
    return problems.size() > most ? told + "; and more" : told;
  }

  private int found(Sketch sketch) {
    Assessment assessment = Assessment.of(sketch.joint());
    if (assessment instanceof Solved solved) {
      print(sketch, solved);
      return 0;
    }
    for (var reason : ((Unsolved) assessment).reasons()) {
      String sentence = Sentences.reason(reason, sketch.units());
      complain(Places.told(reason.part(), sketch.joint(), sentence));
    }
    return UNSOLVED;
  }

  private void print(Sketch sketch, Solved solved) {
    if (json) {
      // Programs get the same bytes on every machine.
      byte[] bytes = FoundJson.of(sketch, solved).getBytes(StandardCharsets.UTF_8);
      out.write(bytes, 0, bytes.length);
    } else {
      out.print(FoundTable.of(sketch, solved));
    }
    out.flush();
  }

  private void complain(String what) {
    err.println(file + ": " + what);
  }
}

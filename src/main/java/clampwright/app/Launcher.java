package clampwright.app;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.PrintStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;

/**
 * Where the program starts. Does not extend the application class, so that the program also starts
 * from a plain jar, and touches no screen before it is known that one is wanted.
 */
public final class Launcher {
  private Launcher() {}

  /** Opens the editor, with the sketch named by the first argument if any, or runs a command. */
  public static void main(String[] arguments) {
    if (CommandLineTool.isForEditor(arguments)) {
      EditorStart.open(arguments);
    } else {
      PrintStream out = readable(System.out, FileDescriptor.out);
      PrintStream err = readable(System.err, FileDescriptor.err);
      System.exit(CommandLineTool.run(out, err, arguments));
    }
  }

  /** Where no language is set, Java writes ASCII only, and every Ø and ° would become a "?". */
  private static PrintStream readable(PrintStream stream, FileDescriptor descriptor) {
    return Charset.defaultCharset().equals(StandardCharsets.US_ASCII)
        ? new PrintStream(new FileOutputStream(descriptor), true, StandardCharsets.UTF_8)
        : stream;
  }
}

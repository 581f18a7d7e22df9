package clampwright.app;

import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;

/** The commands that need no display. */
@Command(
    name = "clampwright",
    mixinStandardHelpOptions = true,
    versionProvider = CommandLineTool.Version.class,
    synopsisHeading = "Usage:%n",
    customSynopsis = {
      "  clampwright [FILE]               open the editor",
      "  clampwright found FILE [--json]  print the readouts without a display",
      "  clampwright figure FILE… -o OUT  write pictures without a display"
    },
    optionListHeading = "%nOptions:%n",
    commandListHeading = "%nCommands:%n",
    footerHeading = "%n",
    footer = "An early sizing aid: see the cautions in the program and its README.")
final class CommandLineTool {
  private CommandLineTool() {}

  /** The version that the build wrote into the program. */
  static final class Version implements IVersionProvider {
    @Override
    public String[] getVersion() {
      String version = CommandLineTool.class.getPackage().getImplementationVersion();
      return new String[] {"Clampwright " + (version == null ? "(unpackaged)" : version)};
    }
  }

  /**
   * Whether these arguments ask for the editor: none, or one that can be a file. A lone word that
   * names no file is taken for a command that was mistyped.
   */
  static boolean isForEditor(String... arguments) {
    return arguments.length == 0
        || arguments.length == 1 && !arguments[0].startsWith("-") && canBeFile(arguments[0]);
  }

  private static boolean canBeFile(String argument) {
    try {
      Path path = Path.of(argument);
      boolean word = argument.matches("[\\p{Alpha}-]*");
      return !word || Files.exists(path) && !argument.equals("found") && !argument.equals("figure");
    } catch (InvalidPathException e) {
      return false;
    }
  }

  /** Runs a command; what comes back is the exit code. */
  static int run(PrintStream out, PrintStream err, String... arguments) {
    return new CommandLine(new CommandLineTool())
        .addSubcommand(new FoundCommand(out, err))
        .addSubcommand(new FigureCommand(out, err))
        .setExpandAtFiles(false)
        .setOut(new PrintWriter(out, true))
        .setErr(new PrintWriter(err, true))
        .execute(arguments);
  }
}

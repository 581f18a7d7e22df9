package clampwright.bench;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.ToLongFunction;

/**
 * Time from starting the process to the first painted window: the program beside an empty window
 * started the same way, in turn. House target: at most 1.5 times.
 */
final class StartupBench {
  private static final int WARM_UP = 2;
  private static final int RUNS = 11;

  private StartupBench() {}

  /** When a process has painted [ns from its start]. */
  private record Start(long first, long complete) {}

  static void run() throws IOException {
    Path settings = Files.createTempDirectory("clampwright-bench");
    List<Start> empty = new ArrayList<>();
    List<Start> program = new ArrayList<>();
    for (int i = 0; i < WARM_UP + RUNS; i++) {
      empty.add(start("empty", settings));
      program.add(start("program", settings));
    }
    Times without = times(empty, Start::first);
    Times with = times(program, Start::first);
    System.out.println(without.line("empty window"));
    System.out.println(with.line("program, first painted"));
    System.out.println(times(program, Start::complete).line("program, all panes"));
    System.out.println(
        String.format(
            Locale.ROOT,
            "program over empty window, first painted, medians: %.2f (target at most 1.5)",
            with.at(0.5) / without.at(0.5)));
  }

  private static Times times(List<Start> starts, ToLongFunction<Start> time) {
    return new Times(starts.stream().skip(WARM_UP).mapToLong(time).toArray());
  }

  private static Start start(String what, Path settings) throws IOException {
    ProcessBuilder builder = new ProcessBuilder(command(what, settings));
    builder.environment().put("XDG_CONFIG_HOME", settings.toString());
    builder.redirectError(ProcessBuilder.Redirect.DISCARD);
    long start = System.nanoTime();
    Process process = builder.start();
    try (BufferedReader out =
        new BufferedReader(
            new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8))) {
      expect(FirstWindow.PAINTED, out.readLine());
      long first = System.nanoTime() - start;
      if (what.equals("empty")) {
        return new Start(first, first);
      }
      expect(FirstWindow.COMPLETE, out.readLine());
      return new Start(first, System.nanoTime() - start);
    }
  }

  private static void expect(String line, String said) throws IOException {
    if (!line.equals(said)) {
      throw new IOException("expected '" + line + "', but the process said: " + said);
    }
  }

  private static List<String> command(String what, Path settings) {
    List<String> command = new ArrayList<>();
    command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
    HeadlessScreen.PROPERTIES.forEach((name, value) -> command.add("-D" + name + "=" + value));
    command.add("-Duser.home=" + settings);
    command.addAll(List.of("-cp", System.getProperty("java.class.path")));
    command.addAll(List.of(FirstWindow.class.getName(), what));
    return command;
  }
}

package clampwright.store;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The sketches that come with the program. */
public final class Samples {
  private static final String FOLDER = "/clampwright/samples/";
  private static final String LIST = "samples.txt";

  /**
   * A sample.
   *
   * @param file its file name
   * @param title what it shows
   */
  public record Sample(String file, String title) {}

  private Samples() {}

  /** All samples in the order they are offered; the first opens with the editor. */
  public static List<Sample> all() {
    return text(LIST).lines().filter(line -> !line.isBlank()).map(Samples::sample).toList();
  }

  private static Sample sample(String line) {
    int tab = line.indexOf('\t');
    return new Sample(line.substring(0, tab), line.substring(tab + 1).strip());
  }

  public static Stored open(Sample sample) {
    return SketchJson.read(text(sample.file()));
  }

  private static String text(String file) {
    try (InputStream in = Samples.class.getResourceAsStream(FOLDER + file)) {
      if (in == null) {
        throw new IOException("the sample " + file + " is missing from the program");
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}

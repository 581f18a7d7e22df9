package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javafx.scene.paint.Color;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The first frame has no style sheet; it must not flash in other colours. */
class LooksTest {

  @ParameterizedTest
  @CsvSource({"light, false", "dark, true"})
  void theFirstFrameHasTheColoursOfTheStyleSheet(String name, boolean dark) throws IOException {
    assertEquals(colour(name, "-cw-window"), Looks.window(dark));
    assertEquals(colour(name, "-cw-pane"), Looks.pane(dark));
  }

  private static Color colour(String name, String variable) throws IOException {
    try (InputStream in = Looks.class.getResourceAsStream("/clampwright/styles/" + name + ".css")) {
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      Matcher found = Pattern.compile(variable + ":\\s*(#[0-9A-Fa-f]{6});").matcher(text);
      assertTrue(found.find(), variable);
      return Color.web(found.group(1));
    }
  }
}

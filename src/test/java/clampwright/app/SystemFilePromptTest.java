package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import javafx.stage.FileChooser.ExtensionFilter;
import org.junit.jupiter.api.Test;

/** What the system's dialog offers. */
class SystemFilePromptTest {

  @Test
  void opensSketchesAndPictures() {
    assertEquals(
        List.of(
            List.of("*.joint.json", "*.json", "*.png", "*.svg", "*.pdf"),
            List.of("*.joint.json", "*.json"),
            List.of("*.png", "*.svg", "*.pdf"),
            List.of("*")),
        SystemFilePrompt.toOpenOffered().stream().map(ExtensionFilter::getExtensions).toList());
  }
}

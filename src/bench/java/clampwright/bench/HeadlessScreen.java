package clampwright.bench;

import java.util.Map;

/** The screen that benchmarks are shown on: in memory, software pipeline, as in the tests. */
final class HeadlessScreen {
  static final Map<String, String> PROPERTIES =
      Map.of(
          "glass.platform", "Monocle",
          "monocle.platform", "Headless",
          "headless.geometry", "1920x1200-32",
          "prism.order", "sw",
          "prism.text", "t2k",
          "java.awt.headless", "true");

  private HeadlessScreen() {}

  /** To be called before the toolkit starts. */
  static void use() {
    PROPERTIES.forEach(System::setProperty);
  }
}

package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

/** Texts of sketch files for tests. */
final class Texts {
  private Texts() {}

  /** A sketch of one layer, as short as the format allows. */
  static final String SHORTEST =
      """
      {
        "format": 1,
        "name": "Shortest",
        "bolt": {
          "thread": {"designation": "M10", "form": "metric", "diameter": 10, "pitch": 1.5},
          "head": {
            "style": "hexagon", "standard": "own size",
            "bearingDiameter": 14.63, "height": 6.4, "width": 16
          },
          "anchor": {
            "kind": "nut", "standard": "own size",
            "bearingDiameter": 14.6, "height": 8.4, "width": 16
          },
          "strength": {"standard": "ISO 898-1", "grade": "8.8", "tensile": 800},
          "material": {"name": "steel", "modulus": 206000}
        },
        "stack": [
          {
            "name": "Cover", "thickness": 20, "hole": 11,
            "outline": {"shape": "wide"},
            "material": {"name": "steel", "modulus": 206000}
          }
        ],
        "preload": {"force": 20000},
        "load": {"axial": 5000}
      }
      """;

  /** The shortest sketch with one piece of its text replaced. */
  static String with(String piece, String other) {
    assertTrue(SHORTEST.contains(piece), piece);
    return SHORTEST.replace(piece, other);
  }

  static Stored.Opened opened(String text) {
    if (SketchJson.read(text) instanceof Stored.Opened opened) {
      return opened;
    }
    throw new AssertionError("refused: " + problems(text));
  }

  static List<String> problems(String text) {
    if (SketchJson.read(text) instanceof Stored.Refused refused) {
      return refused.problems();
    }
    throw new AssertionError("opened: " + text);
  }

  /** A picture that carries a text, which may be no sketch. */
  static byte[] carried(PictureFormat format, String text) {
    byte[] picture = Pictures.of(format);
    return switch (format) {
      case PNG -> TextInPng.with(picture, text);
      case SVG -> TextInSvg.with(picture, text);
      case PDF -> TextInPdf.with(picture, text);
    };
  }
}

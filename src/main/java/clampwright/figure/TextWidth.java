package clampwright.figure;

import java.text.Normalizer;
import java.util.ArrayList;
import java.util.List;

/**
 * How wide words are in the typeface of the figures, Liberation Sans, so that labels can be placed
 * without a screen. Advance widths in thousandths of the type size, read from the typeface itself;
 * kerning is left out, which can only make words narrower.
 */
public final class TextWidth {
  private static final int FIRST = ' ';
  private static final int UNKNOWN = 800;

  private static final int[] REGULAR = {
    278, 278, 355, 556, 556, 889, 667, 191, 333, 333, 389, 584, 278, 333, 278, 278,
    556, 556, 556, 556, 556, 556, 556, 556, 556, 556, 278, 278, 584, 584, 584, 556,
    1015, 667, 667, 722, 722, 667, 611, 778, 722, 278, 500, 667, 556, 833, 722, 778,
    667, 778, 722, 667, 611, 722, 667, 944, 667, 667, 611, 278, 278, 278, 469, 556,
    333, 556, 556, 500, 556, 556, 278, 556, 556, 222, 222, 500, 222, 833, 556, 556,
    556, 556, 333, 500, 278, 556, 500, 722, 500, 500, 500, 334, 260, 334, 584
  };
  private static final int[] BOLD = {
    278, 333, 474, 556, 556, 889, 722, 238, 333, 333, 389, 584, 278, 333, 278, 278,
    556, 556, 556, 556, 556, 556, 556, 556, 556, 556, 333, 333, 584, 584, 584, 611,
    975, 722, 722, 722, 722, 667, 611, 778, 722, 278, 556, 722, 611, 833, 722, 778,
    667, 778, 722, 667, 611, 722, 667, 944, 667, 667, 611, 333, 278, 333, 584, 556,
    333, 556, 611, 556, 611, 556, 333, 611, 611, 278, 278, 556, 278, 889, 611, 611,
    611, 611, 389, 556, 333, 611, 556, 778, 556, 556, 500, 389, 280, 389, 584
  };

  private TextWidth() {}

  /** Width of a line [in the unit of the size]. */
  public static double of(String text, double size, Mark.Weight weight) {
    int[] widths = weight == Mark.Weight.BOLD ? BOLD : REGULAR;
    long sum = 0;
    for (int at = 0; at < text.length(); ) {
      int code = text.codePointAt(at);
      sum += thousandths(code, widths);
      at += Character.charCount(code);
    }
    return sum * size / 1000;
  }

  private static int thousandths(int code, int[] widths) {
    int index = code - FIRST;
    if (index >= 0 && index < widths.length) {
      return widths[index];
    }
    return switch (code) {
      case 'Ø' -> 778;
      case '·', '²', '³' -> 333;
      case '–' -> 556;
      case '−', '×', '±' -> 584;
      case '°' -> 400;
      case '≤', '≥' -> 549;
      case '…', '—' -> 1000;
      case 'ß' -> 611;
      case 'µ', 'μ' -> 612;
      case 0xA0 -> 278;
      case 0x202F -> 200;
      default -> letter(code, widths);
    };
  }

  /** An accented letter is as wide as the bare one; anything else is taken wide. */
  private static int letter(int code, int[] widths) {
    String bare = Normalizer.normalize(Character.toString(code), Normalizer.Form.NFD);
    int index = bare.charAt(0) - FIRST;
    return index >= 0 && index < widths.length ? widths[index] : UNKNOWN;
  }

  /** The line, cut with an ellipsis where it would be wider than there is room. */
  public static String cut(String text, double room, double size, Mark.Weight weight) {
    if (of(text, size, weight) <= room) {
      return text;
    }
    int end = text.length();
    while (end > 0 && of(text.substring(0, end).stripTrailing() + "…", size, weight) > room) {
      end = text.offsetByCodePoints(end, -1);
    }
    return text.substring(0, end).stripTrailing() + "…";
  }

  /** The words in lines no wider than the room; a single word that is wider stands alone, cut. */
  public static List<String> wrapped(String text, double room, double size, Mark.Weight weight) {
    List<String> lines = new ArrayList<>();
    String line = "";
    for (String word : text.strip().split("\\s+")) {
      String longer = line.isEmpty() ? word : line + " " + word;
      if (!line.isEmpty() && of(longer, size, weight) > room) {
        lines.add(cut(line, room, size, weight));
        line = word;
      } else {
        line = longer;
      }
    }
    lines.add(cut(line, room, size, weight));
    return lines;
  }
}

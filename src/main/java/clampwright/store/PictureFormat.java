package clampwright.store;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The formats of pictures that can carry a sketch. */
public enum PictureFormat {
  PNG(".png"),
  SVG(".svg"),
  PDF(".pdf");

  private static final byte[] PNG_SIGNATURE = {(byte) 0x89, 'P', 'N', 'G', '\r', '\n', 0x1A, '\n'};
  private static final byte[] PDF_HEADER = {'%', 'P', 'D', 'F', '-'};

  /** [bytes]; long licences in comments come before the drawing. */
  private static final int SVG_HEAD = 1 << 14;

  private static final String BYTE_ORDER_MARK = "\u00EF\u00BB\u00BF";
  private static final Pattern NOT_ELEMENTS = Pattern.compile("(?s)<!--.*?-->|<\\?.*?\\?>");
  private static final Pattern FIRST_NAME =
      Pattern.compile("<(?:!DOCTYPE\\s+)?([A-Za-z_][\\w.:-]*)");

  private final String ending;

  PictureFormat(String ending) {
    this.ending = ending;
  }

  /** How names of such files end, with the dot. */
  public String ending() {
    return ending;
  }

  /** The format by the first bytes, whatever the file is called; empty for anything else. */
  public static Optional<PictureFormat> of(byte[] bytes) {
    if (begins(bytes, PNG_SIGNATURE)) {
      return Optional.of(PNG);
    }
    if (begins(bytes, PDF_HEADER)) {
      return Optional.of(PDF);
    }
    return isSvg(bytes) ? Optional.of(SVG) : Optional.empty();
  }

  private static boolean begins(byte[] bytes, byte[] first) {
    return bytes.length >= first.length
        && Arrays.equals(bytes, 0, first.length, first, 0, first.length);
  }

  /** Whether the first element, or the document type, is that of SVG. */
  private static boolean isSvg(byte[] bytes) {
    int length = Math.min(bytes.length, SVG_HEAD);
    String head = new String(bytes, 0, length, StandardCharsets.ISO_8859_1);
    String text = (head.startsWith(BYTE_ORDER_MARK) ? head.substring(3) : head).stripLeading();
    if (!text.startsWith("<")) {
      return false;
    }
    Matcher first = FIRST_NAME.matcher(NOT_ELEMENTS.matcher(text).replaceAll(""));
    return first.find() && (first.group(1).equals("svg") || first.group(1).endsWith(":svg"));
  }
}

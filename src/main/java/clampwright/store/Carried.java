package clampwright.store;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * The text that a picture carries, and the check sum that stands beside it there: by that, a text
 * with a flipped bit that still reads as a sketch is told from another sketch.
 *
 * @param text with or without white space around it, which some programs add or take away
 * @param checksum SHA-256 of the text without that white space, in lower-case hexadecimal digits
 */
record Carried(String text, String checksum) {

  /** A text with its check sum. */
  static Carried of(String text) {
    return new Carried(text, sum(text));
  }

  /** Whether the text is the one that the check sum was made for. */
  boolean isSound() {
    return sum(text).equals(checksum);
  }

  private static String sum(String text) {
    byte[] bytes = text.strip().getBytes(StandardCharsets.UTF_8);
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }
}

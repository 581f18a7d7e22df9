package clampwright.store;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/**
 * A text inside a PNG picture: packed in an international text chunk, its check sum in a plain text
 * chunk behind that, both before the pixels. All other chunks stay as they are.
 */
final class TextInPng {
  private static final String KEYWORD = "clampwright-sketch";
  private static final String SUM_KEYWORD = "clampwright-sketch-sha256";
  private static final String TEXT = "iTXt";
  private static final String PLAIN_TEXT = "tEXt";
  private static final String PIXELS = "IDAT";
  private static final String END = "IEND";

  private TextInPng() {}

  /**
   * The same picture with a text.
   *
   * @throws IllegalArgumentException when a picture has no pixels
   */
  static byte[] with(byte[] picture, String text) {
    int place = pixels(picture);
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    out.write(picture, 0, place);
    out.writeBytes(PngChunk.bytes(TEXT, packed(text)));
    out.writeBytes(PngChunk.bytes(PLAIN_TEXT, sum(text)));
    out.write(picture, place, picture.length - place);
    return out.toByteArray();
  }

  private static int pixels(byte[] picture) {
    int start = PngChunk.FIRST;
    while (true) {
      PngChunk chunk =
          PngChunk.at(picture, start)
              .orElseThrow(() -> new IllegalArgumentException("a PNG picture has pixels"));
      if (chunk.type().equals(PIXELS)) {
        return start;
      }
      start = chunk.end();
    }
  }

  /** Keyword, packed (1) by zlib (0), no language, no translated keyword, text. */
  private static byte[] packed(String text) {
    ByteArrayOutputStream data = new ByteArrayOutputStream();
    data.writeBytes(latin(KEYWORD + "\0\1\0\0\0"));
    data.writeBytes(Packing.packed(text));
    return data.toByteArray();
  }

  private static byte[] sum(String text) {
    return latin(SUM_KEYWORD + "\0" + Carried.of(text).checksum());
  }

  private static byte[] latin(String text) {
    return text.getBytes(StandardCharsets.ISO_8859_1);
  }

  /** The text in a picture; empty for a whole picture without one. */
  static Optional<Carried> read(byte[] picture) throws PictureTrouble {
    Optional<String> text = Optional.empty();
    Optional<String> sum = Optional.empty();
    boolean sound = true;
    PngChunk chunk;
    for (int start = PngChunk.FIRST; text.isEmpty() || sum.isEmpty(); start = chunk.end()) {
      chunk = whole(picture, start);
      sound &= chunk.isSound();
      if (chunk.type().equals(END)) {
        return none(picture, sound, text);
      }
      if (chunk.type().equals(TEXT) && chunk.after(KEYWORD).isPresent()) {
        text = Optional.of(text(chunk));
      } else if (chunk.type().equals(PLAIN_TEXT) && chunk.after(SUM_KEYWORD).isPresent()) {
        sum = Optional.of(sum(chunk));
      }
    }
    return Optional.of(new Carried(text.get(), sum.get()));
  }

  private static PngChunk whole(byte[] picture, int start) throws PictureTrouble {
    Optional<PngChunk> chunk = PngChunk.at(picture, start);
    if (chunk.isEmpty()) {
      throw PictureTrouble.broken(picture, KEYWORD, "the picture ends too early");
    }
    return chunk.get();
  }

  private static Optional<Carried> none(byte[] picture, boolean sound, Optional<String> text)
      throws PictureTrouble {
    if (text.isPresent()) {
      throw PictureTrouble.damaged("its check sum is missing");
    }
    if (!sound) {
      throw PictureTrouble.broken(picture, KEYWORD, "its bytes are not those that were written");
    }
    return Optional.empty();
  }

  private static String sum(PngChunk chunk) throws PictureTrouble {
    return Packing.plain(chunk.picture(), chunk.after(SUM_KEYWORD).orElseThrow(), chunk.dataEnd());
  }

  private static String text(PngChunk chunk) throws PictureTrouble {
    if (!chunk.isSound()) {
      throw PictureTrouble.damaged("its bytes are not those that were written");
    }
    int flags = chunk.after(KEYWORD).orElseThrow();
    int language = flags + 2;
    int text = afterZero(chunk, afterZero(chunk, language));
    boolean packed = chunk.picture()[flags] != 0;
    return packed
        ? Packing.unpacked(chunk.picture(), text, chunk.dataEnd())
        : Packing.plain(chunk.picture(), text, chunk.dataEnd());
  }

  private static int afterZero(PngChunk chunk, int from) throws PictureTrouble {
    for (int i = from; i < chunk.dataEnd(); i++) {
      if (chunk.picture()[i] == 0) {
        return i + 1;
      }
    }
    throw PictureTrouble.damaged("its chunk has no text");
  }
}

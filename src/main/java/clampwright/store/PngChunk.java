package clampwright.store;

import java.io.ByteArrayOutputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.zip.CRC32;

/**
 * A chunk as it lies in a PNG picture (ISO/IEC 15948:2004, 5.3): length, type, data, check sum.
 *
 * @param picture that it lies in
 * @param start of the whole chunk [bytes from the picture's start]
 * @param length of its data alone [bytes]
 */
record PngChunk(byte[] picture, int start, int length) {
  /** Where the first chunk of a picture starts. */
  static final int FIRST = 8;

  private static final int BEFORE_DATA = 8;
  private static final int AFTER_DATA = 4;

  /** The chunk that starts at a place; empty when the picture ends before it does. */
  static Optional<PngChunk> at(byte[] picture, int start) {
    int room = picture.length - start - BEFORE_DATA - AFTER_DATA;
    if (room < 0) {
      return Optional.empty();
    }
    int length = ByteBuffer.wrap(picture).getInt(start);
    return length >= 0 && length <= room
        ? Optional.of(new PngChunk(picture, start, length))
        : Optional.empty();
  }

  /** The bytes of a new chunk. */
  static byte[] bytes(String type, byte[] data) {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (DataOutputStream out = new DataOutputStream(bytes)) {
      out.writeInt(data.length);
      out.writeBytes(type);
      out.write(data);
      CRC32 sum = new CRC32();
      sum.update(bytes.toByteArray(), AFTER_DATA, AFTER_DATA + data.length);
      out.writeInt((int) sum.getValue());
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return bytes.toByteArray();
  }

  String type() {
    return new String(picture, start + 4, 4, StandardCharsets.ISO_8859_1);
  }

  int dataStart() {
    return start + BEFORE_DATA;
  }

  int dataEnd() {
    return dataStart() + length;
  }

  /** Where the next chunk starts. */
  int end() {
    return dataEnd() + AFTER_DATA;
  }

  /** Whether its check sum is right. */
  boolean isSound() {
    CRC32 sum = new CRC32();
    sum.update(picture, start + 4, 4 + length);
    return (int) sum.getValue() == ByteBuffer.wrap(picture).getInt(dataEnd());
  }

  /** Where the data go on behind a first word that ends with a zero; empty for another word. */
  Optional<Integer> after(String keyword) {
    byte[] word = (keyword + "\0").getBytes(StandardCharsets.ISO_8859_1);
    boolean begins =
        length >= word.length
            && ByteBuffer.wrap(picture, dataStart(), word.length).equals(ByteBuffer.wrap(word));
    return begins ? Optional.of(dataStart() + word.length) : Optional.empty();
  }
}

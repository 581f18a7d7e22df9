package clampwright.store;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.zip.DeflaterOutputStream;
import java.util.zip.InflaterInputStream;

/** Texts as bytes: UTF-8, as they are or packed by zlib. */
final class Packing {
  /** [bytes], unpacked; far more than a sketch, far less than the memory. */
  static final int LARGEST = 20_000_000;

  private Packing() {}

  static byte[] packed(String text) {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (DeflaterOutputStream out = new DeflaterOutputStream(bytes)) {
      out.write(text.getBytes(StandardCharsets.UTF_8));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return bytes.toByteArray();
  }

  /** The packed text in a stretch of a picture; what follows it there is ignored. */
  static String unpacked(byte[] picture, int start, int end) throws PictureTrouble {
    ByteArrayInputStream packed = new ByteArrayInputStream(picture, start, end - start);
    try (InputStream in = new InflaterInputStream(packed)) {
      byte[] bytes = in.readNBytes(LARGEST + 1);
      return plain(bytes, 0, bytes.length);
    } catch (IOException e) {
      throw PictureTrouble.damaged("its text cannot be unpacked");
    }
  }

  /** The text that is a stretch of a picture. */
  static String plain(byte[] picture, int start, int end) throws PictureTrouble {
    if (end - start > LARGEST) {
      throw PictureTrouble.tooLarge();
    }
    try {
      ByteBuffer bytes = ByteBuffer.wrap(picture, start, end - start);
      return StandardCharsets.UTF_8.newDecoder().decode(bytes).toString();
    } catch (CharacterCodingException e) {
      throw PictureTrouble.damaged("its text is not UTF-8");
    }
  }
}

package clampwright.store;

import clampwright.joint.Sketch;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.SequenceInputStream;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/** A sketch in a file. A file is always the old sketch or the new one, whole. */
public final class SketchFile {
  public static final String EXTENSION = ".joint.json";

  /** [bytes]; a thousand layers come to a tenth of it. */
  static final int LARGEST = 4_000_000;

  /** [bytes]; a large sheet at the resolution of a printer comes to a tenth of it. */
  static final int LARGEST_PICTURE = 100_000_000;

  private SketchFile() {}

  /**
   * Reads a sketch, also out of a picture with one inside; whatever the path leads to, the answer
   * is a sketch or the problems.
   */
  public static Stored read(Path path) {
    if (Files.isDirectory(path)) {
      return refused("This is a folder, not a sketch file.");
    }
    // A pipe or a device could keep the program waiting for ever.
    if (Files.exists(path) && !Files.isRegularFile(path)) {
      return refused("This is not a file that can be read as a sketch.");
    }
    try (InputStream in = Files.newInputStream(path)) {
      byte[] bytes = in.readNBytes(LARGEST + 1);
      if (PictureFormat.of(bytes).isPresent()) {
        return picture(bytes, in);
      }
      return bytes.length > LARGEST
          ? refused("This file is too large to be a sketch (over 4 MB).")
          : SketchJson.read(text(bytes));
    } catch (IOException trouble) {
      return refused(FileTrouble.reading(trouble));
    }
  }

  private static Stored picture(byte[] start, InputStream rest) throws IOException {
    InputStream whole = new SequenceInputStream(new ByteArrayInputStream(start), rest);
    byte[] bytes = whole.readNBytes(LARGEST_PICTURE + 1);
    return bytes.length > LARGEST_PICTURE
        ? refused("This picture is too large to be opened (over 100 MB).")
        : SketchPicture.read(bytes);
  }

  private static String text(byte[] bytes) throws CharacterCodingException {
    String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
    boolean marked = text.startsWith("\uFEFF");
    return marked ? text.substring(1) : text;
  }

  private static Stored refused(String problem) {
    return new Stored.Refused(List.of(problem));
  }

  /**
   * Saves a sketch. A symbolic link stays one: what it leads to is replaced.
   *
   * @throws IOException with a sentence for the reader as its message; the old file is untouched
   */
  public static void write(Sketch sketch, Path path) throws IOException {
    byte[] bytes = SketchJson.of(sketch).getBytes(StandardCharsets.UTF_8);
    Path target = path.toAbsolutePath();
    try {
      target = WholeFile.target(path);
      String obstacle = obstacle(target);
      if (!obstacle.isEmpty()) {
        throw new IOException(obstacle);
      }
      WholeFile.replace(target, channel -> writeAll(channel, ByteBuffer.wrap(bytes)));
    } catch (IOException trouble) {
      throw new IOException(FileTrouble.writing(trouble, target), trouble);
    }
  }

  private static String obstacle(Path target) {
    if (Files.isDirectory(target)) {
      return "there is a folder of this name";
    }
    boolean locked = Files.exists(target) && !Files.isWritable(target);
    return locked ? "it is read-only" : "";
  }

  private static void writeAll(FileChannel channel, ByteBuffer bytes) throws IOException {
    while (bytes.hasRemaining()) {
      channel.write(bytes);
    }
  }
}

package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.charset.MalformedInputException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;

/** The words for troubles that no test can bring about on every machine. */
class FileTroubleTest {
  private static final Path TARGET = Path.of("drawings", "a.joint.json");

  private static void checkReading(String sentence, IOException trouble) {
    assertEquals(sentence, FileTrouble.reading(trouble));
  }

  private static void checkWriting(String sentence, IOException trouble) {
    assertEquals(sentence, FileTrouble.writing(trouble, TARGET));
  }

  @Test
  void troublesWithReading() {
    checkReading("There is no such file.", new NoSuchFileException("a"));
    checkReading("Reading this file is not allowed.", new AccessDeniedException("a"));
    checkReading(
        "This is not a sketch file: its text is not UTF-8.", new MalformedInputException(1));
    checkReading(
        "The file cannot be read: Input/output error.",
        new FileSystemException("a", null, "Input/output error"));
  }

  /** The first is what Linux says, the second Windows, both through the Java library. */
  @Test
  void aFullDisk() {
    String sentence = "There is not enough room on the disk.";
    checkWriting(sentence, new IOException("No space left on device"));
    checkWriting(sentence, new IOException("There is not enough space on the disk"));
  }

  @Test
  void otherTroublesWithWriting() {
    String folder = TARGET.getParent().toString();
    checkWriting("There is no folder " + folder + ".", new NoSuchFileException("a"));
    checkWriting(
        "Writing in the folder " + folder + " is not allowed.", new AccessDeniedException("a"));
    checkWriting(
        "The disk can only be read.", new FileSystemException("a", null, "Read-only file system"));
    checkWriting("The file cannot be saved: IOException.", new IOException());
  }
}

package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystemLoopException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** Replacing a file as a whole or not at all. */
class WholeFileTest {
  @TempDir private Path folder;

  private static WholeFile.Filling text(String text) {
    return channel -> channel.write(ByteBuffer.wrap(text.getBytes(StandardCharsets.UTF_8)));
  }

  private List<String> names() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(file -> file.getFileName().toString()).sorted().toList();
    }
  }

  @Test
  void aFailureHalfwayLeavesTheOldFileAndNothingElse() throws IOException {
    Path file = Files.writeString(folder.resolve("a"), "old");
    WholeFile.Filling broken =
        channel -> {
          text("half").into(channel);
          throw new IOException("No space left on device");
        };
    assertThrows(IOException.class, () -> WholeFile.replace(file, broken));
    assertEquals("old", Files.readString(file));
    assertEquals(List.of("a"), names());
  }

  @Test
  void anErrorInTheProgramLeavesTheOldFileToo() throws IOException {
    Path file = Files.writeString(folder.resolve("a"), "old");
    WholeFile.Filling broken =
        channel -> {
          throw new IllegalStateException("broken");
        };
    assertThrows(IllegalStateException.class, () -> WholeFile.replace(file, broken));
    assertEquals("old", Files.readString(file));
    assertEquals(List.of("a"), names());
  }

  /** While the new text is being written, whoever opens the file sees the old one. */
  @Test
  void theOldFileStandsUntilTheNewOneIsWhole() throws IOException {
    Path file = Files.writeString(folder.resolve("a"), "old");
    WholeFile.replace(
        file,
        channel -> {
          text("new").into(channel);
          assertEquals("old", Files.readString(file));
          assertEquals(2, names().size());
        });
    assertEquals("new", Files.readString(file));
  }

  @Test
  @EnabledOnOs({OS.LINUX, OS.MAC})
  void permissionsStayAsTheyWere() throws IOException {
    Path file = Files.writeString(folder.resolve("a"), "old");
    for (String permissions : List.of("rw-------", "rw-rw-r--")) {
      Files.setPosixFilePermissions(file, PosixFilePermissions.fromString(permissions));
      WholeFile.replace(file, text("new"));
      assertEquals(permissions, PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
    }
  }

  /** A new file is as open as any that the user makes, not as closed as a temporary one. */
  @Test
  @EnabledOnOs({OS.LINUX, OS.MAC})
  void aNewFileHasTheUsualPermissions() throws IOException {
    Path usual = Files.createFile(folder.resolve("usual"));
    Path file = folder.resolve("a");
    WholeFile.replace(file, text("new"));
    assertEquals(Files.getPosixFilePermissions(usual), Files.getPosixFilePermissions(file));
  }

  @Test
  @EnabledOnOs({OS.LINUX, OS.MAC})
  void aLinkIsFollowedAndStaysALink() throws IOException {
    Path real = Files.createDirectory(folder.resolve("real")).resolve("a");
    Path first = Files.createSymbolicLink(folder.resolve("first"), Path.of("real", "a"));
    Path second = Files.createSymbolicLink(folder.resolve("second"), first);
    // Also while nothing is there yet.
    WholeFile.replace(WholeFile.target(second), text("one"));
    assertEquals("one", Files.readString(real));
    WholeFile.replace(WholeFile.target(second), text("two"));
    assertEquals("two", Files.readString(real));
    assertTrue(Files.isSymbolicLink(first) && Files.isSymbolicLink(second));
  }

  @Test
  @EnabledOnOs({OS.LINUX, OS.MAC})
  void linksInACircleEnd() throws IOException {
    Path one = folder.resolve("one");
    Path two = Files.createSymbolicLink(folder.resolve("two"), one);
    Files.createSymbolicLink(one, two);
    IOException trouble = assertThrows(FileSystemLoopException.class, () -> WholeFile.target(one));
    assertEquals(
        "The file cannot be saved: its links go round in a circle.",
        FileTrouble.writing(trouble, one));
  }
}

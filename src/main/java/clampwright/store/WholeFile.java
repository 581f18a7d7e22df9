package clampwright.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemLoopException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.concurrent.ThreadLocalRandom;

/**
 * Replaces a file so that at every moment, through a crash or a power cut, it is the old one or the
 * new one, whole: the new text goes into a temporary file in the same folder, is forced to disk,
 * and moves over the old one in one step.
 */
final class WholeFile {
  /** As many as an operating system follows before it gives up. */
  private static final int MOST_LINKS = 40;

  private WholeFile() {}

  /** Fills a file. */
  @FunctionalInterface
  interface Filling {
    void into(FileChannel channel) throws IOException;
  }

  /**
   * Where a path leads: through symbolic links, also through one whose target does not exist yet.
   */
  static Path target(Path path) throws IOException {
    Path target = path.toAbsolutePath();
    for (int links = 0; Files.isSymbolicLink(target); links++) {
      if (links == MOST_LINKS) {
        throw new FileSystemLoopException(path.toString());
      }
      target = target.resolveSibling(Files.readSymbolicLink(target)).normalize();
    }
    return target;
  }

  /** Replaces or makes a file; on failure the old one is untouched and nothing is left behind. */
  static void replace(Path target, Filling filling) throws IOException {
    Path folder = target.getParent();
    Path temporary = newFileIn(folder);
    try {
      keepPermissions(target, temporary);
      try (FileChannel channel = FileChannel.open(temporary, StandardOpenOption.WRITE)) {
        filling.into(channel);
        channel.force(true);
      }
      move(temporary, target);
    } catch (IOException | RuntimeException trouble) {
      removeAfter(trouble, temporary);
      throw trouble;
    }
    forceFolder(folder);
  }

  private static Path newFileIn(Path folder) throws IOException {
    while (true) {
      String name = ".clampwright-" + Long.toHexString(ThreadLocalRandom.current().nextLong());
      try {
        // Made as any new file is, so that it gets the permissions that the user wants for those.
        return Files.createFile(folder.resolve(name + ".saving"));
      } catch (FileAlreadyExistsException taken) {
        // Somebody else's: try another name.
        continue;
      }
    }
  }

  private static void keepPermissions(Path target, Path temporary) throws IOException {
    PosixFileAttributeView old = Files.getFileAttributeView(target, PosixFileAttributeView.class);
    if (old != null && Files.exists(target)) {
      Files.setPosixFilePermissions(temporary, old.readAttributes().permissions());
    }
  }

  private static void move(Path temporary, Path target) throws IOException {
    try {
      Files.move(temporary, target, StandardCopyOption.ATOMIC_MOVE);
    } catch (AtomicMoveNotSupportedException e) {
      // Some network drives move in two steps only. The temporary file is whole on disk, so that a
      // power cut just now leaves the new sketch under its temporary name at worst.
      Files.move(temporary, target, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  private static void removeAfter(Exception trouble, Path temporary) {
    try {
      Files.deleteIfExists(temporary);
    } catch (IOException left) {
      trouble.addSuppressed(left);
    }
  }

  /**
   * Makes the move itself last through a power cut, where the system lets a folder be opened and
   * forced. Where it does not, the file is in its place all the same, so that a failure here must
   * not be told as one to save.
   */
  private static void forceFolder(Path folder) {
    try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
      channel.force(true);
    } catch (IOException notOffered) {
      System.getLogger(WholeFile.class.getName())
          .log(System.Logger.Level.DEBUG, "folder not forced to disk", notOffered);
    }
  }
}

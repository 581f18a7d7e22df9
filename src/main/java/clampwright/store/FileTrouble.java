package clampwright.store;

import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.FileSystemLoopException;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.nio.file.Path;
import java.util.Locale;

/** Troubles with files as sentences. */
final class FileTrouble {
  private FileTrouble() {}

  /** Why a file cannot be read. */
  static String reading(IOException trouble) {
    if (trouble instanceof CharacterCodingException) {
      return "This is not a sketch file: its text is not UTF-8.";
    }
    if (trouble instanceof NoSuchFileException) {
      return "There is no such file.";
    }
    if (trouble instanceof AccessDeniedException) {
      return "Reading this file is not allowed.";
    }
    return "The file cannot be read: " + cause(trouble) + ".";
  }

  /** Why a file cannot be written. */
  static String writing(IOException trouble, Path target) {
    Path folder = target.getParent();
    if (trouble instanceof NoSuchFileException || trouble instanceof NotDirectoryException) {
      return "There is no folder " + folder + ".";
    }
    if (trouble instanceof AccessDeniedException) {
      return "Writing in the folder " + folder + " is not allowed.";
    }
    String cause = cause(trouble);
    String lower = cause.toLowerCase(Locale.ROOT);
    if (lower.contains("no space") || lower.contains("not enough space")) {
      return "There is not enough room on the disk.";
    }
    return lower.contains("read-only file system")
        ? "The disk can only be read."
        : "The file cannot be saved: " + cause + ".";
  }

  private static String cause(IOException trouble) {
    if (trouble instanceof FileSystemLoopException) {
      return "its links go round in a circle";
    }
    String cause =
        trouble instanceof FileSystemException system && system.getReason() != null
            ? system.getReason()
            : trouble.getMessage();
    return cause == null || cause.isBlank() ? trouble.getClass().getSimpleName() : cause;
  }
}

package clampwright.app;

import java.nio.file.Path;
import java.util.Optional;

/** Asks the user for a file. The window asks through the system's dialog. */
interface FilePrompt {

  /**
   * A file to open, a sketch or a picture with one inside; empty when the user would rather not.
   */
  Optional<Path> toOpen();

  /**
   * A file to save to; empty when the user would rather not.
   *
   * @param suggested name of the file
   */
  Optional<Path> toSave(String suggested);

  /**
   * A file to write something to that is no sketch; empty when the user would rather not.
   *
   * @param title of the question
   * @param suggested name of the file, whose ending says what it is
   */
  Optional<Path> toExport(String title, String suggested);
}

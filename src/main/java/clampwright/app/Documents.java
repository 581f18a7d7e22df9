package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.joint.Sketch;
import clampwright.store.Samples;
import clampwright.store.SketchFile;
import clampwright.store.Stored;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/**
 * Files and the sketch in the window. Nothing here replaces unsaved work without asking, and
 * nothing that goes wrong with a file changes the sketch.
 */
final class Documents {
  private final SketchModel model;
  private final FilePrompt prompt;
  private final Questions questions;
  private final Settings settings;
  private final Desk desk;
  private Optional<Path> file = Optional.empty();

  /** What the files need of their window. */
  interface Desk {
    /** Takes over what is being typed. */
    void commit();

    /** Gives up what is still typed into fields of the sketch before. */
    void clear();

    /** Shows a short sentence on the status line. */
    void report(String sentence);
  }

  Documents(
      SketchModel model, FilePrompt prompt, Questions questions, Settings settings, Desk desk) {
    this.model = model;
    this.prompt = prompt;
    this.questions = questions;
    this.settings = settings;
    this.desk = desk;
  }

  /** The file of the sketch; empty when it has none yet, also when it came out of a picture. */
  Optional<Path> file() {
    return file;
  }

  void startNew() {
    if (mayLeave()) {
      take(NewSketch.create(model.sketch().units()), Optional.empty());
    }
  }

  void open() {
    if (mayLeave()) {
      prompt.toOpen().ifPresent(this::read);
    }
  }

  /** Opens a file that the user has named, as by dropping it on the window. */
  void open(Path path) {
    if (mayLeave()) {
      read(path);
    }
  }

  void open(Samples.Sample sample) {
    if (mayLeave()) {
      take(Samples.open(sample), "The sample cannot be opened", Optional.empty());
    }
  }

  private void read(Path path) {
    String failure = path.getFileName() + " cannot be opened";
    Stored stored = SketchFile.read(path);
    // Saving must not put a sketch in the place of the picture that it came from.
    boolean inPicture = stored instanceof Stored.Opened opened && opened.inPicture();
    if (take(stored, failure, inPicture ? Optional.empty() : Optional.of(path))) {
      settings.addRecent(path);
      if (inPicture) {
        desk.report("Opened from the picture " + path.getFileName() + "; saving asks for a file.");
      }
    }
  }

  private boolean take(Stored stored, String failure, Optional<Path> from) {
    if (stored instanceof Stored.Refused refused) {
      questions.tell(failure, refused.problems());
      return false;
    }
    Stored.Opened opened = (Stored.Opened) stored;
    take(opened.sketch(), from);
    if (!opened.remarks().isEmpty()) {
      questions.tell("Opened; not everything in the file was understood", opened.remarks());
    }
    return true;
  }

  private void take(Sketch sketch, Optional<Path> from) {
    file = from;
    model.open(sketch);
    desk.clear();
  }

  /** Saves to the sketch's file, or asks for one; whether it is saved now. */
  boolean save() {
    desk.commit();
    return file.isPresent() ? write(file.get()) : saveAs();
  }

  /** Asks for a file and saves there; whether it is saved now. */
  boolean saveAs() {
    desk.commit();
    String name = file.map(path -> path.getFileName().toString()).orElseGet(this::suggested);
    return prompt.toSave(name).map(this::write).orElse(false);
  }

  private String suggested() {
    String name =
        model
            .sketch()
            .name()
            .strip()
            .toLowerCase(java.util.Locale.ROOT)
            .replaceAll("[^\\p{L}\\p{N}]+", "-");
    String trimmed = name.replaceAll("^-+|-+$", "");
    return (trimmed.isEmpty() ? "sketch" : trimmed) + SketchFile.EXTENSION;
  }

  private boolean write(Path path) {
    try {
      SketchFile.write(model.sketch(), path);
    } catch (IOException problem) {
      questions.tell(path.getFileName() + " could not be saved", List.of(problem.getMessage()));
      return false;
    }
    file = Optional.of(path);
    model.saved();
    settings.addRecent(path);
    desk.report("Saved as " + path.getFileName() + ".");
    return true;
  }

  /** Whether the sketch in the window may go: saved, given up, or nothing was unsaved. */
  boolean mayLeave() {
    desk.commit();
    if (!model.unsavedProperty().get()) {
      return true;
    }
    return switch (questions.unsaved(model.sketch().name())) {
      case SAVE -> save();
      case DISCARD -> true;
      case CANCEL -> false;
    };
  }
}

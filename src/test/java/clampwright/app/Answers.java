package clampwright.app;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Answers prepared by a test in place of dialogs, and what was asked and told. */
final class Answers implements FilePrompt, Questions {
  Unsaved unsaved = Unsaved.CANCEL;
  Optional<Path> open = Optional.empty();
  Optional<Path> save = Optional.empty();
  final List<String> asked = new ArrayList<>();
  final List<String> told = new ArrayList<>();
  final List<String> suggested = new ArrayList<>();

  @Override
  public Optional<Path> toOpen() {
    return open;
  }

  @Override
  public Optional<Path> toSave(String suggestedName) {
    suggested.add(suggestedName);
    return save;
  }

  @Override
  public Optional<Path> toExport(String title, String suggestedName) {
    suggested.add(suggestedName);
    return save;
  }

  @Override
  public Unsaved unsaved(String name) {
    asked.add(name);
    return unsaved;
  }

  @Override
  public void tell(String title, List<String> lines) {
    told.add(title + ": " + String.join(" ", lines));
  }
}

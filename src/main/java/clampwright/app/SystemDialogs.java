package clampwright.app;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.stage.Stage;

/** The system's dialogs over a window, made when there is something to ask. */
final class SystemDialogs implements FilePrompt, Questions {
  private final Stage owner;
  private final Settings settings;

  SystemDialogs(Stage owner, Settings settings) {
    this.owner = owner;
    this.settings = settings;
  }

  private FilePrompt prompt() {
    return new SystemFilePrompt(owner, () -> settings.recent().stream().findFirst());
  }

  private Questions questions() {
    return new Dialogs(owner);
  }

  @Override
  public Optional<Path> toOpen() {
    return prompt().toOpen();
  }

  @Override
  public Optional<Path> toSave(String suggested) {
    return prompt().toSave(suggested);
  }

  @Override
  public Optional<Path> toExport(String title, String suggested) {
    return prompt().toExport(title, suggested);
  }

  @Override
  public Unsaved unsaved(String name) {
    return questions().unsaved(name);
  }

  @Override
  public void tell(String title, List<String> lines) {
    questions().tell(title, lines);
  }
}

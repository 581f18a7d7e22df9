package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.joint.Sketch;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.CompletableFuture;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.stage.Stage;

/** The editor: opens with a sample, or with the file named by the first argument. */
public final class ClampwrightApp extends Application {

  private static final CompletableFuture<Sketch> SKETCH =
      CompletableFuture.supplyAsync(FirstSketch::read);
  private static final CompletableFuture<Settings> SETTINGS =
      CompletableFuture.supplyAsync(Settings::ofUser);

  private CompletableFuture<Void> fonts;

  /** Begins what can be done while the toolkit starts; initializing the class has begun it. */
  static void prepare() {}

  @Override
  public void init() {
    fonts = CompletableFuture.runAsync(Looks::loadFonts);
  }

  @Override
  public void start(Stage stage) {
    SketchModel model = new SketchModel(SKETCH.join());
    MainWindow window = MainWindow.on(stage, model, SETTINGS.join());
    fonts.join();
    stage.show();
    List<String> arguments = getParameters().getRaw();
    if (!arguments.isEmpty()) {
      Path file = Path.of(arguments.get(0));
      Platform.runLater(() -> window.documents().open(file));
    }
  }
}

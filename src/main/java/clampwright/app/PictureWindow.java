package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.view.OncePerPulse;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.image.ImageView;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.stage.Stage;

/** Asks what a picture is to show, with the picture as it will be beside the questions. */
final class PictureWindow {
  private static final double COPIED = 200;
  private static final double MM_PER_INCH = 25.4;
  private static final double WIDE = 620;
  private static final double TALL = 560;

  private final SketchModel model;
  private final FilePrompt prompt;
  private final Questions questions;
  private final Stage stage = new Stage();
  private final PictureOptions options;
  private final ImageView preview = new ImageView();

  private PictureWindow(Stage owner, SketchModel model, FilePrompt prompt, Questions questions) {
    this.model = model;
    this.prompt = prompt;
    this.questions = questions;
    options = new PictureOptions(this::follow);
    preview.setId("picture-preview");
    preview.setPreserveRatio(true);
    preview.setFitWidth(WIDE);
    preview.setFitHeight(TALL);
    StackPane paper = new StackPane(preview);
    paper.getStyleClass().add("picture-paper");
    paper.setMinSize(WIDE + 30, TALL + 30);
    VBox left = new VBox(14, options, spacer(), buttons());
    left.setPadding(new Insets(16));
    left.setMinWidth(330);
    BorderPane root = new BorderPane(paper, null, null, null, left);
    root.getStyleClass().add("picture-window");
    Scene scene = new Scene(root);
    scene.getStylesheets().setAll(owner.getScene().getStylesheets());
    scene.addEventHandler(
        KeyEvent.KEY_PRESSED,
        event -> {
          if (event.getCode() == KeyCode.ESCAPE) {
            stage.close();
          }
        });
    stage.initOwner(owner);
    stage.setTitle("Export figure");
    stage.setScene(scene);
    OncePerPulse.keep(paper, this::follow, model.sketchProperty(), model.shownCaseProperty());
  }

  /** Opens the window. */
  static void show(Stage owner, SketchModel model, FilePrompt prompt, Questions questions) {
    new PictureWindow(owner, model, prompt, questions).stage.show();
  }

  /** Puts the usual picture on the clipboard. */
  static void copy(SketchModel model) {
    put(new PictureOptions(() -> {}).picture(model.loadCase()), model);
  }

  private static void put(Picture picture, SketchModel model) {
    ClipboardContent content = new ClipboardContent();
    content.putImage(picture.image(model.sketch(), COPIED));
    Clipboard.getSystemClipboard().setContent(content);
  }

  private static Region spacer() {
    Region spacer = new Region();
    VBox.setVgrow(spacer, Priority.ALWAYS);
    return spacer;
  }

  private HBox buttons() {
    Button save = button("Save…", "picture-save", this::save);
    save.setDefaultButton(true);
    Button copy = button("Copy", "picture-copy", () -> put(picture(), model));
    Button close = button("Close", "picture-close", stage::close);
    HBox buttons = new HBox(8, save, copy, close);
    buttons.setAlignment(Pos.CENTER_LEFT);
    return buttons;
  }

  private static Button button(String text, String id, Runnable action) {
    Button button = new Button(text);
    button.getStyleClass().setAll("tool-button");
    button.setId(id);
    button.setOnAction(event -> action.run());
    return button;
  }

  private Picture picture() {
    return options.picture(model.loadCase());
  }

  /** As sharp as the screen it is shown on. */
  private void follow() {
    Picture picture = picture();
    double width = picture.request().preset().width();
    double height = picture.request().preset().height(picture.request().shown());
    double shown = Math.min(WIDE / width, TALL / height) * MM_PER_INCH;
    preview.setImage(picture.image(model.sketch(), shown * stage.getOutputScaleX()));
  }

  private void save() {
    Picture picture = picture();
    String name =
        model.sketch().name().replaceAll("[^\\p{L}\\p{N} ._-]+", "").strip()
            + picture.format().ending();
    prompt.toExport("Export figure", name).ifPresent(path -> write(picture, path));
  }

  private void write(Picture picture, Path path) {
    try {
      Files.write(path, picture.bytes(model.sketch()));
      stage.close();
    } catch (IOException e) {
      questions.tell(
          path.getFileName() + " cannot be written", List.of(String.valueOf(e.getMessage())));
    }
  }
}

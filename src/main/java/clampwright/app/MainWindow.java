package clampwright.app;

import clampwright.edit.SketchModel;
import clampwright.view.field.Typed;
import clampwright.view.section.SectionPane;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import javafx.application.Platform;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.event.Event;
import javafx.geometry.Rectangle2D;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.Scene;
import javafx.scene.input.DragEvent;
import javafx.scene.input.TransferMode;
import javafx.stage.Screen;
import javafx.stage.Stage;

/** The window of the editor: what it does when asked by menu, key, mouse or system. */
final class MainWindow implements Documents.Desk {
  private static final String UNTAKEN =
      "A field still holds text that could not be taken over; it is marked.";

  /** Share of a small screen that the window takes when it is not maximized. */
  private static final double ROOM = 0.92;

  private final FilePrompt prompt;
  private final Questions questions;
  private final Stage stage;
  private final SketchModel model;
  private final Settings settings;
  private final Documents documents;
  private final WindowLayout layout;
  private final StringProperty hint = new SimpleStringProperty("");
  private final Scene scene;

  /** A window with the system's dialogs. */
  static MainWindow on(Stage stage, SketchModel model, Settings settings) {
    SystemDialogs dialogs = new SystemDialogs(stage, settings);
    return new MainWindow(stage, model, settings, dialogs, dialogs);
  }

  MainWindow(
      Stage stage, SketchModel model, Settings settings, FilePrompt prompt, Questions questions) {
    this.stage = stage;
    this.model = model;
    this.settings = settings;
    this.prompt = prompt;
    this.questions = questions;
    Settings.Values values = settings.values();
    documents = new Documents(model, prompt, questions, settings, this);
    layout = new WindowLayout(model, settings, () -> new WindowParts(this, model, settings), hint);
    scene = new Scene(layout.root(), values.width, values.height);
    scene.addEventHandler(DragEvent.DRAG_OVER, this::draggedOver);
    scene.addEventHandler(DragEvent.DRAG_DROPPED, this::dropped);
    showOn(stage, values);
    layout.section().hintProperty().subscribe(hint::set);
    layout.section().requestFocus();
    layout.start(scene);
  }

  private void showOn(Stage stage, Settings.Values values) {
    stage.setScene(scene);
    stage.setMinWidth(1000);
    stage.setMinHeight(640);
    Rectangle2D screen = Screen.getPrimary().getVisualBounds();
    boolean fits = values.width < screen.getWidth() && values.height < screen.getHeight();
    stage.setWidth(Math.min(values.width, ROOM * screen.getWidth()));
    stage.setHeight(Math.min(values.height, ROOM * screen.getHeight()));
    stage.setMaximized(values.maximized || !fits);
    stage
        .titleProperty()
        .bind(model.sketchProperty().map(sketch -> sketch.name() + " — Clampwright"));
    stage.setOnCloseRequest(this::closing);
  }

  /** Asks what a picture of the sketch is to show, and writes it. */
  void exportFigure() {
    commit();
    PictureWindow.show(stage, model, prompt, questions);
  }

  /** Writes the schedule as comma-separated values. */
  void exportSchedule() {
    commit();
    prompt
        .toExport("Export schedule", model.sketch().name() + ".csv")
        .ifPresent(
            path -> {
              try {
                Files.writeString(path, ScheduleCsv.of(model.sketch()));
                report("The schedule is in " + path.getFileName() + ".");
              } catch (IOException e) {
                String why = String.valueOf(e.getMessage());
                questions.tell(path.getFileName() + " cannot be written", List.of(why));
              }
            });
  }

  /** Puts a picture of the sketch on the clipboard. */
  void copyFigure() {
    commit();
    PictureWindow.copy(model);
    report("The figure is on the clipboard.");
  }

  Documents documents() {
    return documents;
  }

  /** Whether all parts of the window are there. */
  boolean isComplete() {
    return layout.isComplete();
  }

  SectionPane section() {
    return layout.section();
  }

  Stage stage() {
    return stage;
  }

  Drawer drawer() {
    return layout.drawer();
  }

  private void closing(Event event) {
    if (documents.mayLeave()) {
      remember();
    } else {
      event.consume();
    }
  }

  /** Closes the window as its close button does. */
  void close() {
    if (documents.mayLeave()) {
      remember();
      stage.close();
    }
  }

  private void remember() {
    Settings.Values values = settings.values();
    values.maximized = stage.isMaximized();
    if (!values.maximized) {
      values.width = stage.getWidth();
      values.height = stage.getHeight();
    }
    values.drawerOpen = drawer().openProperty().get();
    values.drawerHeight = drawer().getPrefHeight();
    settings.keep();
  }

  void switchLook() {
    settings.values().dark = !settings.values().dark;
    layout.showLook();
  }

  boolean isDark() {
    return settings.values().dark;
  }

  /** Undoes; text that the sketch could not take over is the last step and goes first. */
  void undo() {
    Typed typed = Typed.around(scene.getFocusOwner());
    commit();
    if (typed != null && typed.isWrong()) {
      typed.restore();
    } else {
      model.undo();
    }
  }

  void redo() {
    commit();
    model.redo();
  }

  @Override
  public void commit() {
    Typed typed = Typed.around(scene.getFocusOwner());
    if (typed != null) {
      typed.commit();
    }
  }

  @Override
  public void clear() {
    typed(scene.getRoot()).toList().forEach(Typed::restore);
  }

  /** Every field at or in a node. */
  private static Stream<Typed> typed(Node node) {
    Stream<Typed> here = node instanceof Typed typed ? Stream.of(typed) : Stream.empty();
    return node instanceof Parent parent
        ? Stream.concat(here, parent.getChildrenUnmodifiable().stream().flatMap(MainWindow::typed))
        : here;
  }

  @Override
  public void report(String sentence) {
    boolean untaken = typed(scene.getRoot()).anyMatch(Typed::isWrong);
    hint.set(untaken ? sentence + " " + UNTAKEN : sentence);
  }

  private void draggedOver(DragEvent event) {
    if (sketchIn(event).isPresent()) {
      event.acceptTransferModes(TransferMode.COPY);
      event.consume();
    }
  }

  private void dropped(DragEvent event) {
    Optional<Path> path = sketchIn(event);
    event.setDropCompleted(path.isPresent());
    event.consume();
    // The question about unsaved work must not keep the dragging program waiting.
    path.ifPresent(file -> Platform.runLater(() -> documents.open(file)));
  }

  private static Optional<Path> sketchIn(DragEvent event) {
    return event.getDragboard().getFiles().stream().findFirst().map(File::toPath);
  }
}

package clampwright.bench;

import clampwright.figure.Figure;
import clampwright.figure.HitTest;
import clampwright.figure.Mark;
import clampwright.figure.Point;
import clampwright.figure.SectionFigure;
import clampwright.figure.Sheet;
import clampwright.figure.Tag;
import clampwright.joint.Feature;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.paint.canvas.FigureCanvas;
import clampwright.quantity.UnitSystem;
import clampwright.store.SketchFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.FutureTask;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.event.EventType;
import javafx.geometry.Point2D;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Region;
import javafx.stage.Window;

/**
 * Drags a face of a 12-layer joint in the whole editor, 1280×800, software pipeline, and prints the
 * time from the mouse event to the painted canvas. The toolkit runs its pulses as fast as it can,
 * so that the times are work, not waiting for the next of 60 frames a second. House target: 95th
 * percentile at most 16 ms.
 */
final class FrameBench {
  private static final int WARM_UP = 100;
  private static final int STEPS = 300;
  private static final Part DRAGGED = Part.element(5);

  private FrameBench() {}

  static void run() throws Exception {
    HeadlessScreen.use();
    System.setProperty("javafx.animation.fullspeed", "true");
    Path folder = Files.createTempDirectory("clampwright-bench");
    System.setProperty("user.home", folder.toString());
    Sketch sketch = new Sketch("Twelve layers", TwelveLayers.with(Outline.WIDE), UnitSystem.METRIC);
    Path file = folder.resolve("twelve" + SketchFile.EXTENSION);
    SketchFile.write(sketch, file);
    Thread editor =
        new Thread(() -> Application.launch(clampwright.app.ClampwrightApp.class, file.toString()));
    editor.setDaemon(true);
    editor.start();
    while (!isUp()) {
      Thread.onSpinWait();
    }
    Region section = section();
    System.out.println(new Times(drag(section, sketch)).line("event to painted canvas"));
    Runtime.getRuntime().halt(0);
  }

  /** Whether the toolkit takes orders yet. */
  private static boolean isUp() {
    try {
      Platform.runLater(() -> {});
      return true;
    } catch (IllegalStateException notYet) {
      return false;
    }
  }

  /** The section of the editor, once it shows the sketch at its size. */
  private static Region section() throws Exception {
    while (true) {
      Optional<Region> section = onScreen(FrameBench::findSection);
      if (section.isPresent()) {
        return section.get();
      }
    }
  }

  private static Optional<Region> findSection() {
    Optional<Window> window = Window.getWindows().stream().filter(Window::isShowing).findFirst();
    window.ifPresent(
        shown -> {
          shown.setWidth(1280);
          shown.setHeight(800);
        });
    return window
        .filter(shown -> shown.getScene().getRoot().lookup("#section") != null)
        .map(shown -> (Region) shown.getScene().getRoot().lookup("#section"));
  }

  private static <T> T onScreen(java.util.concurrent.Callable<T> question) throws Exception {
    FutureTask<T> task = new FutureTask<>(question);
    Platform.runLater(task);
    return task.get();
  }

  private static long[] drag(Region section, Sketch sketch) throws Exception {
    onScreen(
        () -> {
          section.getScene().getRoot().layout();
          return null;
        });
    Point2D face = onScreen(() -> face(section, sketch));
    fire(section, MouseEvent.MOUSE_MOVED, face, 0);
    fire(section, MouseEvent.MOUSE_PRESSED, face, 0);
    long[] times = new long[STEPS];
    for (int i = -WARM_UP; i < STEPS; i++) {
      long time = fire(section, MouseEvent.MOUSE_DRAGGED, face, 8 + 40 * Math.sin(i / 20.0));
      if (i >= 0) {
        times[i] = time;
      }
    }
    fire(section, MouseEvent.MOUSE_RELEASED, face, 8);
    return times;
  }

  /** Where the face can be taken hold of on the fitted sheet [px]. */
  private static Point2D face(Region section, Sketch sketch) {
    double scale = FigureCanvas.PIXELS_PER_MM;
    Sheet sheet =
        SectionFigure.fitted(sketch, section.getWidth() / scale, section.getHeight() / scale);
    SectionFigure.Options options =
        new SectionFigure.Options(Part.JOINT, Optional.empty(), true, 0);
    Figure figure = SectionFigure.of(sketch, Assessment.of(sketch.joint()), sheet, options);
    for (Mark mark : figure.marks()) {
      if (mark instanceof Mark.Path path && isFace(mark.tag())) {
        Point from = path.points().get(0);
        Point to = path.points().get(path.points().size() - 1);
        Point middle = new Point((from.x() + to.x()) / 2, (from.y() + to.y()) / 2);
        if (HitTest.at(figure, middle, 1).filter(FrameBench::isFace).isPresent()) {
          return new Point2D(middle.x() * scale, middle.y() * scale);
        }
      }
    }
    throw new IllegalStateException("the face is nowhere to be seen");
  }

  private static boolean isFace(Tag tag) {
    return tag.part().equals(DRAGGED) && tag.feature().equals(Optional.of(Feature.FACE));
  }

  /** Fires an event and waits for the frame; the time between [ns]. */
  private static long fire(Region section, EventType<MouseEvent> type, Point2D at, double down)
      throws Exception {
    CountDownLatch painted = new CountDownLatch(1);
    long[] times = new long[2];
    Platform.runLater(
        () -> {
          times[0] = System.nanoTime();
          Painted.then(
              () -> {
                times[1] = System.nanoTime();
                painted.countDown();
              });
          section.fireEvent(event(section, type, at.add(0, down)));
        });
    painted.await();
    return times[1] - times[0];
  }

  private static MouseEvent event(Region section, EventType<MouseEvent> type, Point2D at) {
    Point2D screen = section.localToScreen(at);
    return new MouseEvent(
        section,
        section,
        type,
        at.getX(),
        at.getY(),
        screen.getX(),
        screen.getY(),
        MouseButton.PRIMARY,
        1,
        false,
        false,
        false,
        false,
        true,
        false,
        false,
        true,
        false,
        false,
        null);
  }
}

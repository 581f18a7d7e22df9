package clampwright.store;

import clampwright.joint.Sketch;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import java.util.Optional;

/**
 * A sketch as JSON text: lengths in mm, forces in N, stresses in MPa, expansion in 1/K, angles in
 * degrees, whatever the units it is shown in. Reading back gives an equal sketch, to the last bit
 * of every number.
 */
public final class SketchJson {
  /** Begins every problem of a text that is no sketch at all; the rest says why. */
  static final String NO_SKETCH = "This is not a sketch file: ";

  private SketchJson() {}

  /** The text that stands for a sketch. */
  public static String of(Sketch sketch) {
    return SketchWriter.text(sketch);
  }

  /** Reads such a text; whatever it holds, the answer is a sketch or the problems it has. */
  public static Stored read(String text) {
    Notes notes = new Notes();
    Optional<Sketch> sketch =
        JsonTree.of(text, notes)
            .flatMap(tree -> object(tree, notes))
            .flatMap(
                root ->
                    SketchFormat.isRead(root, notes)
                        ? SketchReader.read(root, notes)
                        : Optional.empty());
    return sketch.isPresent() && notes.problemCount() == 0
        ? new Stored.Opened(sketch.get(), notes.remarks())
        : new Stored.Refused(notes.problems());
  }

  private static Optional<JsonObject> object(JsonElement tree, Notes notes) {
    if (tree instanceof JsonObject object) {
      return Optional.of(object);
    }
    notes.problem(NO_SKETCH + "it does not begin with a brace.");
    return Optional.empty();
  }
}

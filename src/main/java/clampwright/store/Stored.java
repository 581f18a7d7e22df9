package clampwright.store;

import clampwright.joint.Sketch;
import java.util.List;

/** What reading a sketch comes to. */
public sealed interface Stored {

  /**
   * A whole sketch.
   *
   * @param sketch as stored
   * @param remarks what was not understood and ignored, each a line with its place; usually empty
   * @param inPicture whether it came out of a picture, which is no file to save a sketch to
   */
  record Opened(Sketch sketch, List<String> remarks, boolean inPicture) implements Stored {
    public Opened {
      remarks = List.copyOf(remarks);
    }

    /** A sketch from a text of its own. */
    public Opened(Sketch sketch, List<String> remarks) {
      this(sketch, remarks, false);
    }
  }

  /**
   * No sketch.
   *
   * @param problems why, each a line with its place; at least one
   */
  record Refused(List<String> problems) implements Stored {
    public Refused {
      problems = List.copyOf(problems);
      if (problems.isEmpty()) {
        throw new IllegalArgumentException("a refused sketch has a problem");
      }
    }
  }
}

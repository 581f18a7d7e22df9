package clampwright.bench;

import com.sun.javafx.tk.RenderJob;
import com.sun.javafx.tk.TKPulseListener;
import com.sun.javafx.tk.Toolkit;
import java.util.HashSet;
import java.util.Set;

/**
 * Tells when what has been changed so far is on the canvas. The toolkit lays out and hands over a
 * frame in one pulse and paints it on a thread of its own; a job queued there after that pulse runs
 * when the frame is painted. This is the toolkit's inside, for benchmarks only.
 */
final class Painted {
  /**
   * The toolkit holds its listeners weakly: without this a collection ends the waiting in silence.
   */
  private static final Set<TKPulseListener> WAITING = new HashSet<>();

  private Painted() {}

  /** Runs something on the painting thread after the next frame. To be called on the FX thread. */
  static void then(Runnable action) {
    Toolkit toolkit = Toolkit.getToolkit();
    TKPulseListener listener =
        new TKPulseListener() {
          @Override
          public void pulse() {
            toolkit.removePostSceneTkPulseListener(this);
            WAITING.remove(this);
            toolkit.addRenderJob(new RenderJob(action));
          }
        };
    WAITING.add(listener);
    toolkit.addPostSceneTkPulseListener(listener);
    toolkit.requestNextPulse();
  }
}

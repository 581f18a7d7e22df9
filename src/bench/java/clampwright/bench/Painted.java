package clampwright.bench;

import com.sun.javafx.tk.RenderJob;
import com.sun.javafx.tk.TKPulseListener;
import com.sun.javafx.tk.Toolkit;

/**
 * Tells when what has been changed so far is on the canvas. The toolkit lays out and hands over a
 * frame in one pulse and paints it on a thread of its own; a job queued there after that pulse runs
 * when the frame is painted. This is the toolkit's inside, for benchmarks only.
 */
final class Painted {
  private Painted() {}

  /** Runs something on the painting thread after the next frame. To be called on the FX thread. */
  static void then(Runnable action) {
    Toolkit toolkit = Toolkit.getToolkit();
    toolkit.addPostSceneTkPulseListener(
        new TKPulseListener() {
          @Override
          public void pulse() {
            toolkit.removePostSceneTkPulseListener(this);
            toolkit.addRenderJob(new RenderJob(action));
          }
        });
    toolkit.requestNextPulse();
  }
}

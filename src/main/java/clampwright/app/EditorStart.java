package clampwright.app;

import java.io.PrintStream;
import java.util.logging.Level;
import java.util.logging.Logger;
import javafx.application.Application;

/** Opens the editor window. The only class on the way from the start that knows the toolkit. */
final class EditorStart {
  /** Kept, or the setting would be forgotten with it. */
  private static final Logger TOOLKIT = Logger.getLogger("javafx");

  private EditorStart() {}

  static void open(String... arguments) {
    // The toolkit warns that it was started from a class path, which a plain jar means to do.
    TOOLKIT.setLevel(Level.SEVERE);
    Thread.setDefaultUncaughtExceptionHandler((thread, trouble) -> tell(trouble, System.err));
    ClampwrightApp.prepare();
    Application.launch(ClampwrightApp.class, arguments);
  }

  /** Says in one line that there is no display; whatever else goes wrong is told in full. */
  static void tell(Throwable trouble, PrintStream err) {
    if (String.valueOf(trouble.getMessage()).contains("Unable to open DISPLAY")) {
      err.println("The editor needs a display. Without one: clampwright found FILE");
    } else {
      trouble.printStackTrace(err);
    }
  }
}

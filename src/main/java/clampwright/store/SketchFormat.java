package clampwright.store;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;

/** The number of the file format. */
final class SketchFormat {
  static final String KEY = "format";

  /** The format that this program writes, and the newest that it reads. */
  static final int NEWEST = 1;

  private SketchFormat() {}

  /** Whether this program reads the format of a sketch; what keeps it from that is noted. */
  static boolean isRead(JsonObject root, Notes notes) {
    JsonElement number = root.get(KEY);
    if (!(number instanceof JsonPrimitive primitive && primitive.isNumber())) {
      notes.problem("This is not a sketch file: it has no format number.");
      return false;
    }
    double format = Double.parseDouble(number.getAsString());
    String shown = JsonObjectReader.shown(number);
    if (format > NEWEST) {
      notes.problem(
          "This sketch was written by a newer Clampwright (format "
              + shown
              + "); this one reads up to format "
              + NEWEST
              + "; nothing was changed.");
      return false;
    }
    if (format < 1 || format != Math.rint(format)) {
      notes.problem("This is not a sketch file: there is no format " + shown + ".");
      return false;
    }
    return true;
  }
}

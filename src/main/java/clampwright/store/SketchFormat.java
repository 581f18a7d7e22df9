package clampwright.store;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;

/** The number of the file format. */
final class SketchFormat {
  static final String KEY = "format";

  /** The format that this program writes, and the newest that it reads. */
  static final int NEWEST = 2;

  private static final String FIRST_LOAD = "Working load";

  private SketchFormat() {}

  /**
   * Whether this program reads the format of a sketch; what keeps it from that is noted. A tree of
   * an older format is made one of the newest.
   */
  static boolean isRead(JsonObject root, Notes notes) {
    JsonElement number = root.get(KEY);
    if (!(number instanceof JsonPrimitive primitive && primitive.isNumber())) {
      notes.problem(SketchJson.NO_SKETCH + "it has no format number.");
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
      notes.problem(SketchJson.NO_SKETCH + "there is no format " + shown + ".");
      return false;
    }
    if (format == 1) {
      fromFirst(root);
    }
    return true;
  }

  /**
   * Format 1 had one plain preload and one steady axial load; both live on as a tightening by force
   * and a single load case.
   */
  private static void fromFirst(JsonObject root) {
    if (root.remove("preload") instanceof JsonObject preload) {
      preload.addProperty("given", "force");
      JsonObject tightening = new JsonObject();
      tightening.add("target", preload);
      root.add("tightening", tightening);
    }
    if (root.remove("load") instanceof JsonObject load) {
      load.addProperty("name", FIRST_LOAD);
      move(load, "axial", "axialMax");
      JsonElement factor = load.remove("introduction");
      if (factor != null) {
        JsonObject introduction = new JsonObject();
        introduction.add("factor", factor);
        load.add("introduction", introduction);
      }
      JsonArray loads = new JsonArray();
      loads.add(load);
      root.add("loads", loads);
    }
  }

  private static void move(JsonObject object, String from, String to) {
    JsonElement value = object.remove(from);
    if (value != null) {
      object.add(to, value);
    }
  }
}

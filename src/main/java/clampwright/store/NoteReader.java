package clampwright.store;

import clampwright.joint.Note;
import clampwright.joint.Part;
import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Reads the notes at the parts; parts of the stack are counted from 1, at the head. */
final class NoteReader {
  private static final Note SOUND = new Note("", Part.HEAD, 0, 0);

  private NoteReader() {}

  static List<Note> read(JsonArray array, int parts, Notes problems) {
    List<Note> notes = new ArrayList<>();
    for (int i = 0; i < array.size(); i++) {
      JsonElement child = array.get(i);
      String place = "note " + (i + 1);
      if (child instanceof JsonObject object) {
        note(new JsonObjectReader(place, object, problems), parts).ifPresent(notes::add);
      } else {
        problems.problem(
            place, "must be an object in braces, not " + JsonObjectReader.shown(child));
      }
    }
    return notes;
  }

  private static Optional<Note> note(JsonObjectReader json, int parts) {
    String text = json.text("text", "text");
    Part.Kind kind = json.choice("at", "at", Words.NOTED);
    double layer =
        kind == Part.Kind.ELEMENT
            ? json.number("layer", "layer", value -> element(value, parts))
            : 0;
    double fromAxis = json.number("fromAxis", "place", 0, value -> SOUND.at(value, 0));
    double z = json.number("z", "place", 0, value -> SOUND.at(0, value));
    return json.build(
        () -> {
          Part part = kind == Part.Kind.ELEMENT ? element(layer, parts) : new Part(kind, -1);
          return new Note(text, part, fromAxis, z);
        });
  }

  private static Part element(double number, int parts) {
    if (number != Math.rint(number) || number < 1 || number > parts) {
      throw new IllegalArgumentException("the note must point at one of the layers");
    }
    return Part.element((int) number - 1);
  }
}

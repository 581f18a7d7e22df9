package clampwright.store;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonNull;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import com.google.gson.Strictness;
import com.google.gson.internal.LazilyParsedNumber;
import com.google.gson.stream.JsonReader;
import com.google.gson.stream.JsonToken;
import java.io.EOFException;
import java.io.IOException;
import java.io.StringReader;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads strict JSON (RFC 8259) into a tree: the whole text and nothing after it. A key that appears
 * twice in one object is a problem, since one of its two values would be lost; the first one stays
 * in the tree.
 */
final class JsonTree {
  /** Far deeper than any sketch, far from the end of the call stack. */
  private static final int DEEPEST = 50;

  private static final Pattern WHERE = Pattern.compile("line (\\d+) column (\\d+)");

  private final JsonReader reader;
  private final Notes notes;

  private JsonTree(String text, Notes notes) {
    this.reader = new JsonReader(new StringReader(text));
    this.notes = notes;
    reader.setStrictness(Strictness.STRICT);
    reader.setNestingLimit(DEEPEST);
  }

  /** The tree; empty when the text is no JSON, which is noted then. */
  static Optional<JsonElement> of(String text, Notes notes) {
    return new JsonTree(text, notes).whole();
  }

  private Optional<JsonElement> whole() {
    String problem = "it is not valid JSON";
    try {
      JsonElement tree = value();
      problem = "something follows its end";
      if (reader.peek() == JsonToken.END_DOCUMENT) {
        return Optional.of(tree);
      }
    } catch (EOFException e) {
      problem = "its text ends too early";
    } catch (IOException | IllegalStateException | NumberFormatException e) {
      if (String.valueOf(e.getMessage()).startsWith("Nesting limit")) {
        problem = "it is nested too deeply";
      }
    }
    notes.problem(SketchJson.NO_SKETCH + problem + ", near " + place() + ".");
    return Optional.empty();
  }

  private JsonElement value() throws IOException {
    return switch (reader.peek()) {
      case BEGIN_OBJECT -> object();
      case BEGIN_ARRAY -> array();
      case STRING -> new JsonPrimitive(reader.nextString());
      case NUMBER -> new JsonPrimitive(new LazilyParsedNumber(reader.nextString()));
      case BOOLEAN -> new JsonPrimitive(reader.nextBoolean());
      case NULL -> {
        reader.nextNull();
        yield JsonNull.INSTANCE;
      }
      default -> throw new IllegalStateException("no value begins with " + reader.peek());
    };
  }

  private JsonObject object() throws IOException {
    JsonObject object = new JsonObject();
    reader.beginObject();
    while (reader.hasNext()) {
      String key = reader.nextName();
      String place = place();
      JsonElement value = value();
      if (object.has(key)) {
        notes.problem(place, "key '" + Notes.shortened(key) + "' appears twice");
      } else {
        object.add(key, value);
      }
    }
    reader.endObject();
    return object;
  }

  private JsonArray array() throws IOException {
    JsonArray array = new JsonArray();
    reader.beginArray();
    while (reader.hasNext()) {
      array.add(value());
    }
    reader.endArray();
    return array;
  }

  /** Where reading has come to, to a column or two; the JSON reader tells it only in words. */
  private String place() {
    Matcher where = WHERE.matcher(reader.toString());
    return where.find() ? "line " + where.group(1) + ", column " + where.group(2) : "its start";
  }
}

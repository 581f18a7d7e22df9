package clampwright.store;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonNull;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.util.HashSet;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.DoubleFunction;
import java.util.function.Function;
import java.util.function.Supplier;

/**
 * Reads the keys of one JSON object and notes every problem with its place. A value that is missing
 * or wrong stands in as a harmless one, so that reading goes on and finds the rest; {@link #build}
 * makes nothing of an object with problems.
 *
 * <p>Numbers are tried one by one in a record whose other values are sound, so that each wrong one
 * is named, in the words of the record that refuses it.
 */
final class JsonObjectReader {
  private final String place;
  private final JsonObject object;
  private final Notes notes;
  private final int problemsBefore;
  private final Set<String> known = new HashSet<>();

  JsonObjectReader(String place, JsonObject object, Notes notes) {
    this.place = place;
    this.object = object;
    this.notes = notes;
    this.problemsBefore = notes.problemCount();
  }

  String place() {
    return place;
  }

  void problem(String what) {
    notes.problem(place, what);
  }

  /** Whether neither this object nor one inside it has had a problem so far. */
  boolean isSound() {
    return notes.problemCount() == problemsBefore;
  }

  /** Whether a value is there; null counts as absent. */
  boolean has(String key) {
    return !(element(key) instanceof JsonNull);
  }

  private JsonElement element(String key) {
    known.add(key);
    JsonElement element = object.get(key);
    return element == null ? JsonNull.INSTANCE : element;
  }

  /** A number that must be there. */
  double number(String key, String name, DoubleFunction<?> trial) {
    if (!has(key)) {
      problem(name + " is missing");
      return 1;
    }
    return tried(numeric(element(key), name), trial);
  }

  double number(String key, String name, double otherwise, DoubleFunction<?> trial) {
    return has(key) ? number(key, name, trial) : otherwise;
  }

  OptionalDouble optional(String key, String name, DoubleFunction<?> trial) {
    return has(key) ? OptionalDouble.of(number(key, name, trial)) : OptionalDouble.empty();
  }

  private OptionalDouble numeric(JsonElement element, String name) {
    if (!(element instanceof JsonPrimitive primitive && primitive.isNumber())) {
      problem(name + " must be a number, not " + shown(element));
      return OptionalDouble.empty();
    }
    double value = Double.parseDouble(element.getAsString());
    if (Double.isInfinite(value)) {
      problem(name + " " + shown(element) + " is too large a number");
      return OptionalDouble.empty();
    }
    return OptionalDouble.of(value);
  }

  private double tried(OptionalDouble value, DoubleFunction<?> trial) {
    if (value.isPresent()) {
      try {
        trial.apply(value.getAsDouble());
      } catch (IllegalArgumentException refused) {
        problem(refused.getMessage());
      }
    }
    return value.orElse(1);
  }

  /** A text that must be there. */
  String text(String key, String name) {
    JsonElement element = element(key);
    if (element instanceof JsonPrimitive primitive && primitive.isString()) {
      return primitive.getAsString();
    }
    wrong(element, name, "a text");
    return "";
  }

  boolean flag(String key, String name, boolean otherwise) {
    JsonElement element = element(key);
    if (element instanceof JsonPrimitive primitive && primitive.isBoolean()) {
      return primitive.getAsBoolean();
    }
    if (has(key)) {
      wrong(element, name, "true or false");
    }
    return otherwise;
  }

  /** A choice among words that must be there. */
  <T> T choice(String key, String name, Map<String, T> words) {
    JsonElement element = element(key);
    boolean word = element instanceof JsonPrimitive primitive && primitive.isString();
    if (word && words.containsKey(element.getAsString())) {
      return words.get(element.getAsString());
    }
    wrong(element, name, "one of " + String.join(", ", words.keySet()));
    return words.values().iterator().next();
  }

  <T> T choice(String key, String name, Map<String, T> words, T otherwise) {
    return has(key) ? choice(key, name, words) : otherwise;
  }

  /** What is made of an object that must be there; empty when that has problems. */
  <T> Optional<T> object(
      String key, String name, String place, Function<JsonObjectReader, Optional<T>> reading) {
    JsonElement element = element(key);
    if (element instanceof JsonObject child) {
      return reading.apply(new JsonObjectReader(place, child, notes));
    }
    wrong(element, name, "an object in braces");
    return Optional.empty();
  }

  /** A list that must be there. */
  JsonArray array(String key, String name) {
    JsonElement element = element(key);
    if (element instanceof JsonArray array) {
      return array;
    }
    wrong(element, name, "a list in brackets");
    return new JsonArray();
  }

  private void wrong(JsonElement element, String name, String wanted) {
    problem(
        element instanceof JsonNull
            ? name + " is missing"
            : name + " must be " + wanted + ", not " + shown(element));
  }

  /**
   * Remarks on the keys that nobody asked for, then builds a record, unless this object or one
   * inside it had a problem. What the record refuses becomes a problem at this place.
   */
  <T> Optional<T> build(Supplier<T> maker) {
    remarkUnknownKeys();
    if (!isSound()) {
      return Optional.empty();
    }
    try {
      return Optional.of(maker.get());
    } catch (IllegalArgumentException refused) {
      problem(refused.getMessage());
      return Optional.empty();
    }
  }

  private void remarkUnknownKeys() {
    for (String key : object.keySet()) {
      if (!known.contains(key)) {
        notes.remark(place, "unknown key '" + Notes.shortened(key) + "' was ignored");
      }
    }
  }

  static String shown(JsonElement element) {
    if (element instanceof JsonObject) {
      return "an object";
    }
    return element instanceof JsonArray ? "a list" : Notes.shortened(element.toString());
  }
}

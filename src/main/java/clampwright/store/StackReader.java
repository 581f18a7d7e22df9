package clampwright.store;

import clampwright.joint.Element;
import clampwright.joint.Material;
import clampwright.joint.Outline;
import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Reads the stack: layers and washers from the head on. */
final class StackReader {
  private static final Element SOUND =
      new Element("", Element.Kind.LAYER, 1, 1, Outline.WIDE, MaterialReader.SOUND);

  private StackReader() {}

  static List<Element> read(JsonArray array, Notes notes) {
    List<Element> elements = new ArrayList<>();
    for (int i = 0; i < array.size(); i++) {
      JsonElement child = array.get(i);
      if (child instanceof JsonObject object) {
        element(new JsonObjectReader(place(i, object), object, notes)).ifPresent(elements::add);
      } else {
        notes.problem(
            "layer " + (i + 1),
            "must be an object in braces, not " + JsonObjectReader.shown(child));
      }
    }
    return elements;
  }

  /** Such as {@code layer 3 'Cover'}, counted from the head, washers too. */
  private static String place(int index, JsonObject object) {
    String place = "layer " + (index + 1);
    boolean named = object.get("name") instanceof JsonPrimitive primitive && primitive.isString();
    String name = named ? object.get("name").getAsString() : "";
    return name.isBlank() ? place : place + " '" + Notes.shortened(name) + "'";
  }

  private static Optional<Element> element(JsonObjectReader layer) {
    Element.Kind kind = layer.choice("kind", "kind", Words.KINDS, Element.Kind.LAYER);
    String name = layer.has("name") ? layer.text("name", "name") : "";
    double thickness = layer.number("thickness", "thickness", SOUND::withThickness);
    double hole = layer.number("hole", "hole", SOUND::withHole);
    Optional<Outline> outline =
        layer.object("outline", "outline", layer.place() + ", outline", StackReader::outline);
    Optional<Material> material =
        layer.object("material", "material", layer.place() + ", material", MaterialReader::read);
    return layer.build(
        () ->
            new Element(
                name, kind, thickness, hole, outline.orElseThrow(), material.orElseThrow()));
  }

  private static Optional<Outline> outline(JsonObjectReader outline) {
    return switch (outline.choice("shape", "shape", Words.SHAPES)) {
      case WIDE -> outline.build(() -> Outline.WIDE);
      case ROUND -> {
        double diameter = outline.number("diameter", "outside diameter", Outline.Round::new);
        yield outline.build(() -> new Outline.Round(diameter));
      }
      case STRIP -> {
        double left =
            outline.number("left", "edge distance, left", value -> new Outline.Strip(value, 1));
        double right =
            outline.number("right", "edge distance, right", value -> new Outline.Strip(1, value));
        yield outline.build(() -> new Outline.Strip(left, right));
      }
    };
  }
}

package clampwright.store;

import clampwright.joint.Introduction;
import clampwright.joint.LoadCase;
import clampwright.joint.Service;
import clampwright.joint.TemperatureCase;
import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** Reads load cases and temperature cases. */
final class ServiceReader {
  private static final LoadCase SOUND = LoadCase.steady("", 0, 1);
  private static final TemperatureCase SOUND_STATE = new TemperatureCase("", 20, 20);

  private ServiceReader() {}

  /**
   * Reads the service of a sketch.
   *
   * @param parts number of parts in the stack, which the planes of a load must be among
   */
  static Optional<Service> read(JsonObjectReader sketch, int parts, Notes notes) {
    Optional<Service> temperatures =
        sketch.has("temperatures")
            ? sketch.object(
                "temperatures", "temperatures", "temperatures", json -> temperatures(json, notes))
            : Optional.of(Service.of(SOUND));
    JsonArray array = sketch.array("loads", "loads");
    List<LoadCase> loads = list("load case", array, notes, json -> load(json, parts));
    if (array.isEmpty()) {
      notes.problem("loads", "there must be at least one load case");
    }
    return temperatures.isPresent() && !loads.isEmpty()
        ? Optional.of(temperatures.get().withLoads(loads))
        : Optional.empty();
  }

  private static Optional<Service> temperatures(JsonObjectReader json, Notes notes) {
    Service sound = Service.of(SOUND);
    double assembly =
        json.number("assembly", "temperature at assembly", Service.ROOM, sound::withAssembly);
    List<TemperatureCase> states =
        json.has("service")
            ? list(
                "temperature case",
                json.array("service", "service"),
                notes,
                ServiceReader::temperature)
            : List.of();
    return json.build(() -> sound.withAssembly(assembly).withTemperatures(states));
  }

  private static Optional<TemperatureCase> temperature(JsonObjectReader json) {
    String name = json.text("name", "name");
    double members = json.number("members", "temperature of the members", SOUND_STATE::withMembers);
    double bolt = json.number("bolt", "temperature of the bolt", SOUND_STATE::withBolt);
    return json.build(() -> new TemperatureCase(name, members, bolt));
  }

  private static Optional<LoadCase> load(JsonObjectReader json, int parts) {
    String name = json.text("name", "name");
    double max = json.number("axialMax", "axial load", 0, value -> SOUND.withAxial(value, value));
    double min =
        json.number("axialMin", "least axial load", max, value -> SOUND.withAxial(value, value));
    double shear = json.number("shear", "shear load", 0, SOUND::withShear);
    Optional<Introduction> introduction =
        json.has("introduction")
            ? json.object(
                "introduction",
                "introduction",
                json.place() + ", introduction",
                inner -> introduction(inner, parts))
            : Optional.of(Introduction.ENDS);
    double friction =
        json.number(
            "friction",
            "friction between the members",
            LoadCase.USUAL_FRICTION,
            SOUND::withFriction);
    double faces =
        json.number("slipFaces", "slip faces", 1, value -> SOUND.withSlipFaces(whole(value)));
    Optional<String> temperature =
        json.has("temperature")
            ? Optional.of(json.text("temperature", "temperature"))
            : Optional.empty();
    return json.build(
        () ->
            new LoadCase(
                name,
                min,
                max,
                shear,
                introduction.orElseThrow(),
                friction,
                whole(faces),
                temperature));
  }

  private static int whole(double value) {
    if (value != Math.rint(value) || Math.abs(value) > 1000) {
      throw new IllegalArgumentException("number of slip faces must be a whole number");
    }
    return (int) value;
  }

  private static Optional<Introduction> introduction(JsonObjectReader json, int parts) {
    if (json.has("enters") || json.has("leaves")) {
      double upper = json.number("enters", "enters", value -> plane(value, parts));
      double lower = json.number("leaves", "leaves", value -> plane(value, parts));
      return json.build(() -> new Introduction.Planes(plane(upper, parts), plane(lower, parts)));
    }
    double factor = json.number("factor", "load-introduction factor", Introduction.Factor::new);
    return json.build(() -> new Introduction.Factor(factor));
  }

  /** The index of a part that a file counts from 1, at the head. */
  private static int plane(double number, int parts) {
    if (number != Math.rint(number) || number < 1 || number > parts) {
      throw new IllegalArgumentException("the load must enter and leave at one of the parts");
    }
    return (int) number - 1;
  }

  private static <T> List<T> list(
      String what, JsonArray array, Notes notes, Function<JsonObjectReader, Optional<T>> reading) {
    List<T> list = new ArrayList<>();
    for (int i = 0; i < array.size(); i++) {
      JsonElement child = array.get(i);
      String place = what + " " + (i + 1);
      if (child instanceof JsonObject object) {
        reading.apply(new JsonObjectReader(place, object, notes)).ifPresent(list::add);
      } else {
        notes.problem(place, "must be an object in braces, not " + JsonObjectReader.shown(child));
      }
    }
    return list;
  }
}

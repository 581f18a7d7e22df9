package clampwright.store;

import clampwright.joint.Introduction;
import clampwright.joint.LoadCase;
import clampwright.joint.Service;
import clampwright.joint.TemperatureCase;
import com.google.gson.JsonArray;
import com.google.gson.JsonObject;

/** Writes load cases [N] and temperature cases [°C]. */
final class ServiceWriter {
  private ServiceWriter() {}

  static JsonObject temperatures(Service service) {
    JsonObject json = new JsonObject();
    SketchWriter.number(json, "assembly", service.assembly());
    JsonArray states = new JsonArray();
    for (TemperatureCase state : service.temperatures()) {
      JsonObject written = new JsonObject();
      written.addProperty("name", state.name());
      SketchWriter.number(written, "members", state.members());
      SketchWriter.number(written, "bolt", state.bolt());
      states.add(written);
    }
    json.add("service", states);
    return json;
  }

  static JsonArray loads(Service service) {
    JsonArray loads = new JsonArray();
    service.loads().forEach(load -> loads.add(load(load)));
    return loads;
  }

  private static JsonObject load(LoadCase load) {
    JsonObject json = new JsonObject();
    json.addProperty("name", load.name());
    SketchWriter.number(json, "axialMin", load.axialMin());
    SketchWriter.number(json, "axialMax", load.axialMax());
    SketchWriter.number(json, "shear", load.shear());
    json.add("introduction", introduction(load.introduction()));
    SketchWriter.number(json, "friction", load.friction());
    SketchWriter.number(json, "slipFaces", load.slipFaces());
    load.temperature().ifPresent(name -> json.addProperty("temperature", name));
    return json;
  }

  private static JsonObject introduction(Introduction introduction) {
    JsonObject json = new JsonObject();
    if (introduction instanceof Introduction.Factor factor) {
      SketchWriter.number(json, "factor", factor.factor());
    } else if (introduction instanceof Introduction.Planes planes) {
      SketchWriter.number(json, "enters", planes.upper() + 1);
      SketchWriter.number(json, "leaves", planes.lower() + 1);
    }
    return json;
  }
}

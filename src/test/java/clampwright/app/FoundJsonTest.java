package clampwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;

/** What programs may rely on: the keys, the words, the units. */
class FoundJsonTest {

  private static JsonObject found(String sample) {
    Run run = Run.of("found", Path.of("samples", sample + ".joint.json").toString(), "--json");
    assertEquals(0, run.exit(), run.err());
    return JsonParser.parseString(run.out()).getAsJsonObject();
  }

  private static void checkKeys(String keys, JsonObject object) {
    assertEquals(List.of(keys.split(", ")), new ArrayList<>(object.keySet()));
  }

  @Test
  void theKeysInTheirOrder() {
    JsonObject found = found("gearbox-lid");
    checkKeys(
        "name, angle, zone, elements, memberStiffness, chosenMethod, boltStiffness, loadFactor,"
            + " preload, load, boltLoad, clampLoad, partingLoad, loadCases, checks,"
            + " sensitivity, notices, caution",
        found);
    checkKeys("rule, headDegrees, nutDegrees", found.getAsJsonObject("angle"));
    checkKeys(
        "length, headFaceDiameter, nutFaceDiameter, headWasherRule, nutWasherRule",
        found.getAsJsonObject("zone"));
    checkKeys(
        "min, nominal, max, assembly, settling, relaxed, temperatures",
        found.getAsJsonObject("preload"));
    checkKeys("axial", found.getAsJsonObject("load"));
    checkKeys(
        "midPlaneCylinders, fullFrusta, vdi2230, wileman",
        found.getAsJsonObject("memberStiffness"));
    for (JsonElement element : found.getAsJsonArray("elements")) {
      checkKeys(
          "name, kind, thickness, clampedThickness, depthFromHead, depthFromNut, governing,"
              + " edgeLimited, edgeClipped, effectiveDiameter, area, stiffness",
          element.getAsJsonObject());
    }
  }

  @Test
  void aMethodHasItsNumbersOrTheReasonWhyNot() {
    JsonObject members = found("gearbox-lid").getAsJsonObject("memberStiffness");
    for (String method : List.of("midPlaneCylinders", "fullFrusta", "vdi2230")) {
      checkKeys("stiffness, loadFactor", members.getAsJsonObject(method));
    }
    checkKeys("notApplicable", members.getAsJsonObject("wileman"));
  }

  /** The numbers worked by hand for this sample (see GearboxLidTest). */
  @Test
  void theNumbersAreInMillimetresAndNewtons() {
    JsonObject found = found("gearbox-lid");
    checkNear(1_324_511.6126, found.getAsJsonObject("memberStiffness"), "midPlaneCylinders");
    checkNear(260_376.2874, found.get("boltStiffness"));
    checkNear(0.115000816, found.get("loadFactor"));
    checkNear(18_115.943127, found.getAsJsonObject("preload").get("nominal"));
    checkNear(6000, found.getAsJsonObject("load").get("axial"));
    checkNear(31_719.912503, found.get("boltLoad"));
    checkNear(6_199.551251, found.get("clampLoad"));
    checkNear(13_005.149113, found.get("partingLoad"));
    JsonObject zone = found.getAsJsonObject("zone");
    checkNear(37.5, zone.get("length"));
    checkNear(14.63, zone.get("headFaceDiameter"));
    checkNear(18, zone.get("nutFaceDiameter"));
    JsonObject lid = found.getAsJsonArray("elements").get(1).getAsJsonObject();
    checkNear(28.63, lid.get("effectiveDiameter"));
    checkNear(7, lid.get("depthFromHead"));
    checkNear(30.5, lid.get("depthFromNut"));
  }

  @Test
  void thePreloadOfEveryTemperature() {
    JsonObject preload = found("gearbox-lid").getAsJsonObject("preload");
    checkNear(22_250.340841, preload.getAsJsonObject("assembly").get("nominal"));
    checkNear(4_134.397713, preload.get("settling"));
    List<String> names = new ArrayList<>();
    preload
        .getAsJsonArray("temperatures")
        .forEach(state -> names.add(state.getAsJsonObject().get("name").getAsString()));
    assertEquals(List.of("at assembly temperature", "Hot oil", "Cold start"), names);
    JsonObject cold = preload.getAsJsonArray("temperatures").get(2).getAsJsonObject();
    checkNear(11_509.546358, cold.get("min"));
    checkNear(-1_488.818377, cold.get("change"));
  }

  @Test
  void everyLoadCaseAndCheck() {
    JsonObject found = found("gearbox-lid");
    assertEquals(2, found.getAsJsonArray("loadCases").size());
    JsonObject test = found.getAsJsonArray("loadCases").get(1).getAsJsonObject();
    assertEquals("Pressure test", test.get("name").getAsString());
    checkNear(9_000, test.get("axialMax"));
    assertEquals(12, found.getAsJsonArray("checks").size());
    JsonObject parting = found.getAsJsonArray("checks").get(4).getAsJsonObject();
    checkKeys(
        "name, case, temperature, method, demand, capacity, unit, factor, margin, source", parting);
    assertEquals("parting", parting.get("name").getAsString());
    assertEquals("Pressure test", parting.get("case").getAsString());
    assertEquals("Cold start", parting.get("temperature").getAsString());
    assertEquals(0.278838484, parting.get("margin").getAsDouble(), 1e-6);
    JsonObject pressure = found.getAsJsonArray("checks").get(7).getAsJsonObject();
    checkKeys("name, notApplicable", pressure);
  }

  /** Of all inputs with a tolerance the one that moves the margin most comes first. */
  @Test
  void theSensitivity() {
    JsonObject first = found("gearbox-lid").getAsJsonArray("sensitivity").get(0).getAsJsonObject();
    checkKeys("input, low, high, unit, marginAtLow, marginAtHigh", first);
    assertEquals("preload at assembly", first.get("input").getAsString());
    checkNear(-0.23, first.get("low"));
  }

  private static void checkNear(double expected, JsonObject members, String method) {
    checkNear(expected, members.getAsJsonObject(method).get("stiffness"));
  }

  private static void checkNear(double expected, JsonElement found) {
    assertEquals(1, found.getAsDouble() / expected, 1e-6);
  }

  @Test
  void theWordsForChoices() {
    JsonObject lid = found("gearbox-lid");
    assertEquals("fixed45", lid.getAsJsonObject("angle").get("rule").getAsString());
    assertEquals("midPlaneCylinders", lid.get("chosenMethod").getAsString());
    assertEquals("headEdge", lid.getAsJsonObject("zone").get("headWasherRule").getAsString());
    assertEquals("wholeWasher", lid.getAsJsonObject("zone").get("nutWasherRule").getAsString());
    List<String> governing = new ArrayList<>();
    lid.getAsJsonArray("elements")
        .forEach(each -> governing.add(each.getAsJsonObject().get("governing").getAsString()));
    assertEquals(List.of("head", "head", "nut", "both", "nut", "nut"), governing);
    JsonObject first = lid.getAsJsonArray("elements").get(0).getAsJsonObject();
    assertEquals("washer", first.get("kind").getAsString());
    assertEquals(
        Set.of("typed", "fixed30", "vdi2230"),
        Set.of(rule("pillar-cap"), rule("press-tie"), rule("gate-hinge")));
  }

  private static String rule(String sample) {
    return found(sample).getAsJsonObject("angle").get("rule").getAsString();
  }

  /** In a tapped joint only the layer's clamped part counts; its thickness stays as drawn. */
  @Test
  void aTappedLayerIsClampedInPart() {
    JsonObject housing =
        found("sensor-housing").getAsJsonArray("elements").get(2).getAsJsonObject();
    assertEquals(20, housing.get("thickness").getAsDouble());
    assertEquals(3, housing.get("clampedThickness").getAsDouble(), 1e-12);
  }

  @Test
  void noticesSayWhichPartTheyMean() {
    String notice = found("bearing-block").getAsJsonArray("notices").get(0).getAsString();
    assertTrue(notice.startsWith("layer 2 'Bearing foot': "), notice);
  }
}

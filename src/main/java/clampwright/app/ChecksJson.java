package clampwright.app;

import clampwright.joint.Joint;
import clampwright.mechanics.Preload;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Verdict;
import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import java.util.List;

/** The checks as JSON: N or MPa, with the case that was worst. */
final class ChecksJson {
  private ChecksJson() {}

  static JsonArray of(Joint joint, List<Verdict> verdicts) {
    JsonArray checks = new JsonArray();
    verdicts.forEach(verdict -> checks.add(check(joint, verdict)));
    return checks;
  }

  private static JsonObject check(Joint joint, Verdict verdict) {
    JsonObject json = new JsonObject();
    json.addProperty("name", word(verdict.kind()));
    if (verdict instanceof Verdict.NotApplicable not) {
      json.addProperty("notApplicable", not.why().text());
    } else if (verdict instanceof Verdict.Judged judged) {
      addMargin(json, joint, judged);
    }
    return json;
  }

  private static void addMargin(JsonObject json, Joint joint, Verdict.Judged judged) {
    Verdict.Where where = judged.where();
    if (where.loadCase() >= 0) {
      json.addProperty("case", joint.service().loads().get(where.loadCase()).name());
    }
    if (where.temperature() >= 0) {
      json.addProperty(
          "temperature", joint.service().temperatures().get(where.temperature()).name());
    } else if (where.temperature() == Preload.ROOM) {
      json.addProperty("temperature", "at assembly temperature");
    }
    where.method().ifPresent(method -> json.addProperty("method", FoundJson.word(method)));
    if (judged.part().isElement()) {
      json.addProperty("part", joint.elements().get(judged.part().index()).name());
    }
    FoundJson.number(json, "demand", judged.demand());
    FoundJson.number(json, "capacity", judged.capacity());
    json.addProperty("unit", judged.kind().measure() == CheckKind.Measure.FORCE ? "N" : "MPa");
    FoundJson.number(json, "factor", judged.factor());
    FoundJson.number(json, "margin", judged.margin());
    json.addProperty("source", judged.kind().source());
  }

  /** For programs: these words stay when those for readers change. */
  private static String word(CheckKind kind) {
    return switch (kind) {
      case YIELD_AT_TIGHTENING -> "yieldAtTightening";
      case STRESS_IN_SERVICE -> "stressInService";
      case RUPTURE -> "rupture";
      case YIELD_UNDER_LOAD -> "yieldUnderLoad";
      case PARTING -> "parting";
      case SLIP -> "slip";
      case SHEAR_WITH_TENSION -> "shearWithTension";
      case BEARING_PRESSURE -> "bearingPressure";
      case CRUSHING -> "crushing";
      case HOLE_BEARING -> "holeBearing";
      case THREAD_STRIPPING -> "threadStripping";
      case FATIGUE -> "fatigue";
    };
  }
}

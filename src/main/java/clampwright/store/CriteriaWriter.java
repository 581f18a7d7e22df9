package clampwright.store;

import clampwright.joint.Allowables;
import clampwright.joint.Criteria;
import clampwright.joint.Factors;
import clampwright.joint.Tolerances;
import com.google.gson.JsonObject;

/** Writes what the joint is judged by: N, MPa, shares, K, degrees. */
final class CriteriaWriter {
  private CriteriaWriter() {}

  static JsonObject json(Criteria criteria) {
    JsonObject json = new JsonObject();
    json.addProperty("basis", Words.of(Words.BASES, criteria.basis()));
    json.add("factors", factors(criteria.factors()));
    if (!criteria.allowables().equals(Allowables.OF_STRENGTH_CLASS)) {
      json.add("allowables", allowables(criteria.allowables()));
    }
    json.addProperty("fatigue", Words.of(Words.FATIGUES, criteria.fatigue()));
    SketchWriter.number(json, "cycles", criteria.cycles());
    json.add("tolerances", tolerances(criteria.tolerances()));
    return json;
  }

  private static JsonObject factors(Factors factors) {
    JsonObject json = new JsonObject();
    SketchWriter.number(json, "fitting", factors.fitting());
    SketchWriter.number(json, "ultimate", factors.ultimate());
    SketchWriter.number(json, "yield", factors.yield());
    SketchWriter.number(json, "parting", factors.parting());
    SketchWriter.number(json, "slip", factors.slip());
    return json;
  }

  private static JsonObject allowables(Allowables allowables) {
    JsonObject json = new JsonObject();
    SketchWriter.optional(json, "ultimate", allowables.ultimate());
    SketchWriter.optional(json, "yield", allowables.yield());
    SketchWriter.optional(json, "shear", allowables.shear());
    SketchWriter.optional(json, "amplitude", allowables.amplitude());
    return json;
  }

  private static JsonObject tolerances(Tolerances tolerances) {
    JsonObject json = new JsonObject();
    SketchWriter.number(json, "thickness", tolerances.thickness());
    SketchWriter.number(json, "modulus", tolerances.modulus());
    SketchWriter.number(json, "friction", tolerances.friction());
    SketchWriter.number(json, "introduction", tolerances.introduction());
    SketchWriter.number(json, "temperature", tolerances.temperature());
    SketchWriter.number(json, "angleLow", tolerances.angleLow());
    SketchWriter.number(json, "angleHigh", tolerances.angleHigh());
    return json;
  }
}

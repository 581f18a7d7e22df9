package clampwright.store;

import clampwright.joint.Embedment;
import clampwright.joint.Scatter;
import clampwright.joint.Target;
import clampwright.joint.Tightening;
import com.google.gson.JsonObject;

/** Writes how the bolt is tightened: N, N·mm, mm. */
final class TighteningWriter {
  private TighteningWriter() {}

  static JsonObject json(Tightening tightening) {
    JsonObject json = new JsonObject();
    json.add("target", target(tightening.target()));
    json.add("scatter", scatter(tightening.scatter()));
    SketchWriter.optional(json, "threadFriction", tightening.threadFriction());
    json.add("embedment", embedment(tightening.embedment()));
    SketchWriter.number(json, "relaxation", tightening.relaxation());
    SketchWriter.number(json, "creep", tightening.creep());
    return json;
  }

  private static JsonObject target(Target target) {
    JsonObject json = new JsonObject();
    if (target instanceof Target.Force force) {
      json.addProperty("given", Words.of(Words.TARGETS, Words.Given.FORCE));
      SketchWriter.number(json, "force", force.force());
    } else if (target instanceof Target.ProofFraction share) {
      json.addProperty("given", Words.of(Words.TARGETS, Words.Given.PROOF_FRACTION));
      SketchWriter.number(json, "fraction", share.fraction());
    } else if (target instanceof Target.NutFactorTorque torque) {
      json.addProperty("given", Words.of(Words.TARGETS, Words.Given.NUT_FACTOR_TORQUE));
      SketchWriter.number(json, "torque", torque.torque());
      SketchWriter.number(json, "nutFactor", torque.nutFactor());
    } else if (target instanceof Target.FrictionTorque torque) {
      json.addProperty("given", Words.of(Words.TARGETS, Words.Given.FRICTION_TORQUE));
      SketchWriter.number(json, "torque", torque.torque());
      SketchWriter.number(json, "threadFriction", torque.threadFriction());
      SketchWriter.number(json, "faceFriction", torque.faceFriction());
    }
    return json;
  }

  private static JsonObject scatter(Scatter scatter) {
    JsonObject json = new JsonObject();
    if (scatter instanceof Scatter.TighteningFactor factor) {
      SketchWriter.number(json, "tighteningFactor", factor.factor());
    } else {
      SketchWriter.number(json, "plusMinus", scatter.share());
    }
    return json;
  }

  private static JsonObject embedment(Embedment embedment) {
    JsonObject json = new JsonObject();
    if (embedment instanceof Embedment.FromRoughness rough) {
      json.addProperty("roughness", Words.of(Words.ROUGHNESSES, rough.roughness()));
      json.addProperty("sheared", rough.sheared());
    } else if (embedment instanceof Embedment.Typed typed) {
      SketchWriter.number(json, "amount", typed.amount());
    }
    return json;
  }
}

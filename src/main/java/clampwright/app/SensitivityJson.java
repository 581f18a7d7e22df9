package clampwright.app;

import clampwright.figure.Straying;
import clampwright.joint.Joint;
import clampwright.mechanics.checks.Verdict;
import clampwright.mechanics.spread.Margin;
import clampwright.mechanics.spread.Sensitivity;
import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import java.util.Optional;

/** How the worst margin moves with each input that has a tolerance, as JSON. */
final class SensitivityJson {
  private SensitivityJson() {}

  static JsonArray of(Joint joint) {
    JsonArray bars = new JsonArray();
    for (Sensitivity.Bar bar : Sensitivity.of(joint, Margin.WORST).bars()) {
      JsonObject json = new JsonObject();
      json.addProperty("input", Straying.name(bar.input(), joint));
      FoundJson.number(json, "low", bar.input().low());
      FoundJson.number(json, "high", bar.input().high());
      json.addProperty(
          "unit",
          switch (bar.input().kind()) {
            case INTRODUCTION -> "1";
            case MEMBERS_TEMPERATURE, BOLT_TEMPERATURE -> "K";
            case ANGLE -> "degrees";
            default -> "share";
          });
      add(json, "marginAtLow", bar.low());
      add(json, "marginAtHigh", bar.high());
      bars.add(json);
    }
    return bars;
  }

  private static void add(JsonObject json, String key, Optional<Verdict.Judged> verdict) {
    verdict.ifPresent(judged -> FoundJson.number(json, key, judged.margin()));
  }
}

package clampwright.app;

import clampwright.figure.Sentences;
import clampwright.joint.AngleRule;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Sketch;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.Band;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.LoadSharing;
import clampwright.mechanics.MemberStiffness;
import clampwright.mechanics.Preload;
import clampwright.mechanics.Side;
import clampwright.mechanics.Zone;
import clampwright.mechanics.checks.Checks;
import com.google.gson.Gson;
import com.google.gson.GsonBuilder;
import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import java.math.BigDecimal;
import java.math.MathContext;

/** The readouts as JSON, in mm, mm², N, N/mm, degrees. */
final class FoundJson {
  private static final Gson GSON =
      new GsonBuilder().setPrettyPrinting().disableHtmlEscaping().create();

  private FoundJson() {}

  static String of(Sketch sketch, Solved solved) {
    Joint joint = sketch.joint();
    JsonObject root = new JsonObject();
    root.addProperty("name", sketch.name());
    root.add("angle", angle(joint.method().angle(), solved.zone()));
    root.add("zone", zone(solved.zone()));
    root.add("elements", elements(joint, solved));
    root.add("memberStiffness", members(solved));
    root.addProperty("chosenMethod", word(joint.method().stiffness()));
    number(root, "boltStiffness", solved.bolt().stiffness());
    addLoads(root, solved);
    root.add("loadCases", loadCases(joint, solved));
    root.add("checks", ChecksJson.of(joint, Checks.of(joint, solved)));
    root.add("sensitivity", SensitivityJson.of(joint));
    root.add("notices", notices(joint, solved));
    root.addProperty("caution", Sentences.CAUTION);
    return GSON.toJson(root) + "\n";
  }

  /** The first load case. */
  private static void addLoads(JsonObject root, Solved solved) {
    LoadSharing sharing = solved.sharing();
    JsonObject load = new JsonObject();
    number(load, "axial", sharing.axialMax());
    number(root, "loadFactor", sharing.loadFactor());
    root.add("preload", preload(solved));
    root.add("load", load);
    number(root, "boltLoad", sharing.boltLoad());
    number(root, "clampLoad", sharing.clampLoad());
    number(root, "partingLoad", sharing.partingLoad());
  }

  /** In service for the first load case; then at assembly and in each temperature case. */
  private static JsonObject preload(Solved solved) {
    Preload preload = solved.preload();
    JsonObject json = band(solved.sharing().preload());
    Band assembly = new Band(preload.assemblyMin(), preload.nominal(), preload.assemblyMax());
    json.add("assembly", band(assembly));
    number(json, "settling", preload.settling(solved.series()));
    number(json, "relaxed", preload.relaxed());
    JsonArray states = new JsonArray();
    JsonObject room = band(preload.inService(solved.series(), Preload.ROOM));
    room.addProperty("name", "at assembly temperature");
    states.add(room);
    for (int i = 0; i < preload.mismatches().size(); i++) {
      JsonObject state = band(preload.inService(solved.series(), i));
      state.addProperty("name", preload.mismatches().get(i).name());
      number(state, "change", preload.thermal(solved.series(), i));
      states.add(state);
    }
    json.add("temperatures", states);
    return json;
  }

  private static JsonArray loadCases(Joint joint, Solved solved) {
    JsonArray cases = new JsonArray();
    for (int i = 0; i < solved.cases().size(); i++) {
      LoadSharing sharing = solved.cases().get(i);
      JsonObject json = new JsonObject();
      json.addProperty("name", joint.service().loads().get(i).name());
      number(json, "axialMin", sharing.axialMin());
      number(json, "axialMax", sharing.axialMax());
      number(json, "shear", joint.service().loads().get(i).shear());
      number(json, "introduction", sharing.introduction());
      number(json, "loadFactor", sharing.loadFactor());
      json.add("preload", band(sharing.preload()));
      number(json, "boltLoad", sharing.boltLoad());
      number(json, "clampLoad", sharing.clampLoad());
      number(json, "partingLoad", sharing.partingLoad());
      cases.add(json);
    }
    return cases;
  }

  private static JsonObject band(Band band) {
    JsonObject json = new JsonObject();
    number(json, "min", band.min());
    number(json, "nominal", band.nominal());
    number(json, "max", band.max());
    return json;
  }

  private static JsonObject angle(AngleRule rule, Zone zone) {
    JsonObject json = new JsonObject();
    json.addProperty("rule", word(rule));
    number(json, "headDegrees", Math.toDegrees(zone.headHalfAngle()));
    number(json, "nutDegrees", Math.toDegrees(zone.nutHalfAngle()));
    return json;
  }

  private static String word(AngleRule rule) {
    if (rule instanceof AngleRule.Typed) {
      return "typed";
    }
    if (rule instanceof AngleRule.Vdi2230) {
      return "vdi2230";
    }
    return rule instanceof AngleRule.Fixed30 ? "fixed30" : "fixed45";
  }

  private static JsonObject zone(Zone zone) {
    JsonObject json = new JsonObject();
    number(json, "length", zone.length());
    number(json, "headFaceDiameter", zone.headFaceDiameter());
    number(json, "nutFaceDiameter", zone.nutFaceDiameter());
    json.addProperty("headWasherRule", word(zone.headWasher()));
    json.addProperty("nutWasherRule", word(zone.nutWasher()));
    return json;
  }

  /** The rule as it was taken, also where it was left to the program. */
  private static String word(Zone.WasherDecision decision) {
    return switch (decision.taken()) {
      case NO_WASHER -> "noWasher";
      case WHOLE_WASHER -> "wholeWasher";
      case FROM_THE_HEADS_EDGE -> "headEdge";
    };
  }

  private static JsonArray elements(Joint joint, Solved solved) {
    JsonArray elements = new JsonArray();
    for (int i = 0; i < solved.elements().size(); i++) {
      elements.add(element(joint.elements().get(i), solved.elements().get(i)));
    }
    return elements;
  }

  private static JsonObject element(Element element, ElementFinding finding) {
    JsonObject json = new JsonObject();
    json.addProperty("name", element.name());
    json.addProperty("kind", element.isWasher() ? "washer" : "layer");
    number(json, "thickness", element.thickness());
    number(json, "clampedThickness", finding.clampedThickness());
    number(json, "depthFromHead", finding.depthFromHead());
    number(json, "depthFromNut", finding.depthFromNut());
    json.addProperty("governing", word(finding.governing()));
    json.addProperty("edgeLimited", finding.edgeLimited());
    json.addProperty("edgeClipped", finding.edgeClipped());
    number(json, "effectiveDiameter", finding.effectiveDiameter());
    number(json, "area", finding.area());
    number(json, "stiffness", finding.stiffness());
    return json;
  }

  /** For programs: these words stay when those for readers change. */
  private static String word(Side side) {
    return switch (side) {
      case HEAD -> "head";
      case NUT -> "nut";
      case BOTH -> "both";
    };
  }

  private static JsonObject members(Solved solved) {
    MemberStiffness members = solved.members();
    JsonObject json = new JsonObject();
    for (StiffnessMethod method : StiffnessMethod.values()) {
      JsonObject result = new JsonObject();
      if (members.get(method) instanceof MemberStiffness.Value value) {
        number(result, "stiffness", value.stiffness());
        number(result, "loadFactor", value.loadFactor(solved.sharing().introduction()));
      } else if (members.get(method) instanceof MemberStiffness.NotApplicable not) {
        result.addProperty("notApplicable", not.why().text());
      }
      json.add(word(method), result);
    }
    return json;
  }

  static String word(StiffnessMethod method) {
    return switch (method) {
      case MID_PLANE_CYLINDERS -> "midPlaneCylinders";
      case FULL_FRUSTA -> "fullFrusta";
      case VDI_2230 -> "vdi2230";
      case WILEMAN -> "wileman";
    };
  }

  private static JsonArray notices(Joint joint, Solved solved) {
    JsonArray notices = new JsonArray();
    solved
        .notices()
        .forEach(
            notice -> notices.add(Places.told(notice.part(), joint, Sentences.notice(notice))));
    return notices;
  }

  /** Fourteen figures: all that the arithmetic is good for, without the noise behind them. */
  static void number(JsonObject json, String key, double value) {
    BigDecimal rounded = new BigDecimal(value).round(new MathContext(14)).stripTrailingZeros();
    boolean plain = rounded.scale() < 0 && rounded.scale() > -16;
    json.addProperty(key, plain ? rounded.setScale(0) : rounded);
  }
}

package clampwright.store;

import clampwright.joint.Anchor;
import clampwright.joint.AngleRule;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Joint;
import clampwright.joint.Material;
import clampwright.joint.Method;
import clampwright.joint.Note;
import clampwright.joint.Outline;
import clampwright.joint.ScrewThread;
import clampwright.joint.Sketch;
import clampwright.joint.Strength;
import com.google.gson.Gson;
import com.google.gson.GsonBuilder;
import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import java.math.BigDecimal;
import java.util.Locale;
import java.util.OptionalDouble;

/** Writes a sketch as JSON: mm, N, MPa, 1/K, degrees. */
final class SketchWriter {
  private static final Gson GSON =
      new GsonBuilder().setPrettyPrinting().disableHtmlEscaping().create();

  private SketchWriter() {}

  static String text(Sketch sketch) {
    JsonObject root = new JsonObject();
    root.addProperty(SketchFormat.KEY, SketchFormat.NEWEST);
    root.addProperty("name", sketch.name());
    root.addProperty("units", Words.of(Words.UNITS, sketch.units()));
    Joint joint = sketch.joint();
    root.add("bolt", bolt(joint.fastener()));
    JsonArray stack = new JsonArray();
    joint.elements().forEach(element -> stack.add(element(element)));
    root.add("stack", stack);
    JsonObject rules = new JsonObject();
    rules.addProperty("head", Words.of(Words.WASHER_RULES, joint.headWasherRule()));
    rules.addProperty("nut", Words.of(Words.WASHER_RULES, joint.nutWasherRule()));
    root.add("washerRule", rules);
    root.add("method", method(joint.method()));
    root.add("tightening", TighteningWriter.json(joint.tightening()));
    root.add("temperatures", ServiceWriter.temperatures(joint.service()));
    root.add("loads", ServiceWriter.loads(joint.service()));
    root.add("criteria", CriteriaWriter.json(joint.criteria()));
    if (!sketch.notes().isEmpty()) {
      JsonArray notes = new JsonArray();
      sketch.notes().forEach(note -> notes.add(note(note)));
      root.add("notes", notes);
    }
    return encodable(GSON.toJson(root)) + "\n";
  }

  private static JsonObject note(Note note) {
    JsonObject json = new JsonObject();
    json.addProperty("text", note.text());
    json.addProperty("at", Words.of(Words.NOTED, note.part().kind()));
    if (note.part().isElement()) {
      number(json, "layer", note.part().index() + 1);
    }
    number(json, "fromAxis", note.fromAxis());
    number(json, "z", note.z());
    return json;
  }

  private static JsonObject bolt(Fastener fastener) {
    JsonObject bolt = new JsonObject();
    bolt.add("thread", thread(fastener.thread()));
    bolt.add("head", head(fastener.head()));
    bolt.add("anchor", anchor(fastener.anchor()));
    optional(bolt, "length", fastener.length());
    optional(bolt, "shankLength", fastener.shankLength());
    optional(bolt, "shankDiameter", fastener.shankDiameter());
    number(bolt, "bore", fastener.bore());
    bolt.add("strength", strength(fastener.strength()));
    bolt.add("material", material(fastener.material()));
    return bolt;
  }

  private static JsonObject thread(ScrewThread thread) {
    JsonObject json = new JsonObject();
    json.addProperty("designation", thread.designation());
    json.addProperty("form", Words.of(Words.FORMS, thread.form()));
    number(json, "diameter", thread.diameter());
    number(json, "pitch", thread.pitch());
    return json;
  }

  private static JsonObject head(Head head) {
    JsonObject json = new JsonObject();
    json.addProperty("style", Words.of(Words.STYLES, head.style()));
    json.addProperty("standard", head.standard());
    number(json, "bearingDiameter", head.bearingDiameter());
    number(json, "height", head.height());
    number(json, "width", head.width());
    number(json, "rim", head.rim());
    return json;
  }

  private static JsonObject anchor(Anchor anchor) {
    JsonObject json = new JsonObject();
    if (anchor instanceof Anchor.Nut nut) {
      json.addProperty("kind", "nut");
      json.addProperty("standard", nut.standard());
      number(json, "bearingDiameter", nut.bearingDiameter());
      number(json, "height", nut.height());
      number(json, "width", nut.width());
    } else {
      json.addProperty("kind", "tapped");
    }
    return json;
  }

  private static JsonObject strength(Strength strength) {
    JsonObject json = new JsonObject();
    json.addProperty("standard", strength.standard());
    json.addProperty("grade", strength.grade());
    optional(json, "proof", strength.proof());
    optional(json, "yield", strength.yield());
    number(json, "tensile", strength.tensile());
    return json;
  }

  private static JsonObject material(Material material) {
    JsonObject json = new JsonObject();
    json.addProperty("name", material.name());
    json.addProperty("family", Words.of(Words.FAMILIES, material.family()));
    number(json, "modulus", material.modulus());
    optional(json, "poisson", material.poisson());
    optional(json, "expansion", material.expansion());
    optional(json, "tensile", material.tensile());
    optional(json, "pressureLimit", material.pressureLimit());
    return json;
  }

  private static JsonObject element(Element element) {
    JsonObject json = new JsonObject();
    json.addProperty("kind", Words.of(Words.KINDS, element.kind()));
    json.addProperty("name", element.name());
    number(json, "thickness", element.thickness());
    number(json, "hole", element.hole());
    json.add("outline", outline(element.outline()));
    json.add("material", material(element.material()));
    return json;
  }

  private static JsonObject outline(Outline outline) {
    JsonObject json = new JsonObject();
    if (outline instanceof Outline.Round round) {
      json.addProperty("shape", "round");
      number(json, "diameter", round.diameter());
    } else if (outline instanceof Outline.Strip strip) {
      json.addProperty("shape", "strip");
      number(json, "left", strip.left());
      number(json, "right", strip.right());
    } else {
      json.addProperty("shape", "wide");
    }
    return json;
  }

  private static JsonObject method(Method method) {
    JsonObject json = new JsonObject();
    json.add("angle", angle(method.angle()));
    optional(json, "bodyDiameter", method.bodyDiameter());
    json.addProperty("stiffness", Words.of(Words.METHODS, method.stiffness()));
    json.addProperty("endsCounted", method.endsCounted());
    json.addProperty("threadArea", Words.of(Words.THREAD_AREAS, method.threadArea()));
    return json;
  }

  private static JsonObject angle(AngleRule rule) {
    JsonObject json = new JsonObject();
    if (rule instanceof AngleRule.Typed typed) {
      json.addProperty("rule", "typed");
      number(json, "head", typed.headDegrees());
      number(json, "nut", typed.nutDegrees());
    } else {
      json.addProperty("rule", Words.of(Words.ANGLE_RULES, rule));
    }
    return json;
  }

  static void optional(JsonObject json, String key, OptionalDouble value) {
    value.ifPresent(number -> number(json, key, number));
  }

  /** The shortest number that reads back as the same double, without a needless ".0". */
  static void number(JsonObject json, String key, double value) {
    boolean whole = value == Math.rint(value) && Math.abs(value) < 1e15;
    boolean negativeZero = value == 0 && 1 / value < 0;
    if (whole && !negativeZero) {
      json.addProperty(key, (long) value);
    } else {
      json.addProperty(key, negativeZero ? value : new BigDecimal(Double.toString(value)));
    }
  }

  /** Half a surrogate pair, which UTF-8 has no bytes for, as its escape. */
  private static String encodable(String text) {
    StringBuilder encodable = new StringBuilder(text.length());
    text.codePoints()
        .forEach(
            point -> {
              if (point >= Character.MIN_SURROGATE && point <= Character.MAX_SURROGATE) {
                encodable.append(String.format(Locale.ROOT, "\\u%04x", point));
              } else {
                encodable.appendCodePoint(point);
              }
            });
    return encodable.toString();
  }
}

package clampwright.store;

import clampwright.joint.AngleRule;
import clampwright.joint.Criteria;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Method;
import clampwright.joint.Note;
import clampwright.joint.Service;
import clampwright.joint.Sketch;
import clampwright.joint.StiffnessMethod;
import clampwright.joint.Tightening;
import clampwright.joint.WasherRule;
import clampwright.quantity.UnitSystem;
import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads a sketch from its JSON tree, noting every problem with its place. */
final class SketchReader {

  /** The washer rules of both sides. */
  private record WasherRules(WasherRule head, WasherRule nut) {
    static final WasherRules USUAL = new WasherRules(WasherRule.AUTOMATIC, WasherRule.AUTOMATIC);
  }

  private SketchReader() {}

  /** The sketch; empty when there are problems, which are noted then. */
  static Optional<Sketch> read(JsonObject json, Notes notes) {
    JsonObjectReader sketch = new JsonObjectReader("sketch", json, notes);
    sketch.has(SketchFormat.KEY);
    String name = sketch.text("name", "name");
    UnitSystem units = sketch.choice("units", "units", Words.UNITS, UnitSystem.METRIC);
    Optional<Fastener> bolt = sketch.object("bolt", "bolt", "bolt", BoltReader::read);
    List<Element> stack = StackReader.read(sketch.array("stack", "stack"), notes);
    Optional<WasherRules> rules =
        sketch.has("washerRule")
            ? sketch.object("washerRule", "washer rule", "washer rule", SketchReader::rules)
            : Optional.of(WasherRules.USUAL);
    Optional<Method> method =
        sketch.has("method")
            ? sketch.object("method", "method", "method", SketchReader::method)
            : Optional.of(Method.USUAL);
    Optional<Tightening> tightening =
        sketch.object("tightening", "tightening", "tightening", TighteningReader::read);
    Optional<Service> service = ServiceReader.read(sketch, stackSize(json), notes);
    Optional<Criteria> criteria =
        sketch.has("criteria")
            ? sketch.object("criteria", "criteria", "criteria", CriteriaReader::read)
            : Optional.of(Criteria.USUAL);
    List<Note> remarks =
        sketch.has("notes")
            ? NoteReader.read(sketch.array("notes", "notes"), stackSize(json), notes)
            : List.of();
    return sketch.build(
        () ->
            new Sketch(
                name,
                new Joint(
                    bolt.orElseThrow(),
                    stack,
                    rules.orElseThrow().head(),
                    rules.orElseThrow().nut(),
                    method.orElseThrow(),
                    tightening.orElseThrow(),
                    service.orElseThrow(),
                    criteria.orElseThrow()),
                units,
                remarks));
  }

  private static Optional<WasherRules> rules(JsonObjectReader rules) {
    WasherRule head = rules.choice("head", "head side", Words.WASHER_RULES, WasherRule.AUTOMATIC);
    WasherRule nut = rules.choice("nut", "nut side", Words.WASHER_RULES, WasherRule.AUTOMATIC);
    return rules.build(() -> new WasherRules(head, nut));
  }

  private static Optional<Method> method(JsonObjectReader method) {
    Optional<AngleRule> angle =
        method.has("angle")
            ? method.object("angle", "half-angle", "half-angle", SketchReader::angle)
            : Optional.of(Method.USUAL.angle());
    OptionalDouble body =
        method.optional(
            "bodyDiameter",
            "body diameter",
            value -> Method.USUAL.withBodyDiameter(OptionalDouble.of(value)));
    StiffnessMethod stiffness =
        method.choice("stiffness", "stiffness", Words.METHODS, Method.USUAL.stiffness());
    boolean ends = method.flag("endsCounted", "endsCounted", Method.USUAL.endsCounted());
    Method.ThreadArea area =
        method.choice("threadArea", "threadArea", Words.THREAD_AREAS, Method.USUAL.threadArea());
    return method.build(() -> new Method(angle.orElseThrow(), body, stiffness, ends, area));
  }

  private static Optional<AngleRule> angle(JsonObjectReader angle) {
    AngleRule rule = angle.choice("rule", "rule", Words.ANGLE_RULES);
    if (!(rule instanceof AngleRule.Typed)) {
      return angle.build(() -> rule);
    }
    double head = angle.number("head", "head side", value -> new AngleRule.Typed(value, 45));
    double nut = angle.number("nut", "nut side", value -> new AngleRule.Typed(45, value));
    return angle.build(() -> new AngleRule.Typed(head, nut));
  }

  private static int stackSize(JsonObject json) {
    return json.get("stack") instanceof JsonArray stack ? stack.size() : 0;
  }
}

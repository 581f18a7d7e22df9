package clampwright.store;

import static clampwright.store.Texts.SHORTEST;
import static clampwright.store.Texts.opened;
import static clampwright.store.Texts.problems;
import static clampwright.store.Texts.with;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Method;
import clampwright.joint.Sketch;
import clampwright.joint.WasherRule;
import clampwright.quantity.UnitSystem;
import java.util.List;
import org.junit.jupiter.api.Test;

/** What the format promises: what may be left out, what is remarked on, what it looks like. */
class SketchJsonTest {

  @Test
  void valuesWithAUsualOneMayBeLeftOut() {
    Sketch sketch = opened(SHORTEST).sketch();
    assertEquals(UnitSystem.METRIC, sketch.units());
    Joint joint = sketch.joint();
    assertEquals(Method.USUAL, joint.method());
    assertEquals(WasherRule.AUTOMATIC, joint.headWasherRule());
    assertEquals(WasherRule.AUTOMATIC, joint.nutWasherRule());
    assertEquals(List.of(LoadCase.steady("Working load", 5000, 1)), joint.service().loads());
    assertEquals(0, joint.fastener().bore());
    assertTrue(joint.fastener().length().isEmpty());
    assertEquals(16, joint.fastener().head().rim());
  }

  @Test
  void nullCountsAsAbsent() {
    String text = with("\"grade\": \"8.8\",", "\"grade\": \"8.8\", \"proof\": null,");
    assertEquals(opened(SHORTEST), opened(text));
  }

  @Test
  void anUnknownKeyIsRemarkedOnAndTheSketchOpens() {
    String text = with("\"hole\": 11,", "\"hole\": 11, \"colour\": \"red\",");
    Stored.Opened opened = opened(text);
    assertEquals(List.of("layer 1 'Cover': unknown key 'colour' was ignored"), opened.remarks());
    assertEquals(opened(SHORTEST).sketch(), opened.sketch());
  }

  /** One unknown key in every object of the file, and one remark on each. */
  @Test
  void unknownKeysAreRemarkedOnEverywhere() {
    Sketch sketch = opened(SHORTEST).sketch();
    String text = SketchJson.of(sketch).replaceAll("\\{", "{ \"note\": 1,");
    assertEquals(
        List.of(
            "bolt: unknown key 'note' was ignored",
            "bolt head: unknown key 'note' was ignored",
            "nut: unknown key 'note' was ignored",
            "bolt strength: unknown key 'note' was ignored",
            "bolt material: unknown key 'note' was ignored",
            "bolt: unknown key 'note' was ignored",
            "layer 1 'Cover', outline: unknown key 'note' was ignored",
            "layer 1 'Cover', material: unknown key 'note' was ignored",
            "layer 1 'Cover': unknown key 'note' was ignored",
            "washer rule: unknown key 'note' was ignored",
            "half-angle: unknown key 'note' was ignored",
            "method: unknown key 'note' was ignored",
            "tightening, target: unknown key 'note' was ignored",
            "tightening, scatter: unknown key 'note' was ignored",
            "tightening, embedment: unknown key 'note' was ignored",
            "tightening: unknown key 'note' was ignored",
            "temperatures: unknown key 'note' was ignored",
            "load case 1, introduction: unknown key 'note' was ignored",
            "load case 1: unknown key 'note' was ignored",
            "factors: unknown key 'note' was ignored",
            "tolerances: unknown key 'note' was ignored",
            "criteria: unknown key 'note' was ignored",
            "sketch: unknown key 'note' was ignored"),
        opened(text).remarks());
  }

  @Test
  void aNewerFormatIsRefusedPolitely() {
    assertEquals(
        List.of(
            "This sketch was written by a newer Clampwright (format 3); this one reads up to"
                + " format 2; nothing was changed."),
        problems(with("\"format\": 1", "\"format\": 3")));
  }

  /** A newer format may mean anything by its keys: only its number is looked at. */
  @Test
  void nothingElseIsSaidOfANewerFormat() {
    assertEquals(1, problems("{\"format\": 7, \"sheets\": []}").size());
  }

  @Test
  void theTextReadsWellAndKeepsItsOrder() {
    String text = SketchJson.of(opened(SHORTEST).sketch());
    assertTrue(text.startsWith("{\n  \"format\": 2,\n  \"name\": \"Shortest\",\n"), text);
    assertTrue(text.contains("\"diameter\": 10,\n      \"pitch\": 1.5\n"), text);
    assertTrue(text.endsWith("}\n"), text);
  }

  /** What has no value is left out, not written as null or as a number that stands for none. */
  @Test
  void absentValuesAreNotWritten() {
    String text = SketchJson.of(opened(SHORTEST).sketch());
    for (String key :
        List.of("length", "shankLength", "proof", "poisson", "bodyDiameter", "null")) {
      assertTrue(!text.contains(key), key);
    }
  }
}

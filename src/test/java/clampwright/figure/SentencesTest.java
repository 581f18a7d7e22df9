package clampwright.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.AngleRule;
import clampwright.joint.Part;
import clampwright.mechanics.MemberStiffness.Why;
import clampwright.mechanics.Notice;
import clampwright.mechanics.Reason;
import clampwright.mechanics.Reason.Cause;
import clampwright.mechanics.Side;
import clampwright.mechanics.Zone.WasherDecision;
import clampwright.mechanics.Zone.WasherDecision.Taken;
import clampwright.quantity.UnitSystem;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** Findings read as sentences of a person, in the reader's units. */
class SentencesTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "FACE_INSIDE_HOLE   | 11.6 | 12   | Hole 12 mm is not smaller than the clamp face 11.6 mm.",
        "NO_BEARING         | 12.5 | 12.7 | Hole 12.7 mm is not smaller than the pressure zone"
            + " 12.5 mm here.",
        "OUTLINE_INSIDE_HOLE| 10   | 11   | Outside diameter 10 mm is not larger than the hole"
            + " 11 mm.",
        "EDGE_INSIDE_HOLE   | 5    | 5.5  | Edge at 5 mm lies inside the hole, radius 5.5 mm.",
        "HOLE_NARROWER_THAN_BOLT | 10 | 9 | Bolt 10 mm does not pass the hole 9 mm.",
        "BOLT_TOO_SHORT     | 30   | 41.5 | Bolt length 30 mm does not reach through the grip"
            + " 41.5 mm.",
        "BORE_TOO_WIDE      | 9    | 8.16 | Bore 9 mm leaves no wall in the bolt, 8.16 mm.",
      })
  void reasonsNameTheirNumbers(Cause cause, double first, double second, String sentence) {
    Reason reason = new Reason(Part.element(0), cause, List.of(first, second));
    assertEquals(sentence, Sentences.reason(reason, UnitSystem.METRIC));
  }

  @Test
  void reasonsFollowTheReadersUnits() {
    Reason reason = new Reason(Part.HEAD, Cause.FACE_INSIDE_HOLE, List.of(12.7, 13.4874));
    assertEquals(
        "Hole 0.531 in is not smaller than the clamp face 0.5 in.",
        Sentences.reason(reason, UnitSystem.INCH));
  }

  @Test
  void anAngleOutsideItsRangeIsNamed() {
    Reason reason = new Reason(Part.HEAD_CONE, Cause.ANGLE_OUT_OF_RANGE, List.of(62.5));
    assertEquals(
        "Half-angle 62.5° is outside 5° … 60°.", Sentences.reason(reason, UnitSystem.INCH));
  }

  @ParameterizedTest
  @EnumSource(Cause.class)
  void everyCauseHasASentence(Cause cause) {
    Optional<Why> why =
        cause == Cause.METHOD_NOT_APPLICABLE
            ? Optional.of(Why.SEVERAL_MATERIALS)
            : Optional.empty();
    Reason reason = new Reason(Part.JOINT, cause, List.of(10.0, 20.0), why);
    for (UnitSystem units : UnitSystem.values()) {
      checkSentence(Sentences.reason(reason, units));
    }
  }

  @ParameterizedTest
  @EnumSource(Notice.Kind.class)
  void everyNoticeHasASentence(Notice.Kind kind) {
    checkSentence(Sentences.notice(new Notice(Part.JOINT, kind)));
  }

  private static void checkSentence(String sentence) {
    assertTrue(Character.isUpperCase(sentence.charAt(0)), sentence);
    assertTrue(sentence.endsWith("."), sentence);
  }

  /** No two notices say the same. */
  @Test
  void noticesDiffer() {
    List<String> sentences =
        Arrays.stream(Notice.Kind.values())
            .map(kind -> Sentences.notice(new Notice(Part.JOINT, kind)))
            .toList();
    assertEquals(sentences.size(), new HashSet<>(sentences).size());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "WHOLE_WASHER | true | 1.7 | 4 | whole washer: overhang 1.7 mm ≤ t·tan α 4 mm",
        "FROM_THE_HEADS_EDGE | true | 7 | 1.5 | from the head's edge: overhang 7 mm > t·tan α"
            + " 1.5 mm",
        "WHOLE_WASHER | false | 7 | 1.5 | whole washer, as set",
        "FROM_THE_HEADS_EDGE | false | 1 | 4 | from the head's edge, as set",
        "NO_WASHER | false | 0 | 0 | no washer",
      })
  void washerDecisionsSayWhy(
      Taken taken, boolean automatic, double overhang, double limit, String words) {
    WasherDecision decision = new WasherDecision(taken, automatic, overhang, limit);
    assertEquals(words, Sentences.washerDecision(decision, Side.HEAD, UnitSystem.METRIC));
  }

  @Test
  void aWasherWithoutARoundEdgeSaysSo() {
    WasherDecision decision =
        new WasherDecision(Taken.FROM_THE_HEADS_EDGE, true, Double.POSITIVE_INFINITY, 2);
    String words = Sentences.washerDecision(decision, Side.HEAD, UnitSystem.METRIC);
    assertEquals("from the head's edge: the washer has no round edge", words);
    assertFalse(words.contains("Infinity"));
  }

  @Test
  void atTheNutItIsTheNutsEdge() {
    WasherDecision decision = new WasherDecision(Taken.FROM_THE_HEADS_EDGE, false, 1, 4);
    assertEquals(
        "from the nut's edge, as set",
        Sentences.washerDecision(decision, Side.NUT, UnitSystem.METRIC));
  }

  @Test
  void angleRulesAreNamed() {
    assertEquals("45° fixed", Sentences.angleRule(AngleRule.FIXED_45));
    assertEquals("30° fixed", Sentences.angleRule(AngleRule.FIXED_30));
    assertEquals("typed", Sentences.angleRule(new AngleRule.Typed(33, 33)));
    assertEquals("VDI 2230", Sentences.angleRule(AngleRule.VDI_2230));
  }
}

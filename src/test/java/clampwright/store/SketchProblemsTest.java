package clampwright.store;

import static clampwright.store.Texts.problems;
import static clampwright.store.Texts.with;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A wrong file is told what is wrong and where, all of it at once, and never throws. */
class SketchProblemsTest {

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "\"thickness\": 20 | \"thickness\": -2 | layer 1 'Cover': thickness −2 mm must be above 0",
        "\"thickness\": 20, | `` | layer 1 'Cover': thickness is missing",
        "\"hole\": 11 | \"hole\": \"abc\" | layer 1 'Cover': hole must be a number, not \"abc\"",
        "\"hole\": 11 | \"hole\": null | layer 1 'Cover': hole is missing",
        "\"hole\": 11 | \"hole\": [11] | layer 1 'Cover': hole must be a number, not a list",
        "\"hole\": 11 | \"hole\": 1e999 | layer 1 'Cover': hole 1e999 is too large a number",
        "\"wide\" | \"oval\" | layer 1 'Cover', outline: shape must be one of wide, round, strip,"
            + " not \"oval\"",
        "{\"shape\": \"wide\"} | {\"shape\": \"round\", \"diameter\": 0} | layer 1 'Cover',"
            + " outline: outside diameter 0 mm must be above 0",
        "{\"shape\": \"wide\"} | 7 | layer 1 'Cover': outline must be an object in braces, not 7",
        "\"pitch\": 1.5 | \"tpi\": 16 | bolt: thread pitch is missing",
        "\"pitch\": 1.5 | \"pitch\": 7 | bolt: pitch 7 mm must be at most half the thread diameter",
        "\"form\": \"metric\" | \"form\": true | bolt: thread form must be one of metric,"
            + " unified, not true",
        "\"bearingDiameter\": 14.63 | \"bearingDiameter\": -1 | bolt head: bearing face diameter"
            + " −1 mm must be above 0",
        "\"bearingDiameter\": 14.6, | `` | nut: bearing face diameter is missing",
        "\"kind\": \"nut\" | \"kind\": \"rivet\" | nut: kind must be one of nut, tapped, not"
            + " \"rivet\"",
        "\"tensile\": 800 | \"tensile\": 0 | bolt strength: tensile strength 0 MPa must be above 0",
        "\"tensile\": 800 | \"tensile\": 800, \"yield\": -1 | bolt strength: yield strength −1 MPa"
            + " must be above 0",
        "\"force\": 20000 | \"force\": -5 | tightening, target: preload −5 N must be 0 or more",
        "\"axial\": 5000 | \"introduction\": 2 | load case 1, introduction: load-introduction factor 2 must lie between"
            + " 0 and 1",
        "\"stack\": [ | \"stack\": [ 3, | layer 1: must be an object in braces, not 3",
        "\"name\": \"Shortest\" | \"name\": 4 | sketch: name must be a text, not 4",
        "\"preload\": {\"force\": 20000}, | `` | sketch: tightening is missing",
        "\"name\": \"Shortest\" | \"name\": \"\", \"units\": \"cm\" | sketch: units must be one of"
            + " mm-N, in-lbf, not \"cm\"",
        "\"name\": \"Shortest\" | \"name\": \"\", \"method\": {\"endsCounted\": 1} | method:"
            + " endsCounted must be true or false, not 1",
        "\"name\": \"Shortest\" | \"name\": \"\", \"method\": {\"angle\": {\"rule\": \"typed\"}} |"
            + " half-angle: head side is missing; half-angle: nut side is missing",
      })
  void aWrongValueIsNamedWithItsPlace(String piece, String other, String problems) {
    assertEquals(problems, String.join("; ", problems(with(piece, other))));
  }

  @Test
  void aLayerWithoutANameGoesByItsNumber() {
    String unnamed = with("\"name\": \"Cover\", \"thickness\": 20", "\"thickness\": -2");
    assertEquals(List.of("layer 1: thickness −2 mm must be above 0"), problems(unnamed));
  }

  @Test
  void allProblemsOfAFileAreToldAtOnce() {
    String text =
        with("\"thickness\": 20, \"hole\": 11", "\"thickness\": -2, \"hole\": 0")
            .replace("\"pitch\": 1.5", "\"pitch\": \"coarse\"")
            .replace("\"diameter\": 10,", "")
            .replace("\"height\": 8.4", "\"height\": -8.4")
            .replace("\"axial\": 5000", "\"axial\": \"much\"");
    assertEquals(
        List.of(
            "bolt: thread diameter is missing",
            "bolt: thread pitch must be a number, not \"coarse\"",
            "nut: nut height −8.4 mm must be above 0",
            "layer 1 'Cover': thickness −2 mm must be above 0",
            "layer 1 'Cover': hole 0 mm must be above 0",
            "load case 1: axial load must be a number, not \"much\""),
        problems(text));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      quoteCharacter = '`',
      value = {
        "`` | its text ends too early, near line 1, column 1.",
        "{ | its text ends too early, near line 1, column 2.",
        "{\"format\": 1 | its text ends too early, near line 1, column 13.",
        "[1, 2] | it does not begin with a brace.",
        "null | it does not begin with a brace.",
        "{\"name\": \"x\"} | it has no format number.",
        "{\"format\": \"1\"} | it has no format number.",
        "{\"format\": 0} | there is no format 0.",
        "{\"format\": -1} | there is no format -1.",
        "{\"format\": 1}} | something follows its end, near line 1, column 15.",
        "{\"format\": 1} {} | something follows its end, near line 1, column 16.",
        "{'format': 1} | it is not valid JSON, near line 1, column 3.",
        "{\"format\": NaN} | it is not valid JSON, near line 1, column 12.",
        "{\"format\": -Infinity} | it is not valid JSON, near line 1, column 12.",
        "{\"format\": 1, } | it is not valid JSON, near line 1, column 16.",
        "{\"format\": 01} | it is not valid JSON, near line 1, column 12.",
        "hello | it is not valid JSON, near line 1, column 1.",
      })
  void whatIsNoSketchIsToldSo(String text, String why) {
    assertEquals(List.of("This is not a sketch file: " + why), problems(text));
  }

  @Test
  void deepNestingIsRefused() {
    String deep = "[".repeat(100_000);
    assertEquals(
        List.of("This is not a sketch file: it is nested too deeply, near line 1, column 52."),
        problems(deep));
  }

  /** One of the two values would be lost. */
  @Test
  void aKeyThatAppearsTwiceIsRefused() {
    String text = with("\"hole\": 11,", "\"hole\": 11,\n \"hole\": 12,");
    assertEquals(List.of("line 20, column 8: key 'hole' appears twice"), problems(text));
  }

  @Test
  void aLongListOfProblemsHasAnEnd() {
    String layers = "{},".repeat(500);
    List<String> problems = problems(with("\"stack\": [", "\"stack\": [" + layers));
    assertEquals(101, problems.size());
    assertEquals("and 1900 more", problems.get(100));
  }

  /** Whatever a file holds, a problem stays one line of a length that can be read. */
  @Test
  void wildTextStaysOneLine() {
    String text =
        with("\"Cover\"", "\"a\\nb\\u0007" + "x".repeat(1000) + "\"")
            .replace("\"hole\": 11", "\"hole\": \"" + "y".repeat(1000) + "\"");
    String problem = problems(text).get(0);
    assertTrue(problem.startsWith("layer 1 'a\uFFFDb\uFFFDxxx"), problem);
    assertTrue(problem.length() < 160, problem);
  }
}

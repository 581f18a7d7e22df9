package clampwright.store;

import clampwright.joint.AngleRule;
import clampwright.joint.Criteria;
import clampwright.joint.Element;
import clampwright.joint.Embedment;
import clampwright.joint.Head;
import clampwright.joint.Material;
import clampwright.joint.Method.ThreadArea;
import clampwright.joint.Part;
import clampwright.joint.ScrewThread;
import clampwright.joint.StiffnessMethod;
import clampwright.joint.WasherRule;
import clampwright.quantity.UnitSystem;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Function;

/** The words that stand for choices in a sketch file. */
final class Words {
  static final Map<String, UnitSystem> UNITS =
      paired(List.of("mm-N", "in-lbf"), List.of(UnitSystem.METRIC, UnitSystem.INCH));
  static final Map<String, Element.Kind> KINDS = camel(Element.Kind.values());
  static final Map<String, Material.Family> FAMILIES = camel(Material.Family.values());
  static final Map<String, ScrewThread.Form> FORMS = camel(ScrewThread.Form.values());
  static final Map<String, Head.Style> STYLES = camel(Head.Style.values());

  /** Whether the bolt has a nut. */
  static final Map<String, Boolean> ANCHORS =
      paired(List.of("nut", "tapped"), List.of(true, false));

  /** The shapes of an outline. */
  enum Shape {
    WIDE,
    ROUND,
    STRIP
  }

  static final Map<String, Shape> SHAPES = camel(Shape.values());
  static final Map<String, WasherRule> WASHER_RULES =
      paired(
          List.of("automatic", "wholeWasher", "headEdge"),
          List.of(WasherRule.AUTOMATIC, WasherRule.WHOLE_WASHER, WasherRule.FROM_THE_HEADS_EDGE));
  static final Map<String, StiffnessMethod> METHODS =
      paired(
          List.of("midPlaneCylinders", "fullFrusta", "vdi2230", "wileman"),
          List.of(
              StiffnessMethod.MID_PLANE_CYLINDERS,
              StiffnessMethod.FULL_FRUSTA,
              StiffnessMethod.VDI_2230,
              StiffnessMethod.WILEMAN));
  static final Map<String, ThreadArea> THREAD_AREAS = camel(ThreadArea.values());
  static final Map<String, AngleRule> ANGLE_RULES =
      paired(
          List.of("fixed45", "fixed30", "typed", "vdi2230"),
          List.of(
              AngleRule.FIXED_45,
              AngleRule.FIXED_30,
              new AngleRule.Typed(45, 45),
              AngleRule.VDI_2230));

  /** What can be given at tightening. */
  enum Given {
    FORCE,
    PROOF_FRACTION,
    NUT_FACTOR_TORQUE,
    FRICTION_TORQUE
  }

  static final Map<String, Given> TARGETS = camel(Given.values());
  static final Map<String, Embedment.Roughness> ROUGHNESSES = camel(Embedment.Roughness.values());
  static final Map<String, Criteria.Basis> BASES = camel(Criteria.Basis.values());
  static final Map<String, Criteria.Fatigue> FATIGUES = camel(Criteria.Fatigue.values());

  /** What a note can point at. */
  static final Map<String, Part.Kind> NOTED =
      paired(
          List.of("layer", "head", "bolt", "nut"),
          List.of(Part.Kind.ELEMENT, Part.Kind.HEAD, Part.Kind.SHANK, Part.Kind.ANCHOR));

  private Words() {}

  /** The word for a choice. */
  static <T> String of(Map<String, T> words, T choice) {
    return words.entrySet().stream()
        .filter(entry -> entry.getValue().equals(choice))
        .findFirst()
        .orElseThrow()
        .getKey();
  }

  private static <T extends Enum<T>> Map<String, T> camel(T[] values) {
    Map<String, T> words = new LinkedHashMap<>();
    Function<T, String> word =
        value -> {
          StringBuilder text = new StringBuilder();
          for (String part : value.name().split("_")) {
            String lower = part.toLowerCase(Locale.ROOT);
            text.append(text.isEmpty() ? lower : part.charAt(0) + lower.substring(1));
          }
          return text.toString();
        };
    Arrays.stream(values).forEach(value -> words.put(word.apply(value), value));
    return words;
  }

  private static <T> Map<String, T> paired(List<String> words, List<T> choices) {
    Map<String, T> paired = new LinkedHashMap<>();
    for (int i = 0; i < words.size(); i++) {
      paired.put(words.get(i), choices.get(i));
    }
    return paired;
  }
}

package clampwright.figure;

import clampwright.joint.AngleRule;
import clampwright.joint.Joint;
import clampwright.joint.StiffnessMethod;
import clampwright.joint.WasherRule;
import clampwright.mechanics.BoltStiffness;
import clampwright.mechanics.Notice;
import clampwright.mechanics.Reason;
import clampwright.mechanics.Side;
import clampwright.mechanics.Zone.WasherDecision;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Verdict;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import java.util.ArrayList;
import java.util.List;

/** Findings in words, in the reader's units. */
public final class Sentences {
  /** The caution that goes with every picture and every result. */
  public static final String CAUTION =
      "Early sizing aid: concentric load, elastic parts. Where failure can hurt someone, local"
          + " codes, licensed practice and test decide.";

  private Sentences() {}

  public static String reason(Reason reason, UnitSystem units) {
    return switch (reason.cause()) {
      case EMPTY_STACK -> "Nothing is clamped yet: draw a layer.";
      case FACE_INSIDE_HOLE ->
          "Hole "
              + second(reason, units)
              + " is not smaller than the clamp face "
              + first(reason, units)
              + ".";
      case NO_BEARING ->
          "Hole "
              + second(reason, units)
              + " is not smaller than the pressure zone "
              + first(reason, units)
              + " here.";
      case OUTLINE_INSIDE_HOLE ->
          "Outside diameter "
              + first(reason, units)
              + " is not larger than the hole "
              + second(reason, units)
              + ".";
      case EDGE_INSIDE_HOLE ->
          "Edge at "
              + first(reason, units)
              + " lies inside the hole, radius "
              + second(reason, units)
              + ".";
      case ANGLE_OUT_OF_RANGE ->
          "Half-angle "
              + Quantities.trimmed(Dimension.ANGLE, units, Math.toRadians(reason.values().get(0)))
              + "° is outside 5° … 60°.";
      case BODY_DIAMETER_NEEDED ->
          "The VDI 2230 angle needs the body's outside diameter: every layer is wide.";
      case HOLE_NARROWER_THAN_BOLT ->
          "Bolt " + first(reason, units) + " does not pass the hole " + second(reason, units) + ".";
      case BOLT_TOO_SHORT ->
          "Bolt length "
              + first(reason, units)
              + " does not reach through the grip "
              + second(reason, units)
              + ".";
      case BORE_TOO_WIDE ->
          "Bore "
              + first(reason, units)
              + " leaves no wall in the bolt, "
              + second(reason, units)
              + ".";
      case TAPPED_WASHER -> "A tapped thread needs a layer at the end, not a washer.";
      case NO_PROOF_STRENGTH ->
          "The preload is a share of the proof load, but this strength class has no proof strength.";
      case METHOD_NOT_APPLICABLE ->
          "The chosen stiffness method does not apply: it "
              + reason.why().orElseThrow().text()
              + ".";
    };
  }

  private static String first(Reason reason, UnitSystem units) {
    return length(reason.values().get(0), units);
  }

  private static String second(Reason reason, UnitSystem units) {
    return length(reason.values().get(1), units);
  }

  private static String length(double value, UnitSystem units) {
    return Quantities.trimmedText(Dimension.LENGTH, units, value);
  }

  public static String notice(Notice notice) {
    return switch (notice.kind()) {
      case CONE_NOT_REDUCED_BEHIND_STRIP ->
          "The edge cuts the zone here; the cone behind it is not reduced (unconservative).";
      case SHORT_ENGAGEMENT -> "The thread is not fully engaged; a longer bolt would be.";
      case SHANK_LONGER_THAN_GRIP -> "The plain shank reaches past the grip; counted up to it.";
      case SHANK_WIDER_THAN_HOLE -> "The shank is wider than the hole it passes.";
      case PARTED -> "The axial load parts the joint; the bolt alone carries it.";
      case SETTLING_CHARGED_TWICE ->
          "Embedment and relaxation are both given: settling is charged twice.";
      case LOOSE -> "The least preload is used up by losses and temperature: the bolt is loose.";
      case EXPANSION_UNKNOWN ->
          "A part has no coefficient of expansion: temperature cases are not counted.";
    };
  }

  public static String method(StiffnessMethod method) {
    return switch (method) {
      case MID_PLANE_CYLINDERS -> "mid-plane cylinders";
      case FULL_FRUSTA -> "full frusta";
      case VDI_2230 -> "VDI 2230";
      case WILEMAN -> "Wileman 1991";
    };
  }

  /** The method's name where room is short. */
  public static String shortMethod(StiffnessMethod method) {
    return switch (method) {
      case MID_PLANE_CYLINDERS -> "mid-plane";
      case FULL_FRUSTA -> "frusta";
      case VDI_2230 -> "VDI";
      case WILEMAN -> "Wileman";
    };
  }

  public static String side(Side side) {
    return switch (side) {
      case HEAD -> "head";
      case NUT -> "nut";
      case BOTH -> "both";
    };
  }

  public static String angleRule(AngleRule rule) {
    if (rule instanceof AngleRule.Typed) {
      return "typed";
    }
    if (rule instanceof AngleRule.Vdi2230) {
      return "VDI 2230";
    }
    return rule instanceof AngleRule.Fixed30 ? "30° fixed" : "45° fixed";
  }

  /** A washer rule as said at one end of the bolt. */
  public static String washerRule(WasherRule rule, Side end) {
    return switch (rule) {
      case AUTOMATIC -> "automatic";
      case WHOLE_WASHER -> "whole washer";
      case FROM_THE_HEADS_EDGE -> fromTheEdge(end);
    };
  }

  private static String fromTheEdge(Side end) {
    return "from the " + side(end) + "'s edge";
  }

  /** What became of the washer at one end of the bolt, and why. */
  public static String washerDecision(WasherDecision decision, Side end, UnitSystem units) {
    if (decision.taken() == WasherDecision.Taken.NO_WASHER) {
      return "no washer";
    }
    boolean whole = decision.taken() == WasherDecision.Taken.WHOLE_WASHER;
    String taken = whole ? "whole washer" : fromTheEdge(end);
    if (!decision.automatic()) {
      return taken + ", as set";
    }
    if (Double.isInfinite(decision.overhang())) {
      return taken + ": the washer has no round edge";
    }
    return taken
        + ": overhang "
        + length(decision.overhang(), units)
        + (whole ? " ≤ " : " > ")
        + "t·tan α "
        + length(decision.limit(), units);
  }

  /** A check as it is listed. */
  public static String check(CheckKind kind) {
    return switch (kind) {
      case YIELD_AT_TIGHTENING -> "yield at tightening";
      case STRESS_IN_SERVICE -> "stress in service";
      case RUPTURE -> "rupture under load";
      case YIELD_UNDER_LOAD -> "yield under load";
      case PARTING -> "parting";
      case SLIP -> "slip";
      case SHEAR_WITH_TENSION -> "shear with tension";
      case BEARING_PRESSURE -> "pressure under faces";
      case CRUSHING -> "crushing of narrow parts";
      case HOLE_BEARING -> "pressure in the hole";
      case THREAD_STRIPPING -> "thread stripping";
      case FATIGUE -> "fatigue";
    };
  }

  /**
   * The worst case of a check: load case, temperature, stiffness method; empty where none enters.
   */
  public static String where(Verdict.Where where, Joint joint) {
    List<String> words = new ArrayList<>();
    if (where.loadCase() >= 0) {
      words.add(loadCase(joint, where.loadCase()));
    }
    if (where.temperature() >= 0) {
      words.add(joint.service().temperatures().get(where.temperature()).name());
    }
    where.method().ifPresent(method -> words.add(shortMethod(method)));
    return String.join(" · ", words);
  }

  /** The name of a load case; its number where it has none. */
  public static String loadCase(Joint joint, int index) {
    String name = joint.service().loads().get(index).name();
    return name.isBlank() ? "load case " + (index + 1) : name;
  }

  public static String spring(BoltStiffness.Kind kind) {
    return switch (kind) {
      case HEAD -> "head";
      case SHANK -> "shank";
      case THREAD_IN_GRIP -> "thread in the grip";
      case ENGAGED_THREAD -> "engaged thread";
      case NUT -> "nut";
      case TAPPED_THREAD -> "tapped thread";
    };
  }
}

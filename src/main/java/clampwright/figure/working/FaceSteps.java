package clampwright.figure.working;

import clampwright.figure.Sentences;
import clampwright.joint.Anchor;
import clampwright.joint.Element;
import clampwright.mechanics.Side;
import clampwright.mechanics.Zone.WasherDecision;
import clampwright.mechanics.Zone.WasherDecision.Taken;
import java.util.ArrayList;
import java.util.List;

/**
 * Where a cone starts: the bearing face, and what became of the washer on it.
 *
 * @param found the joint
 * @param side HEAD or NUT
 */
record FaceSteps(Found found, Side side) {

  /** The washer's overhang beside its limit, and which way that went; empty without a washer. */
  List<Step> decision() {
    WasherDecision decision = washer();
    if (decision.taken() == Taken.NO_WASHER) {
      return List.of();
    }
    List<Step> steps = new ArrayList<>();
    if (!Double.isInfinite(decision.overhang())) {
      steps.add(overhang(decision));
    }
    steps.add(limit(decision));
    steps.add(
        Step.remark(
            "Washer counts",
            Sentences.washerDecision(decision, side, found.numbers().units()),
            decision.automatic() ? Source.PRACTICE : Source.CHOSEN));
    return steps;
  }

  private Step overhang(WasherDecision decision) {
    Numbers numbers = found.numbers();
    double bearing = bearingDiameter();
    double outside = bearing + 2 * decision.overhang();
    return new Step(
        "Overhang of the washer",
        "u = (D − d_w)/2",
        "(" + numbers.length(outside) + " − " + numbers.length(bearing) + ") / 2",
        numbers.lengthResult(decision.overhang()),
        Source.GEOMETRY);
  }

  /** The angle that decided may be that of the bare faces, where VDI 2230 computes it. */
  private Step limit(WasherDecision decision) {
    Numbers numbers = found.numbers();
    double thickness = touching().thickness();
    return new Step(
        "Limit for a whole washer",
        "t·tan α",
        numbers.length(thickness)
            + " × tan "
            + numbers.angle(Math.atan(decision.limit() / thickness)),
        numbers.lengthResult(decision.limit()),
        Source.PRACTICE);
  }

  /** The diameter that the cone starts with. */
  Step face() {
    Numbers numbers = found.numbers();
    boolean head = side == Side.HEAD;
    double diameter = head ? found.zone().headFaceDiameter() : found.zone().nutFaceDiameter();
    boolean whole = washer().taken() == Taken.WHOLE_WASHER;
    String from =
        isVirtual()
            ? "as the face on the head's side"
            : whole ? "the washer's outside diameter" : "the bearing face d_w";
    return new Step(
        isVirtual() ? "Lower face" : (head ? "Head's" : "Nut's") + " clamp face",
        from,
        numbers.length(diameter),
        numbers.lengthResult(diameter),
        isVirtual() ? Source.EFFECTIVE_GRIP : whole ? Source.PRACTICE : standard());
  }

  private boolean isVirtual() {
    return side == Side.NUT && found.joint().fastener().isTapped();
  }

  private WasherDecision washer() {
    return side == Side.HEAD ? found.zone().headWasher() : found.zone().nutWasher();
  }

  private Element touching() {
    return found.element(side == Side.HEAD ? 0 : found.count() - 1);
  }

  private double bearingDiameter() {
    return side == Side.NUT && found.joint().fastener().anchor() instanceof Anchor.Nut nut
        ? nut.bearingDiameter()
        : found.joint().fastener().head().bearingDiameter();
  }

  private String standard() {
    String standard =
        side == Side.NUT && found.joint().fastener().anchor() instanceof Anchor.Nut nut
            ? nut.standard()
            : found.joint().fastener().head().standard();
    return standard.isBlank() ? Source.TYPED : standard;
  }
}

package clampwright.mechanics;

import clampwright.joint.Joint;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness.NotApplicable;
import clampwright.mechanics.MemberStiffness.Result;
import clampwright.mechanics.MemberStiffness.Value;
import clampwright.mechanics.MemberStiffness.Why;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * The members' stiffness by every method: one integral 1/k_m = Σ ∫ dz/(E_i·A_i(z)), two rules of
 * integration, plus the fit of Wileman.
 */
final class Members {
  private final Joint joint;
  private final List<Slice> slices;
  private final ClampFaces faces;
  private final PressureZone zone;
  private final List<ElementFinding> findings;
  private final double boltStiffness;

  Members(
      Joint joint,
      List<Slice> slices,
      ClampFaces faces,
      PressureZone zone,
      List<ElementFinding> findings,
      double boltStiffness) {
    this.joint = joint;
    this.slices = slices;
    this.faces = faces;
    this.zone = zone;
    this.findings = findings;
    this.boltStiffness = boltStiffness;
  }

  MemberStiffness byAllMethods() {
    Map<StiffnessMethod, Result> results = new EnumMap<>(StiffnessMethod.class);
    double angle = Math.atan(zone.headTan());
    results.put(StiffnessMethod.MID_PLANE_CYLINDERS, value(midPlaneGive(), angle));
    results.put(StiffnessMethod.FULL_FRUSTA, value(frustaGive(), angle));
    results.put(StiffnessMethod.VDI_2230, vdi());
    results.put(StiffnessMethod.WILEMAN, wileman());
    return new MemberStiffness(results);
  }

  private double midPlaneGive() {
    double give = 0;
    for (ElementFinding finding : findings) {
      give += 1 / finding.stiffness();
    }
    return give;
  }

  private double frustaGive() {
    double give = 0;
    for (ElementFinding finding : findings) {
      give += 1 / finding.frustaStiffness();
    }
    return give;
  }

  /** Full frusta at the VDI angle; a tapped joint has one cone over the parts above its last. */
  private Result vdi() {
    VdiProportions proportions = VdiProportions.of(joint, faces, slices);
    if (proportions.bodyDiameter().isEmpty()) {
      return new NotApplicable(Why.BODY_DIAMETER_NEEDED);
    }
    List<Slice> clamped = VdiProportions.vdiSlices(joint, faces, slices);
    if (clamped.isEmpty()) {
      return new NotApplicable(Why.NOTHING_ABOVE_THE_TAPPED_LAYER);
    }
    double angle = proportions.halfAngle();
    if (!HalfAngle.inRange(angle)) {
      return new NotApplicable(Why.ANGLE_OUT_OF_RANGE);
    }
    PressureZone vdi = VdiSpring.zone(proportions, faces, clamped);
    for (int i = 0; i < clamped.size(); i++) {
      if (vdi.smallestRadius(i) <= clamped.get(i).hole() / 2) {
        return new NotApplicable(Why.NO_BEARING);
      }
    }
    return value(vdi.give() + washersGive(), angle);
  }

  private double washersGive() {
    double give = 0;
    if (faces.headWhole()) {
      give += Findings.washerGive(slices.get(0));
    }
    if (faces.nutWhole()) {
      give += Findings.washerGive(slices.get(slices.size() - 1));
    }
    return give;
  }

  private Result wileman() {
    boolean edges = findings.stream().anyMatch(f -> f.edgeLimited() || f.edgeClipped());
    Optional<Why> obstacle = WilemanFit.obstacle(joint, faces, slices, edges);
    if (obstacle.isPresent()) {
      return new NotApplicable(obstacle.get());
    }
    double length = 0;
    for (Slice slice : slices) {
      length += slice.thickness();
    }
    WilemanFit fit = WilemanFit.of(joint.elements().get(0).material().family());
    double stiffness =
        fit.stiffness(slices.get(0).modulus(), joint.fastener().thread().diameter(), length);
    return value(1 / stiffness, 0);
  }

  private Value value(double give, double angle) {
    double stiffness = 1 / give;
    double share = boltStiffness / (boltStiffness + stiffness);
    return new Value(stiffness, share, angle);
  }
}

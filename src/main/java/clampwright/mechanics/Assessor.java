package clampwright.mechanics;

import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Part;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.Assessment.Unsolved;
import clampwright.mechanics.Reason.Cause;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Puts the parts of the calculation together. */
final class Assessor {
  private Assessor() {}

  static Assessment assess(Joint joint) {
    List<Reason> obstacles = Obstacles.of(joint);
    if (!obstacles.isEmpty()) {
      return new Unsolved(obstacles);
    }
    List<Slice> slices = Slice.of(joint);
    Angles angles = Angles.of(joint, slices);
    if (angles.faces().isEmpty()) {
      return new Unsolved(angles.reasons());
    }
    ClampFaces faces = angles.faces().get();
    List<Slice> between = faces.between(slices);
    if (between.isEmpty()) {
      return new Unsolved(List.of(Reason.of(Part.JOINT, Cause.EMPTY_STACK)));
    }
    PressureZone zone =
        PressureZone.of(
            between,
            faces.headDiameter() / 2,
            faces.nutDiameter() / 2,
            Math.tan(angles.head()),
            Math.tan(angles.nut()));
    List<Reason> bearing = noBearing(zone);
    return bearing.isEmpty() ? solved(joint, slices, angles, faces, zone) : new Unsolved(bearing);
  }

  private static Assessment solved(
      Joint joint, List<Slice> slices, Angles angles, ClampFaces faces, PressureZone zone) {
    BoltStiffness bolt = BoltSprings.of(joint, BoltLength.of(joint));
    List<ElementFinding> findings = Findings.of(joint, slices, faces, zone);
    MemberStiffness members =
        new Members(joint, slices, faces, zone, findings, bolt.stiffness()).byAllMethods();
    MemberStiffness.Result result = members.get(joint.method().stiffness());
    if (result instanceof MemberStiffness.NotApplicable not) {
      Optional<MemberStiffness.Why> why = Optional.of(not.why());
      return new Unsolved(
          List.of(new Reason(Part.JOINT, Cause.METHOD_NOT_APPLICABLE, List.of(), why)));
    }
    MemberStiffness.Value chosen = (MemberStiffness.Value) result;
    OptionalDouble nominal = AssemblyPreload.of(joint, joint.tightening().target());
    if (nominal.isEmpty()) {
      return new Unsolved(List.of(Reason.of(Part.HEAD, Cause.NO_PROOF_STRENGTH)));
    }
    Preload preload = Preload.of(joint, nominal.getAsDouble(), findings);
    List<LoadSharing> cases = new ArrayList<>();
    for (LoadCase load : joint.service().loads()) {
      cases.add(shared(load, chosen, bolt.stiffness(), preload, findings));
    }
    return new Solved(
        described(angles, faces, zone),
        findings,
        members,
        bolt,
        preload,
        cases,
        Notices.of(joint, findings, bolt, preload, cases));
  }

  private static LoadSharing shared(
      LoadCase load,
      MemberStiffness.Value chosen,
      double bolt,
      Preload preload,
      List<ElementFinding> findings) {
    double introduction = IntroductionFactor.of(load.introduction(), findings);
    double series = bolt * chosen.stiffness() / (bolt + chosen.stiffness());
    return new LoadSharing(
        chosen.stiffness(),
        introduction,
        chosen.loadFactor(introduction),
        preload.inService(series, preload.state(load)),
        load.axialMin(),
        load.axialMax());
  }

  private static List<Reason> noBearing(PressureZone zone) {
    List<Reason> reasons = new ArrayList<>();
    for (int i = 0; i < zone.slices().size(); i++) {
      Slice slice = zone.slices().get(i);
      double smallest = zone.smallestRadius(i);
      if (smallest <= slice.hole() / 2) {
        reasons.add(
            Reason.of(Part.element(slice.element()), Cause.NO_BEARING, 2 * smallest, slice.hole()));
      }
    }
    return reasons;
  }

  private static Zone described(Angles angles, ClampFaces faces, PressureZone zone) {
    List<Zone.Piece> headCone = new ArrayList<>();
    List<Zone.Piece> nutCone = new ArrayList<>();
    List<Zone.Piece> pieces = new ArrayList<>();
    int count = zone.slices().size();
    for (int i = 0; i < count; i++) {
      headCone.addAll(zone.headCone(i));
      nutCone.addAll(zone.nutCone(i));
      pieces.addAll(zone.pieces(i));
    }
    return new Zone(
        faces.headDiameter(),
        faces.nutDiameter(),
        zone.slices().get(0).from(),
        zone.slices().get(count - 1).to(),
        angles.head(),
        angles.nut(),
        faces.headWasher(),
        faces.nutWasher(),
        headCone,
        nutCone,
        pieces);
  }
}

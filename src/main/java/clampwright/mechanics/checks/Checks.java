package clampwright.mechanics.checks;

import clampwright.joint.Criteria;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.Torsion;
import clampwright.mechanics.checks.Verdict.NotApplicable;
import clampwright.mechanics.checks.Verdict.Why;
import java.util.List;

/**
 * All checks of a joint. Each takes the worst over load cases, temperatures and, where the criteria
 * say so, stiffness methods; only that one becomes a record.
 */
public final class Checks {
  private final Joint joint;
  private final Stripping stripping;
  private final BoltLimits limits;
  private final ServiceChecks service;

  private Checks(Joint joint, Solved solved) {
    this.joint = joint;
    stripping = Stripping.of(joint, solved);
    limits = BoltLimits.of(joint, stripping);
    service = new ServiceChecks(joint, solved, limits);
    service.run();
  }

  /** The verdicts, one of each kind, in the order of the kinds. */
  public static List<Verdict> of(Joint joint, Solved solved) {
    return new Checks(joint, solved).verdicts();
  }

  private List<Verdict> verdicts() {
    return List.of(
        tightening(),
        service.stress().verdict(stressWhy()),
        service.rupture().verdict(Why.NO_PULL),
        service
            .yield()
            .verdict(Double.isNaN(limits.yieldLoad()) ? Why.NO_YIELD_STRENGTH : Why.NO_PULL),
        service.parting().verdict(Why.NO_PULL),
        service.slip().verdict(Why.NO_SHEAR),
        service.interaction().verdict(Why.NO_SHEAR),
        service.bearing().verdict(Why.NO_PRESSURE_LIMIT),
        service
            .crushing()
            .verdict(service.hasNarrowPart() ? Why.NO_PRESSURE_LIMIT : Why.NOTHING_NARROW),
        service.holes().verdict(service.hasShear() ? Why.NO_PART_STRENGTH : Why.NO_SHEAR),
        stripping.verdict(joint),
        service.fatigue().verdict(service.isAlternating() ? fatigueWhy() : Why.STEADY_LOAD));
  }

  /** The least margin of all checks that apply; infinite where none does. */
  public static double worstMargin(Joint joint, Solved solved) {
    double worst = Double.POSITIVE_INFINITY;
    for (Verdict verdict : of(joint, solved)) {
      if (verdict instanceof Verdict.Judged judged) {
        worst = Math.min(worst, judged.margin());
      }
    }
    return worst;
  }

  private Why stressWhy() {
    return Double.isNaN(limits.yield()) ? Why.NO_YIELD_STRENGTH : Why.NO_THREAD_FRICTION;
  }

  private Why fatigueWhy() {
    boolean goodman = joint.criteria().fatigue() == Criteria.Fatigue.GOODMAN;
    return goodman ? Why.NO_ENDURANCE : Why.NO_YIELD_STRENGTH;
  }

  /** √(σ² + 3τ²) against R_p0.2, the section plastic in torsion. */
  private Verdict tightening() {
    CheckKind kind = CheckKind.YIELD_AT_TIGHTENING;
    if (Double.isNaN(limits.yield())) {
      return new NotApplicable(kind, Part.SHANK, Why.NO_YIELD_STRENGTH);
    }
    if (Double.isNaN(limits.threadArm())) {
      return new NotApplicable(kind, Part.SHANK, Why.NO_THREAD_FRICTION);
    }
    double force = service.assemblyMax();
    if (force <= 0) {
      return new NotApplicable(kind, Part.SHANK, Why.NO_PRELOAD);
    }
    double torsion = force * limits.threadArm() / limits.plasticSection();
    double demand = Torsion.equivalent(force / limits.area(), torsion);
    double margin = limits.yield() / demand - 1;
    return new Verdict.Judged(kind, Part.SHANK, Worst.NOWHERE, demand, limits.yield(), 1, margin);
  }
}

package clampwright.mechanics.checks;

import clampwright.joint.Criteria;
import clampwright.joint.Factors;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Part;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.LoadSharing;
import clampwright.mechanics.MemberStiffness;
import clampwright.mechanics.Preload;
import clampwright.mechanics.Torsion;
import java.util.Optional;

/**
 * The checks that depend on load case, temperature and stiffness method: goes through all of them
 * in doubles and keeps the worst of each check.
 */
final class ServiceChecks {
  /** Share of the tightening torque that stays in the shank, k_τ (VDI 2230-1, from memory). */
  static final double TORSION_LEFT = 0.5;

  private final Joint joint;
  private final Solved solved;
  private final BoltLimits limits;
  private final Preload preload;
  private final Factors factors;
  private final ShearPlane plane;
  private final double torsion;

  private final Worst stress = new Worst(CheckKind.STRESS_IN_SERVICE, Part.SHANK);
  private final Worst rupture = new Worst(CheckKind.RUPTURE, Part.SHANK);
  private final Worst yield = new Worst(CheckKind.YIELD_UNDER_LOAD, Part.SHANK);
  private final Worst parting = new Worst(CheckKind.PARTING, Part.LOAD);
  private final Worst slip = new Worst(CheckKind.SLIP, Part.LOAD);
  private final Worst interaction = new Worst(CheckKind.SHEAR_WITH_TENSION, Part.SHANK);
  private final Worst fatigue = new Worst(CheckKind.FATIGUE, Part.SHANK);
  private final Worst holes = new Worst(CheckKind.HOLE_BEARING, Part.LOAD);
  private final Pressed pressed;

  private boolean alternating;
  private double shear;

  // The state of the walk.
  private StiffnessMethod method;
  private double share;
  private double series;
  private int loadCase;
  private int temperature;

  ServiceChecks(Joint joint, Solved solved, BoltLimits limits) {
    this.joint = joint;
    this.solved = solved;
    this.limits = limits;
    preload = solved.preload();
    factors = joint.criteria().factors();
    plane = ShearPlane.of(joint, solved);
    torsion = TORSION_LEFT * preload.assemblyMax() * limits.threadArm() / limits.elasticSection();
    pressed = new Pressed(joint, solved);
  }

  void run() {
    boolean chosen = joint.criteria().basis() == Criteria.Basis.CHOSEN;
    for (StiffnessMethod candidate : StiffnessMethod.values()) {
      boolean counts = !chosen || candidate == joint.method().stiffness();
      if (counts && solved.members().get(candidate) instanceof MemberStiffness.Value value) {
        method = candidate;
        share = value.share();
        series = share * value.stiffness();
        throughLoads();
      }
    }
    pressed.judge();
    if (shear > 0) {
      HoleBearing.add(
          holes, joint, shear, new Verdict.Where(loadCaseOfShear(), Preload.ANY, Optional.empty()));
    }
  }

  private void throughLoads() {
    for (loadCase = 0; loadCase < solved.cases().size(); loadCase++) {
      LoadCase load = joint.service().loads().get(loadCase);
      int state = preload.state(load);
      if (state != Preload.ANY) {
        temperature = state;
        check(load);
        continue;
      }
      temperature = Preload.ROOM;
      check(load);
      for (temperature = 0; temperature < preload.mismatches().size(); temperature++) {
        check(load);
      }
    }
  }

  /** All checks for one method, load case and temperature. */
  private void check(LoadCase load) {
    double loadFactor = share * solved.cases().get(loadCase).introduction();
    double min = preload.min(series, temperature);
    double max = preload.max(series, temperature);
    double pull = Math.max(0, load.axialMax());
    pressed.add(LoadSharing.boltLoad(max, loadFactor, pull), loadCase, temperature, method);
    stress(max, loadFactor, pull);
    if (pull > 0) {
      atLimit(rupture, limits.ultimate(), max, loadFactor, pull, factors.ultimate());
      if (!Double.isNaN(limits.yieldLoad())) {
        atLimit(yield, limits.yieldLoad(), max, loadFactor, pull, factors.yield());
      }
      double factor = factors.fitting() * factors.parting();
      add(parting, min / (factor * pull) - 1, factor * pull, min, factor);
    }
    if (load.shear() > 0) {
      shear(load, min, max, loadFactor, pull);
    }
    if (load.axialMax() > load.axialMin()) {
      fatigue(load, min, max, loadFactor);
    }
  }

  private void add(Worst worst, double margin, double demand, double capacity, double factor) {
    worst.add(margin, demand, capacity, factor, loadCase, temperature, method);
  }

  /** √(σ² + 3(k_τ·τ)²) against R_p0.2, the section elastic in torsion. */
  private void stress(double max, double loadFactor, double pull) {
    double factor = factors.fitting() * factors.yield();
    double load = LoadSharing.boltLoad(max, loadFactor, factor * pull);
    double demand = Torsion.equivalent(load / limits.area(), torsion);
    if (demand > 0 && !Double.isNaN(demand) && !Double.isNaN(limits.yield())) {
      add(stress, limits.yield() / demand - 1, demand, limits.yield(), factor);
    }
  }

  private void atLimit(
      Worst worst, double limit, double max, double loadFactor, double pull, double safety) {
    double factor = factors.fitting() * safety;
    double load = Tension.loadAtLimit(limit, max, loadFactor);
    add(worst, load / (factor * pull) - 1, factor * pull, load, factor);
  }

  private void shear(LoadCase load, double min, double max, double loadFactor, double pull) {
    shear = Math.max(shear, load.shear());
    double factor = factors.fitting() * factors.slip();
    double clamp = Math.max(0, min - (1 - loadFactor) * factor * pull);
    double capacity = load.friction() * load.slipFaces() * clamp;
    double demand = factor * load.shear();
    add(slip, capacity / demand - 1, demand, capacity, factor);
    sheared(load, max, loadFactor, pull);
  }

  /** Solved only where it leaves less margin than what was found before. */
  private void sheared(LoadCase load, double max, double loadFactor, double pull) {
    double factor = factors.fitting() * factors.ultimate();
    double across = factor * load.shear() / load.slipFaces();
    double along = factor * pull;
    double limit = limits.ultimate();
    double a = plane.shearPower();
    double b = plane.tensionPower();
    double known = interaction.isFound() ? interaction.margin() + 1 : Double.POSITIVE_INFINITY;
    boolean worse =
        !interaction.isFound()
            || Tension.interaction(known, across, plane.load(), a, along, limit, b, max, loadFactor)
                > 1;
    if (worse) {
      double m =
          Tension.interactionMultiple(across, plane.load(), a, along, limit, b, max, loadFactor);
      add(interaction, m - 1, across, m * across, factor);
    }
  }

  private void fatigue(LoadCase load, double min, double max, double loadFactor) {
    double demand =
        Tension.amplitude(min, max, loadFactor, load.axialMin(), load.axialMax()) / limits.area();
    double least = LoadSharing.boltLoad(max, loadFactor, load.axialMin());
    double most = LoadSharing.boltLoad(max, loadFactor, load.axialMax());
    double capacity = Endurance.amplitude(joint, limits, least, (least + most) / 2);
    alternating |= demand > 0;
    if (!Double.isNaN(capacity) && demand > 0) {
      add(fatigue, capacity / demand - 1, demand, capacity, 1);
    }
  }

  private int loadCaseOfShear() {
    int found = 0;
    for (int i = 0; i < joint.service().loads().size(); i++) {
      if (joint.service().loads().get(i).shear() == shear) {
        found = i;
      }
    }
    return found;
  }

  double assemblyMax() {
    return preload.assemblyMax();
  }

  boolean isAlternating() {
    return alternating;
  }

  boolean hasShear() {
    return shear > 0;
  }

  boolean hasNarrowPart() {
    return pressed.hasNarrowPart();
  }

  Worst stress() {
    return stress;
  }

  Worst rupture() {
    return rupture;
  }

  Worst yield() {
    return yield;
  }

  Worst parting() {
    return parting;
  }

  Worst slip() {
    return slip;
  }

  Worst interaction() {
    return interaction;
  }

  Worst bearing() {
    return pressed.bearing();
  }

  Worst crushing() {
    return pressed.crushing();
  }

  Worst holes() {
    return holes;
  }

  Worst fatigue() {
    return fatigue;
  }
}

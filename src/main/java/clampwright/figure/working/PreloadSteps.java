package clampwright.figure.working;

import clampwright.joint.Embedment;
import clampwright.joint.Fastener;
import clampwright.joint.ScrewThread;
import clampwright.joint.Target;
import clampwright.joint.Tightening;
import clampwright.mechanics.AssemblyPreload;
import clampwright.mechanics.Preload;
import clampwright.quantity.Dimension;
import java.util.ArrayList;
import java.util.List;

/**
 * The steps of the preload.
 *
 * @param found the joint and what it comes to
 * @param series k_b·k_m/(k_b + k_m) of the method in question [N/mm]
 */
record PreloadSteps(Found found, double series) {

  private Preload preload() {
    return found.solved().preload();
  }

  private Numbers numbers() {
    return found.numbers();
  }

  /** The name of a temperature state. */
  String name(int state) {
    return state < 0 ? "at assembly temperature" : preload().mismatches().get(state).name();
  }

  /** The preload aimed at and its scatter. */
  List<Step> assembly() {
    List<Step> steps = new ArrayList<>();
    Tightening tightening = found.joint().tightening();
    if (tightening.target() instanceof Target.FrictionTorque torque) {
      steps.add(arm(torque));
    }
    steps.add(nominal(tightening.target()));
    if (preload().share() > 0) {
      steps.add(
          scattered("Least at assembly", "F_nom·(1 − s)", " × (1 − ", preload().assemblyMin()));
      steps.add(
          scattered("Most at assembly", "F_nom·(1 + s)", " × (1 + ", preload().assemblyMax()));
    }
    return steps;
  }

  private Step arm(Target.FrictionTorque torque) {
    ScrewThread thread = found.joint().fastener().thread();
    double bearing = AssemblyPreload.bearingDiameter(found.joint());
    return new Step(
        "Torque per preload",
        "P/2π + µ_thread·d2/(2·cos 30°) + µ_head·D_b/2",
        "%s / (2 × π) + %s × %s / (√3) + %s × %s / 2"
            .formatted(
                numbers().length(thread.pitch()),
                numbers().ratio(torque.threadFriction()),
                numbers().length(thread.pitchDiameter()),
                numbers().ratio(torque.faceFriction()),
                numbers().length(bearing)),
        numbers().lengthResult(AssemblyPreload.wrenchArm(found.joint(), torque)),
        Source.TORQUE);
  }

  private Step nominal(Target target) {
    Fastener fastener = found.joint().fastener();
    String result = numbers().forceResult(preload().nominal());
    String label = "Preload aimed at F_nom";
    if (target instanceof Target.FrictionTorque torque) {
      double arm = AssemblyPreload.wrenchArm(found.joint(), torque);
      String put = numbers().torque(torque.torque()) + " / " + numbers().length(arm);
      return new Step(label, "torque over torque per preload", put, result, Source.TORQUE);
    }
    if (target instanceof Target.NutFactorTorque torque) {
      String put =
          "%s / (%s × %s)"
              .formatted(
                  numbers().torque(torque.torque()),
                  numbers().ratio(torque.nutFactor()),
                  numbers().length(fastener.thread().diameter()));
      return new Step(label, "T/(K·d)", put, result, Source.NUT_FACTOR);
    }
    if (target instanceof Target.ProofFraction share) {
      double proof = AssemblyPreload.proofLoad(fastener).orElseThrow();
      String put = numbers().ratio(share.fraction()) + " × " + numbers().force(proof);
      return new Step(label, "share × proof load", put, result, Source.CHOSEN);
    }
    return new Step(label, "given", "", result, Source.TYPED);
  }

  private Step scattered(String label, String formula, String sign, double result) {
    String put =
        numbers().force(preload().nominal()) + sign + numbers().ratio(preload().share()) + ")";
    return new Step(label, formula, put, numbers().forceResult(result), Source.CHOSEN);
  }

  /** What settling, relaxation and creep take. */
  List<Step> losses() {
    List<Step> steps = new ArrayList<>();
    if (preload().embedment() > 0) {
      boolean typed = found.joint().tightening().embedment() instanceof Embedment.Typed;
      steps.add(
          new Step(
              "Loss to settling F_Z",
              "f_Z·k_b·k_m/(k_b + k_m)",
              numbers().length(preload().embedment()) + " × " + numbers().stiffnessOfForce(series),
              numbers().forceResult(preload().settling(series)),
              typed ? Source.TYPED : Source.EMBEDDING));
    }
    if (preload().lost() > 0) {
      steps.add(
          new Step(
              "Loss to relaxation and creep",
              "ρ·F_0,min",
              numbers().ratio(preload().lost()) + " × " + numbers().force(preload().assemblyMin()),
              numbers().forceResult(preload().relaxed()),
              Source.RELAXATION));
    }
    return steps;
  }

  /** What a temperature case changes. */
  Step temperature(int state) {
    double length = preload().mismatches().get(state).length();
    return new Step(
        "Change, " + name(state),
        "(Σ α·t·ΔT − α_b·l·ΔT_b)·k_b·k_m/(k_b + k_m)",
        numbers().length(length) + " × " + numbers().stiffnessOfForce(series),
        numbers().forceResult(preload().thermal(series, state)),
        Source.EXPANSION);
  }

  /** Least preload in service. */
  Step least(int state) {
    double thermal =
        state == Preload.ANY ? preload().thermalMin(series) : preload().thermal(series, state);
    String put =
        "%s − %s − %s + %s"
            .formatted(
                numbers().force(preload().assemblyMin()),
                numbers().force(preload().relaxed()),
                numbers().force(preload().settling(series)),
                numbers().force(thermal));
    return new Step(
        "Least in service F_min",
        "F_0,min − losses + ΔF",
        put,
        numbers().result(Dimension.FORCE, preload().min(series, state)),
        Source.EQUILIBRIUM);
  }

  /** Greatest preload in service; no loss is credited. */
  Step most(int state) {
    double thermal =
        state == Preload.ANY ? preload().thermalMax(series) : preload().thermal(series, state);
    return new Step(
        "Most in service F_max",
        "F_0,max + ΔF",
        numbers().force(preload().assemblyMax()) + " + " + numbers().force(thermal),
        numbers().forceResult(preload().max(series, state)),
        Source.EQUILIBRIUM);
  }
}

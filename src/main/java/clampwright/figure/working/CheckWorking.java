package clampwright.figure.working;

import clampwright.figure.Sentences;
import clampwright.figure.Verdicts;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness.Value;
import clampwright.mechanics.checks.BoltLimits;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Stripping;
import clampwright.mechanics.checks.Verdict;
import java.util.ArrayList;
import java.util.List;

/**
 * One check in its worst case: load factor, preload, demand, capacity, margin.
 *
 * @param found the joint, at the load case of the verdict
 * @param judged what is worked out
 */
record CheckWorking(Found found, Verdict.Judged judged) {

  /** A margin beyond this is not worth its figures. */
  private static final double LARGEST = 1e9;

  Working working() {
    List<Step> steps = new ArrayList<>();
    String where = Sentences.where(judged.where(), found.joint());
    if (!where.isEmpty()) {
      steps.add(Step.remark("Worst case", where, ""));
    }
    judged.where().method().ifPresent(method -> steps.add(factor(method)));
    steps.addAll(
        switch (judged.kind()) {
          case YIELD_AT_TIGHTENING -> new BoltStressSteps(this).tightening();
          case STRESS_IN_SERVICE -> new BoltStressSteps(this).service();
          case RUPTURE -> new BoltLoadSteps(this).limit("P_u", limits().ultimate());
          case YIELD_UNDER_LOAD -> new BoltLoadSteps(this).limit("P_y", limits().yieldLoad());
          case PARTING -> new BoltLoadSteps(this).parting();
          case SLIP -> new ShearSteps(this).slip();
          case SHEAR_WITH_TENSION -> new ShearSteps(this).interaction();
          case BEARING_PRESSURE, CRUSHING -> new PressureSteps(this).pressure();
          case HOLE_BEARING -> new ShearSteps(this).hole();
          case THREAD_STRIPPING -> new PressureSteps(this).stripping();
          case FATIGUE -> new BoltStressSteps(this).fatigue();
        });
    steps.add(margin());
    return new Working("Check: " + Sentences.check(judged.kind()), steps);
  }

  Numbers numbers() {
    return found.numbers();
  }

  /** Steps of the preload by the method of the verdict. */
  PreloadSteps preload() {
    return new PreloadSteps(found, series());
  }

  private Value value() {
    StiffnessMethod method = judged.where().method().orElse(found.joint().method().stiffness());
    return (Value) found.solved().members().get(method);
  }

  double series() {
    return value().share() * value().stiffness();
  }

  double loadFactor() {
    return value().loadFactor(found.sharing().introduction());
  }

  double pull() {
    return Math.max(0, found.sharing().axialMax());
  }

  double max() {
    return found.solved().preload().max(series(), judged.where().temperature());
  }

  double min() {
    return found.solved().preload().min(series(), judged.where().temperature());
  }

  BoltLimits limits() {
    return BoltLimits.of(found.joint(), Stripping.of(found.joint(), found.solved()));
  }

  /** A value of the measure of this check, put in. */
  String put(double value) {
    return judged.kind().measure() == CheckKind.Measure.FORCE
        ? numbers().force(value)
        : numbers().stress(value);
  }

  /** The same as a result. */
  String result(double value) {
    return numbers().result(Verdicts.dimension(judged.kind()), value);
  }

  /** A step that has the source of the check. */
  Step step(String label, String formula, String put, String result) {
    return new Step(label, formula, put, result, judged.kind().source());
  }

  /** What is asked, as a step with the factors on the load. */
  Step demand(String load, double without) {
    return step(
        "Asked",
        "FF·FS·" + load,
        numbers().ratio(judged.factor()) + " × " + numbers().force(without),
        result(judged.demand()));
  }

  private Step factor(StiffnessMethod method) {
    Numbers numbers = numbers();
    double bolt = found.solved().bolt().stiffness();
    return new Step(
        "Load factor Φ, " + Sentences.method(method),
        "n·k_b/(k_b + k_m)",
        "%s × %s / (%s + %s)"
            .formatted(
                numbers.ratio(found.sharing().introduction()),
                numbers.stiffness(bolt),
                numbers.stiffness(bolt),
                numbers.stiffness(value().stiffness())),
        numbers.result(clampwright.quantity.Dimension.RATIO, loadFactor()),
        Source.SHARING);
  }

  private Step margin() {
    String label = "Margin, " + (judged.passes() ? "holds" : "fails");
    if (!(Math.abs(judged.margin()) < LARGEST)) {
      return Step.remark(label, "beyond any need", judged.kind().source());
    }
    return step(
        label,
        "there over asked − 1",
        put(judged.capacity()) + " / " + put(judged.demand()) + " − 1",
        Verdicts.signed(judged.margin()));
  }
}

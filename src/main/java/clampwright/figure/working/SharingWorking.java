package clampwright.figure.working;

import clampwright.figure.Sentences;
import clampwright.joint.Part;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.LoadSharing;
import clampwright.mechanics.MemberStiffness.Value;
import clampwright.quantity.Dimension;
import java.util.ArrayList;
import java.util.List;

/** Load factor, parting load, bolt load and clamp load. */
record SharingWorking(Found found) {

  Working loadFactor() {
    StiffnessMethod chosen = found.joint().method().stiffness();
    List<Step> steps = new ArrayList<>();
    steps.add(factor("Load factor Φ, " + Sentences.method(chosen), chosen));
    for (StiffnessMethod method : StiffnessMethod.values()) {
      if (method != chosen && found.solved().members().get(method) instanceof Value) {
        steps.add(factor("Beside it, " + Sentences.method(method), method));
      }
    }
    return new Working("Load factor Φ", steps);
  }

  private Step factor(String label, StiffnessMethod method) {
    Value value = (Value) found.solved().members().get(method);
    Numbers numbers = found.numbers();
    String bolt = numbers.stiffness(found.solved().bolt().stiffness());
    return new Step(
        label,
        "n·k_b/(k_b + k_m)",
        "%s × %s / (%s + %s)"
            .formatted(
                numbers.ratio(found.sharing().introduction()),
                bolt,
                bolt,
                numbers.stiffness(value.stiffness())),
        numbers.result(Dimension.RATIO, value.loadFactor(found.sharing().introduction())),
        Source.SHARING);
  }

  Working partingLoad() {
    Numbers numbers = found.numbers();
    LoadSharing sharing = sharing();
    Step parting =
        new Step(
            "Parts at, least",
            "F_min/(1 − Φ), pulling loads only",
            numbers.force(sharing.preload().min())
                + " / (1 − "
                + numbers.ratio(sharing.loadFactor(), 1 - sharing.loadFactor())
                + ")",
            numbers.forceResult(sharing.partingLoad()),
            Source.SHARING);
    return withNotices("Parting load", chosenFactor(), parting);
  }

  Working boltLoad() {
    return withNotices(
        "Bolt load", chosenFactor(), boltStep("Bolt load, most F_b", sharing().preload().max()));
  }

  Working clampLoad() {
    double least = sharing().preload().min();
    return withNotices(
        "Clamp load",
        chosenFactor(),
        boltStep("Bolt load with the least preload F_b", least),
        clampStep(sharing().boltLoad(least, sharing().axialMax())));
  }

  private Working withNotices(String title, Step... steps) {
    List<Step> all = new ArrayList<>(List.of(steps));
    all.addAll(found.notices(Part.LOAD::equals));
    return new Working(title, all);
  }

  private Step chosenFactor() {
    StiffnessMethod chosen = found.joint().method().stiffness();
    return factor("Load factor Φ, " + Sentences.method(chosen), chosen);
  }

  private Step boltStep(String label, double preload) {
    Numbers numbers = found.numbers();
    LoadSharing sharing = sharing();
    String axial = numbers.force(sharing.axialMax());
    return new Step(
        label,
        "max(F_p + Φ·F_A, F_A, 0)",
        "max(%s + %s × %s, %s, 0)"
            .formatted(numbers.force(preload), numbers.ratio(sharing.loadFactor()), axial, axial),
        numbers.forceResult(sharing.boltLoad(preload, sharing.axialMax())),
        Source.SHARING);
  }

  private Step clampStep(double bolt) {
    Numbers numbers = found.numbers();
    LoadSharing sharing = sharing();
    return new Step(
        "Clamp load, least F_c",
        "F_b − F_A",
        numbers.force(bolt) + " − " + numbers.force(sharing.axialMax()),
        numbers.forceResult(sharing.clampLoad()),
        Source.EQUILIBRIUM);
  }

  private LoadSharing sharing() {
    return found.sharing();
  }
}

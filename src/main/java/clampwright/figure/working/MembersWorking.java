package clampwright.figure.working;

import clampwright.figure.Sentences;
import clampwright.joint.Part;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.MemberStiffness;
import clampwright.mechanics.VdiProportions;
import clampwright.mechanics.VdiSpring;
import clampwright.mechanics.WilemanFit;
import java.util.ArrayList;
import java.util.List;

/** The members' stiffness by every method, the chosen one first. */
record MembersWorking(Found found) {

  Working working() {
    StiffnessMethod chosen = found.joint().method().stiffness();
    List<Step> steps = new ArrayList<>(by(chosen, "Members k_m, " + Sentences.method(chosen)));
    for (StiffnessMethod method : StiffnessMethod.values()) {
      if (method != chosen) {
        steps.addAll(by(method, "Beside it, " + Sentences.method(method)));
      }
    }
    steps.addAll(found.notices(Part::isElement));
    return new Working("Members k_m", steps);
  }

  private List<Step> by(StiffnessMethod method, String label) {
    MemberStiffness.Result result = found.solved().members().get(method);
    if (result instanceof MemberStiffness.NotApplicable not) {
      return List.of(Step.remark(label, "not applicable: " + not.why().text(), ""));
    }
    String stiffness =
        found.numbers().stiffnessResult(((MemberStiffness.Value) result).stiffness());
    return switch (method) {
      case MID_PLANE_CYLINDERS -> midPlane(label, stiffness);
      case FULL_FRUSTA -> List.of(frusta(label, stiffness));
      case VDI_2230 -> vdi(label, stiffness);
      case WILEMAN -> List.of(wileman(label, stiffness));
    };
  }

  private List<Step> midPlane(String label, String result) {
    List<Step> steps = new ArrayList<>();
    double[] stiffnesses = new double[found.count()];
    for (int i = 0; i < found.count(); i++) {
      steps.add(new SpringSteps(found, i).midPlane(found.name(i)));
      stiffnesses[i] = found.finding(i).stiffness();
    }
    steps.add(series(label, stiffnesses, result, Source.SERIES));
    return steps;
  }

  private Step frusta(String label, String result) {
    double[] stiffnesses =
        found.solved().elements().stream().mapToDouble(f -> f.frustaStiffness()).toArray();
    return series(label, stiffnesses, result, Source.FRUSTUM);
  }

  private List<Step> vdi(String label, String result) {
    List<Step> steps = new ArrayList<>(new AngleSteps(found).vdi());
    List<VdiSpring> springs = VdiSpring.of(found.joint(), found.zone());
    double[] stiffnesses = springs.stream().mapToDouble(VdiSpring::stiffness).toArray();
    boolean tapped = VdiProportions.of(found.joint(), found.zone()).tapped();
    String cones = tapped ? "one cone down to the tapped layer" : "both cones";
    String source = "full frusta at φ, " + cones + " (" + Source.VDI + ")";
    steps.add(series(label, stiffnesses, result, source));
    return steps;
  }

  private Step series(String label, double[] stiffnesses, String result, String source) {
    return new Step(label, "1/Σ(1/k_i)", found.numbers().inSeries(stiffnesses), result, source);
  }

  private Step wileman(String label, String result) {
    Numbers numbers = found.numbers();
    WilemanFit fit = WilemanFit.of(found.element(0).material().family());
    String d = numbers.length(found.joint().fastener().thread().diameter());
    return new Step(
        label,
        "E·d·A·exp(B·d/l), l between the faces",
        "%s × %s × %s × exp(%s × %s / %s)"
            .formatted(
                numbers.modulus(found.element(0).material().modulus()),
                d,
                fit.a(),
                fit.b(),
                d,
                numbers.length(found.zone().length())),
        result,
        Source.WILEMAN);
  }
}

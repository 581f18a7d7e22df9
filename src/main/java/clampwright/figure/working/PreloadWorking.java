package clampwright.figure.working;

import clampwright.mechanics.Preload;
import java.util.ArrayList;
import java.util.List;

/** From what is given at tightening to the preload in service, by the chosen method. */
record PreloadWorking(Found found) {

  Working working() {
    PreloadSteps preload = new PreloadSteps(found, found.solved().series());
    List<Step> steps = new ArrayList<>(preload.assembly());
    steps.addAll(preload.losses());
    for (int i = 0; i < found.solved().preload().mismatches().size(); i++) {
      steps.add(preload.temperature(i));
    }
    int state = found.state();
    steps.add(preload.least(state));
    steps.add(preload.most(state));
    steps.addAll(found.notices(clampwright.joint.Part.SHANK::equals));
    String when = state == Preload.ANY ? "worst of all temperatures" : preload.name(state);
    return new Working("Preload, " + when, steps);
  }
}

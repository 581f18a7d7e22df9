package clampwright.figure.working;

import clampwright.joint.Anchor;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.ScrewThread;
import clampwright.mechanics.BoltStiffness;
import java.util.ArrayList;
import java.util.List;

/** The lengths of the bolt in force: nominal length, plain shank, grip. */
record BoltLengthSteps(Found found) {

  List<Step> steps() {
    return List.of(nominal(), shank(), grip());
  }

  private Step nominal() {
    Numbers numbers = found.numbers();
    double length = bolt().length();
    if (fastener().length().isPresent()) {
      return step("Nominal length l", "typed", numbers.length(length), length, Source.TYPED);
    }
    boolean nut = fastener().anchor() instanceof Anchor.Nut;
    return step(
        "Nominal length l",
        nut ? "next standard length ≥ stack + nut + 2·P" : "next standard length ≥ parts + d",
        "≥ " + (nut ? sum(found.count()) + nutAllowance() : sum(found.count() - 1) + engagement()),
        length,
        (isUnified() ? "" : "lengths ISO 888, from memory; ") + Source.PRACTICE);
  }

  private String nutAllowance() {
    Numbers numbers = found.numbers();
    Anchor.Nut nut = (Anchor.Nut) fastener().anchor();
    String pitch = numbers.length(fastener().thread().pitch());
    return " + " + numbers.length(nut.height()) + " + 2 × " + pitch;
  }

  private String engagement() {
    String d = found.numbers().length(fastener().thread().diameter());
    return found.count() == 1 ? d : " + " + d;
  }

  private Step shank() {
    Numbers numbers = found.numbers();
    double shank = bolt().shankLength();
    if (fastener().shankLength().isPresent()) {
      return step("Plain shank", "typed", numbers.length(shank), shank, Source.TYPED);
    }
    if (shank == 0) {
      return step("Plain shank", "threaded to the head", "0", shank, standard());
    }
    return step(
        "Plain shank",
        "l − b, b the standard thread length",
        numbers.length(bolt().length()) + " − " + numbers.length(bolt().length() - shank),
        shank,
        standard());
  }

  private Step grip() {
    if (!fastener().isTapped()) {
      return step("Grip", "Σ t", sum(found.count()), bolt().grip(), Source.GEOMETRY);
    }
    boolean ends = found.joint().method().endsCounted() && found.count() > 1;
    return ends
        ? step(
            "Grip",
            "Σ t above the tapped layer; the tapped thread counts as an end",
            sum(found.count() - 1),
            bolt().grip(),
            Source.VDI)
        : step(
            "Grip",
            "Σ t down to the lower face",
            found.numbers().length(bolt().grip()),
            bolt().grip(),
            Source.EFFECTIVE_GRIP);
  }

  private Step step(String label, String formula, String numbers, double result, String source) {
    return new Step(label, formula, numbers, found.numbers().lengthResult(result), source);
  }

  /** The thicknesses of the first so many elements. */
  private String sum(int count) {
    List<String> thicknesses = new ArrayList<>();
    for (int i = 0; i < count; i++) {
      thicknesses.add(found.numbers().length(found.element(i).thickness()));
    }
    return String.join(" + ", thicknesses);
  }

  /** The standard that the thread length follows. */
  private String standard() {
    boolean socket = fastener().head().style() == Head.Style.SOCKET;
    if (isUnified()) {
      return socket ? "thread length by ASME B18.3" : "thread length by ASME B18.2.1";
    }
    return socket ? "thread length by ISO 4762" : "thread length by ISO 4014";
  }

  private boolean isUnified() {
    return fastener().thread().form() == ScrewThread.Form.UNIFIED;
  }

  private BoltStiffness bolt() {
    return found.solved().bolt();
  }

  private Fastener fastener() {
    return found.joint().fastener();
  }
}

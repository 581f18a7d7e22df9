package clampwright.figure.working;

import clampwright.figure.Sentences;
import clampwright.joint.Part;
import clampwright.mechanics.BoltStiffness;
import clampwright.mechanics.BoltStiffness.Piece;
import java.util.ArrayList;
import java.util.List;

/** The bolt's stiffness: its lengths, each spring with the numbers put in, and their series. */
record BoltWorking(Found found) {

  Working working() {
    BoltStiffness bolt = found.solved().bolt();
    List<Step> steps = new ArrayList<>(new BoltLengthSteps(found).steps());
    for (Piece piece : bolt.pieces()) {
      steps.add(spring(piece));
    }
    double[] stiffnesses = bolt.pieces().stream().mapToDouble(Piece::stiffness).toArray();
    steps.add(
        new Step(
            "Bolt k_b",
            "1/Σ(1/k_i)",
            found.numbers().inSeries(stiffnesses),
            found.numbers().stiffnessResult(bolt.stiffness()),
            bolt.pieces().size() > 2 ? Source.VDI : "Shigley eq. 8-17"));
    steps.addAll(found.notices(part -> part.equals(Part.SHANK) || part.equals(Part.ANCHOR)));
    return new Working("Bolt k_b", steps);
  }

  private Step spring(Piece piece) {
    BoltSpringText text = new BoltSpringText(found, piece);
    Numbers numbers = found.numbers();
    return new Step(
        capitalised(Sentences.spring(piece.kind())),
        "E·A/l, A = " + text.areaFormula() + ", l = " + text.lengthFormula(),
        numbers.modulus(piece.modulus()) + " × " + text.area() + " / " + text.length(),
        numbers.stiffnessResult(piece.stiffness()),
        text.source());
  }

  private static String capitalised(String text) {
    return Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }
}

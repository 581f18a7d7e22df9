package clampwright.figure.working;

import clampwright.joint.Outline;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Side;
import clampwright.mechanics.Zone.Piece;
import java.util.ArrayList;
import java.util.List;

/**
 * The exact integral over an element: frusta and cylinders in series, or, where a straight edge
 * cuts the zone, the quadrature in one step.
 */
record FrustaSteps(Found found, int index) {
  /** Thinner pieces are rounding. */
  private static final double DUST = 1e-9;

  List<Step> steps() {
    List<Piece> pieces = pieces();
    if (pieces.stream().anyMatch(this::isCut)) {
      return List.of(
          result("∫ dz/(E·A(z)) = 1/k, with the edges cutting A(z)", "", Source.QUADRATURE));
    }
    if (pieces.size() == 1) {
      Step only = piece(pieces.get(0), "Full frusta");
      return List.of(result(only.formula(), only.numbers(), only.source()));
    }
    List<Step> steps = new ArrayList<>();
    for (int i = 0; i < pieces.size(); i++) {
      steps.add(piece(pieces.get(i), "Full frusta, piece " + (i + 1)));
    }
    double[] stiffnesses = pieces.stream().mapToDouble(this::stiffness).toArray();
    steps.add(result("1/Σ(1/k_i)", found.numbers().inSeries(stiffnesses), Source.SERIES));
    return steps;
  }

  private Step result(String formula, String numbers, String source) {
    return new Step(
        "Full frusta",
        formula,
        numbers,
        found.numbers().stiffnessResult(found.finding(index).frustaStiffness()),
        source);
  }

  private List<Piece> pieces() {
    double least = DUST * found.finding(index).clampedThickness();
    return found.zone().pieces().stream()
        .filter(piece -> piece.element() == index && piece.to() - piece.from() > least)
        .toList();
  }

  private boolean isCut(Piece piece) {
    return found.element(index).outline() instanceof Outline.Strip strip
        && Math.max(piece.fromRadius(), piece.toRadius()) > Math.min(strip.left(), strip.right());
  }

  private Step piece(Piece piece, String label) {
    return piece.side() == Side.BOTH ? cylinder(piece, label) : frustum(piece, label);
  }

  private Step cylinder(Piece piece, String label) {
    Numbers numbers = found.numbers();
    return new Step(
        label,
        "cylinder: E·π/4·(D² − d_h²)/L",
        "%s × π / 4 × (%s² − %s²) / %s"
            .formatted(
                modulus(),
                numbers.length(2 * piece.fromRadius()),
                hole(),
                numbers.length(piece.to() - piece.from())),
        numbers.stiffnessResult(stiffness(piece)),
        Source.ELASTIC_BAR);
  }

  private Step frustum(Piece piece, String label) {
    Numbers numbers = found.numbers();
    double least = narrow(piece);
    double most = wide(piece);
    double gap = Math.min(most - least, least - found.finding(index).hole());
    String narrow = numbers.length(least, gap);
    String wide = numbers.length(most, gap);
    String hole = numbers.length(found.finding(index).hole(), gap);
    return new Step(
        label,
        "frustum: π·E·d_h·tan α/ln[(D_2 − d_h)(D_1 + d_h)/((D_2 + d_h)(D_1 − d_h))]",
        "π × %s × %s × tan %s / ln((%s − %s) × (%s + %s) / ((%s + %s) × (%s − %s)))"
            .formatted(
                modulus(),
                hole,
                numbers.angle(angle(piece)),
                wide,
                hole,
                narrow,
                hole,
                wide,
                hole,
                narrow,
                hole),
        numbers.stiffnessResult(stiffness(piece)),
        Source.FRUSTUM);
  }

  private double angle(Piece piece) {
    return piece.side() == Side.HEAD ? found.zone().headHalfAngle() : found.zone().nutHalfAngle();
  }

  /** Stiffness of one piece by the formula that its step shows [N/mm]. */
  private double stiffness(Piece piece) {
    ElementFinding finding = found.finding(index);
    double modulus = found.element(index).material().modulus();
    double d = finding.hole();
    double narrow = narrow(piece);
    double wide = wide(piece);
    if (piece.side() == Side.BOTH) {
      double area = Math.PI / 4 * (wide - d) * (wide + d);
      return modulus * area / (piece.to() - piece.from());
    }
    double ratio = (wide - d) * (narrow + d) / ((wide + d) * (narrow - d));
    return Math.PI * modulus * d * Math.tan(angle(piece)) / Math.log(ratio);
  }

  private static double narrow(Piece piece) {
    return 2 * Math.min(piece.fromRadius(), piece.toRadius());
  }

  private static double wide(Piece piece) {
    return 2 * Math.max(piece.fromRadius(), piece.toRadius());
  }

  private String modulus() {
    return found.numbers().modulus(found.element(index).material().modulus());
  }

  private String hole() {
    return found.numbers().length(found.finding(index).hole());
  }
}

package clampwright.mechanics.checks;

import clampwright.joint.Part;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.Preload;
import java.util.Optional;

/**
 * Keeps the least margin of one check and where it was found, without making records of the rest.
 */
final class Worst {
  /** Where neither a load nor a temperature nor a method enters. */
  static final Verdict.Where NOWHERE = new Verdict.Where(-1, Preload.ANY, Optional.empty());

  private final CheckKind kind;
  private Part part;
  private double margin = Double.POSITIVE_INFINITY;
  private double demand;
  private double capacity;
  private double factor;
  private int loadCase;
  private int temperature;
  private StiffnessMethod method;

  Worst(CheckKind kind, Part part) {
    this.kind = kind;
    this.part = part;
  }

  boolean isFound() {
    return margin < Double.POSITIVE_INFINITY;
  }

  double margin() {
    return margin;
  }

  /** Takes a margin in if it is less than what was found so far. */
  void add(
      double margin,
      double demand,
      double capacity,
      double factor,
      int loadCase,
      int temperature,
      StiffnessMethod method) {
    if (margin < this.margin) {
      this.margin = margin;
      this.demand = demand;
      this.capacity = capacity;
      this.factor = factor;
      this.loadCase = loadCase;
      this.temperature = temperature;
      this.method = method;
    }
  }

  /** The same, of a check that looks at several parts. */
  void add(Part part, double margin, double demand, double capacity, Verdict.Where where) {
    if (margin < this.margin) {
      this.part = part;
      add(
          margin,
          demand,
          capacity,
          1,
          where.loadCase(),
          where.temperature(),
          where.method().orElse(null));
    }
  }

  Verdict verdict(Verdict.Why otherwise) {
    return isFound()
        ? new Verdict.Judged(
            kind,
            part,
            new Verdict.Where(loadCase, temperature, Optional.ofNullable(method)),
            demand,
            capacity,
            factor,
            margin)
        : new Verdict.NotApplicable(kind, part, otherwise);
  }
}

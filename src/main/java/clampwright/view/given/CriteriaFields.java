package clampwright.view.given;

import clampwright.joint.Criteria;
import clampwright.joint.Factors;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.view.field.Choice;
import clampwright.view.field.SketchChoice;
import clampwright.view.field.SketchNumber;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.ToDoubleFunction;
import java.util.function.UnaryOperator;

/** Stiffness, factors and fatigue rule that the joint is judged by. */
final class CriteriaFields {
  private CriteriaFields() {}

  static Criteria criteria(Sketch sketch) {
    return sketch.joint().criteria();
  }

  static Sketch withCriteria(Sketch sketch, UnaryOperator<Criteria> change) {
    return sketch.withJoint(joint -> joint.withCriteria(change.apply(joint.criteria())));
  }

  static SketchChoice<Criteria.Basis> basis() {
    return new SketchChoice<>(
        "Stiffness for checks",
        sketch -> Optional.of(criteria(sketch).basis()),
        (sketch, basis) -> withCriteria(sketch, criteria -> criteria.withBasis(basis)),
        CriteriaFields::word,
        sketch ->
            Arrays.stream(Criteria.Basis.values())
                .map(basis -> new Choice<>(word(basis), "", basis, meaning(basis)))
                .toList(),
        (sketch, basis) -> meaning(basis));
  }

  private static String word(Criteria.Basis basis) {
    return basis == Criteria.Basis.CHOSEN ? "as chosen" : "least favourable";
  }

  private static String meaning(Criteria.Basis basis) {
    return basis == Criteria.Basis.CHOSEN
        ? "the stiffness method chosen above"
        : "for each check the stiffness method that leaves the least margin";
  }

  static SketchNumber factor(
      String name, ToDoubleFunction<Factors> read, BiFunction<Factors, Double, Factors> write) {
    return SketchNumber.required(
        name,
        Dimension.RATIO,
        sketch -> read.applyAsDouble(criteria(sketch).factors()),
        (sketch, value) ->
            withCriteria(sketch, it -> it.withFactors(write.apply(it.factors(), value))));
  }

  static SketchNumber cycles() {
    return SketchNumber.required(
        "Number of cycles",
        Dimension.COUNT,
        sketch -> criteria(sketch).cycles(),
        (sketch, value) -> withCriteria(sketch, criteria -> criteria.withCycles(value)));
  }

  static SketchChoice<Criteria.Fatigue> fatigue() {
    List<Choice<Criteria.Fatigue>> rules =
        Arrays.stream(Criteria.Fatigue.values())
            .map(rule -> new Choice<>(listed(rule), "", rule, source(rule)))
            .toList();
    return new SketchChoice<>(
        "Fatigue rule",
        sketch -> Optional.of(criteria(sketch).fatigue()),
        (sketch, rule) -> withCriteria(sketch, criteria -> criteria.withFatigue(rule)),
        CriteriaFields::word,
        sketch -> rules,
        (sketch, rule) -> listed(rule) + "\n" + source(rule));
  }

  private static String word(Criteria.Fatigue rule) {
    return switch (rule) {
      case VDI_ROLLED_BEFORE -> "VDI, rolled before";
      case VDI_ROLLED_AFTER -> "VDI, rolled after";
      case GOODMAN -> "Goodman";
    };
  }

  private static String listed(Criteria.Fatigue rule) {
    return switch (rule) {
      case VDI_ROLLED_BEFORE -> "VDI, thread rolled before heat treatment";
      case VDI_ROLLED_AFTER -> "VDI, thread rolled after heat treatment";
      case GOODMAN -> "Goodman line";
    };
  }

  private static String source(Criteria.Fatigue rule) {
    return rule == Criteria.Fatigue.GOODMAN
        ? "endurance strengths of Shigley table 8-17"
        : "VDI 2230-1";
  }
}

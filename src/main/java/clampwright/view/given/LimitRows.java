package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.Allowables;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.view.Hover;
import clampwright.view.field.FieldRow;
import clampwright.view.field.SketchNumber;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.Function;

/** Limits of the bolt that stand instead of those of its strength class, and the fatigue rule. */
final class LimitRows extends Rows {
  private static final String BY_CLASS = "by class";
  private static final String BY_RULE = "by rule";

  LimitRows(SketchModel model) {
    FieldRow ultimate =
        add("P_u", Fields.optional(model, "limit-ultimate", ultimateLoad(), BY_CLASS));
    Hover.tell(
        ultimate,
        () ->
            "Ultimate load. Empty: tensile strength times stress area, or the stripping load where"
                + " that is less.");
    FieldRow yield = add("P_y", Fields.optional(model, "limit-yield", yieldLoad(), BY_CLASS));
    Hover.tell(yield, () -> "Yield load. Empty: yield strength times stress area.");
    FieldRow shear = add("τ_u", Fields.optional(model, "limit-shear", shear(), BY_CLASS));
    Hover.tell(shear, () -> "Shear strength. Empty: 0.6 of the tensile strength.");
    FieldRow amplitude =
        add("Endurable σ_A", Fields.optional(model, "limit-amplitude", amplitude(), BY_RULE));
    Hover.tell(amplitude, () -> "Endurable stress amplitude. Empty: by the fatigue rule.");
    add("Fatigue", Fields.wideChoice(model, "fatigue-rule", CriteriaFields.fatigue()));
    add("Cycles", Fields.quantity(model, "cycles", CriteriaFields.cycles()));
  }

  private static SketchNumber ultimateLoad() {
    return limit("Ultimate load", Dimension.FORCE, Allowables::ultimate, Allowables::withUltimate);
  }

  private static SketchNumber yieldLoad() {
    return limit("Yield load", Dimension.FORCE, Allowables::yield, Allowables::withYield);
  }

  private static SketchNumber shear() {
    return limit("Shear strength", Dimension.STRESS, Allowables::shear, Allowables::withShear);
  }

  private static SketchNumber amplitude() {
    return limit(
        "Endurable amplitude", Dimension.STRESS, Allowables::amplitude, Allowables::withAmplitude);
  }

  private static SketchNumber limit(
      String name,
      Dimension dimension,
      Function<Allowables, OptionalDouble> read,
      BiFunction<Allowables, OptionalDouble, Allowables> write) {
    return SketchNumber.optional(
        name,
        dimension,
        sketch -> read.apply(CriteriaFields.criteria(sketch).allowables()),
        (sketch, value) -> with(sketch, value, write));
  }

  private static Sketch with(
      Sketch sketch,
      OptionalDouble value,
      BiFunction<Allowables, OptionalDouble, Allowables> write) {
    return CriteriaFields.withCriteria(
        sketch, it -> it.withAllowables(write.apply(it.allowables(), value)));
  }
}

package clampwright.view.given;

import static clampwright.view.given.LoadSection.load;
import static clampwright.view.given.LoadSection.withLoad;

import clampwright.edit.SketchModel;
import clampwright.joint.Introduction;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.view.PartName;
import clampwright.view.field.Choice;
import clampwright.view.field.SketchChoice;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;

/** Where the load enters the stack and leaves it: a typed n, or the parts that it is drawn at. */
final class IntroductionFields {
  private IntroductionFields() {}

  static boolean isAtParts(SketchModel model, Sketch sketch) {
    return load(model, sketch).introduction() instanceof Introduction.Planes;
  }

  static SketchChoice<Introduction> kind(SketchModel model) {
    return new SketchChoice<>(
        "Load introduction",
        sketch -> Optional.of(load(model, sketch).introduction()),
        (sketch, introduction) ->
            withLoad(model, sketch, load -> load.withIntroduction(introduction)),
        introduction ->
            introduction instanceof Introduction.Planes ? "at the parts drawn" : "typed n",
        sketch -> kinds(model, sketch),
        (sketch, introduction) -> "");
  }

  /** A typed n starts with the one in force, the parts with the outermost. */
  private static List<Choice<Introduction>> kinds(SketchModel model, Sketch sketch) {
    Introduction present = load(model, sketch).introduction();
    boolean typed = present instanceof Introduction.Factor;
    int last = sketch.joint().elements().size() - 1;
    List<Choice<Introduction>> kinds = new ArrayList<>();
    kinds.add(
        new Choice<>(
            "typed n",
            "",
            typed ? present : new Introduction.Factor(rounded(inForce(model).orElse(1))),
            "1 = under head and nut"));
    if (last >= 0) {
      kinds.add(
          new Choice<>(
              "at the parts drawn",
              "",
              typed ? new Introduction.Planes(0, last) : present,
              "at the mid-planes of two parts; n from the give between them"));
    }
    return kinds;
  }

  private static double rounded(double factor) {
    return Math.round(factor * 1000) / 1000.0;
  }

  /** n that the shown load case comes to [–]; empty while the joint is not solved. */
  static OptionalDouble inForce(SketchModel model) {
    return model.assessment() instanceof Assessment.Solved solved
        ? OptionalDouble.of(solved.cases().get(model.loadCase()).introduction())
        : OptionalDouble.empty();
  }

  /** The part that the load enters at; it is not below the one that it leaves at. */
  static SketchChoice<Integer> upper(SketchModel model) {
    return part(
        model,
        "Load enters at",
        Introduction.Planes::upper,
        (planes, index) -> new Introduction.Planes(index, Math.max(index, planes.lower())));
  }

  /** The part that the load leaves at; it is not above the one that it enters at. */
  static SketchChoice<Integer> lower(SketchModel model) {
    return part(
        model,
        "Load leaves at",
        Introduction.Planes::lower,
        (planes, index) -> new Introduction.Planes(Math.min(index, planes.upper()), index));
  }

  private interface Moved {
    Introduction to(Introduction.Planes planes, int index);
  }

  private static SketchChoice<Integer> part(
      SketchModel model, String name, Function<Introduction.Planes, Integer> read, Moved write) {
    return new SketchChoice<>(
        name,
        sketch -> planes(model, sketch).map(read).map(index -> there(sketch, index)),
        (sketch, index) ->
            planes(model, sketch)
                .map(is -> withLoad(model, sketch, it -> it.withIntroduction(write.to(is, index))))
                .orElse(sketch),
        index -> name(model.sketch(), index),
        IntroductionFields::parts,
        (sketch, index) -> "");
  }

  private static Optional<Introduction.Planes> planes(SketchModel model, Sketch sketch) {
    return load(model, sketch).introduction() instanceof Introduction.Planes planes
        ? Optional.of(planes)
        : Optional.empty();
  }

  /** A plane beyond the stack counts at its end. */
  private static int there(Sketch sketch, int index) {
    return Math.min(index, sketch.joint().elements().size() - 1);
  }

  private static String name(Sketch sketch, int index) {
    return index < 0 ? "" : PartName.of(Part.element(index), sketch.joint());
  }

  private static List<Choice<Integer>> parts(Sketch sketch) {
    List<Choice<Integer>> parts = new ArrayList<>();
    for (int i = 0; i < sketch.joint().elements().size(); i++) {
      parts.add(Choice.of(name(sketch, i), i));
    }
    return parts;
  }
}

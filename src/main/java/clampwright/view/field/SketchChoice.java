package clampwright.view.field;

import clampwright.joint.Sketch;
import java.util.List;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;

/**
 * A value of the sketch that is chosen from a list.
 *
 * @param name names the step of the history and the field for whoever cannot see it
 * @param read the present value; empty where the sketch has none at the moment
 * @param write the sketch with another value
 * @param label how a value stands in the field, in few letters
 * @param choices what is offered, asked for when the list opens
 * @param origin where a value comes from; asked for when the tooltip shows
 */
public record SketchChoice<T>(
    String name,
    Function<Sketch, Optional<T>> read,
    BiFunction<Sketch, T, Sketch> write,
    Function<T, String> label,
    Function<Sketch, List<Choice<T>>> choices,
    BiFunction<Sketch, T, String> origin) {

  /** A choice among a few values that need no origin. */
  public static <T> SketchChoice<T> among(
      String name,
      Function<Sketch, Optional<T>> read,
      BiFunction<Sketch, T, Sketch> write,
      Function<T, String> label,
      List<T> values) {
    List<Choice<T>> choices =
        values.stream().map(value -> Choice.of(label.apply(value), value)).toList();
    return new SketchChoice<>(name, read, write, label, sketch -> choices, (sketch, value) -> "");
  }
}

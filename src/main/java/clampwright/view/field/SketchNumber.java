package clampwright.view.field;

import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/**
 * A number of the sketch that a person can read and type.
 *
 * @param name names the step of the history and the field for whoever cannot see it
 * @param dimension decides units and steps
 * @param read its value [units inside the program]; empty when left to the program, or where the
 *     sketch has no such number at the moment
 * @param write the sketch with another value; refuses an impossible one with an
 *     IllegalArgumentException whose message a person can read
 * @param optional whether an empty text leaves the number to the program
 */
public record SketchNumber(
    String name,
    Dimension dimension,
    Function<Sketch, OptionalDouble> read,
    BiFunction<Sketch, OptionalDouble, Sketch> write,
    boolean optional) {

  public SketchNumber {
    Objects.requireNonNull(name, "name");
    Objects.requireNonNull(dimension, "dimension");
    Objects.requireNonNull(read, "read");
    Objects.requireNonNull(write, "write");
  }

  /** A number that is always there. */
  public static SketchNumber required(
      String name,
      Dimension dimension,
      ToDoubleFunction<Sketch> read,
      BiFunction<Sketch, Double, Sketch> write) {
    return sometimes(
        name, dimension, sketch -> OptionalDouble.of(read.applyAsDouble(sketch)), write);
  }

  /** A number that must be typed, but that not every sketch has. */
  public static SketchNumber sometimes(
      String name,
      Dimension dimension,
      Function<Sketch, OptionalDouble> read,
      BiFunction<Sketch, Double, Sketch> write) {
    return new SketchNumber(
        name, dimension, read, (sketch, value) -> write.apply(sketch, value.orElseThrow()), false);
  }

  /** A number that may be left to the program. */
  public static SketchNumber optional(
      String name,
      Dimension dimension,
      Function<Sketch, OptionalDouble> read,
      BiFunction<Sketch, OptionalDouble, Sketch> write) {
    return new SketchNumber(name, dimension, read, write, true);
  }
}

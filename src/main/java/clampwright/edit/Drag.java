package clampwright.edit;

import clampwright.joint.Feature;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.quantity.Reading;
import java.util.Optional;

/**
 * A hold on one feature of a sketch. Pure: every answer is worked out from the sketch that was
 * taken hold of, so a drag that comes back leaves that very sketch.
 *
 * <p>Positions are in mm of the joint: {@code fromAxis} signed, positive to the right; {@code z}
 * from under the head.
 */
public sealed interface Drag
    permits LengthDrag, OrderDrag, FlankDrag, ShankDrag, LayerDrag, ForceDrag, PlaneDrag, NoteDrag {

  /**
   * Takes hold of a feature.
   *
   * @return empty where there is nothing to be dragged: the hole of a tapped layer is the thread, a
   *     thread of no series has no sizes to step through, an unsolved joint has no cones
   */
  static Optional<Drag> start(
      Sketch sketch, Part part, Feature feature, double fromAxis, double z) {
    Grab grab = new Grab(fromAxis, z);
    return switch (feature) {
      case FACE -> Optional.of(LengthDrag.face(sketch, part, grab));
      case LEFT_EDGE, RIGHT_EDGE ->
          Optional.of(LengthDrag.edge(sketch, part, feature == Feature.LEFT_EDGE, grab));
      case HOLE_EDGE -> LengthDrag.hole(sketch, part, grab);
      case BODY -> part.isElement() ? Optional.of(OrderDrag.of(sketch, part, grab)) : none();
      case FLANK -> FlankDrag.of(sketch, part, grab);
      case SHANK_EDGE -> ShankDrag.of(sketch, grab);
      case NOTE ->
          part.isNote() && part.index() < sketch.notes().size()
              ? Optional.of(new NoteDrag(sketch, grab, part.index()))
              : none();
      case PRELOAD_SIZE -> ForceDrag.preload(sketch, grab);
      case LOAD_AT_HEAD, LOAD_AT_NUT, LOAD_ENTERS, LOAD_LEAVES ->
          load(sketch, 0, feature, fromAxis, z);
      case INSERT ->
          Optional.of(LayerDrag.at(sketch, Interfaces.above(sketch.joint(), part), grab));
    };
  }

  /** Takes hold of the arrows of a load case, or of where its load enters or leaves. */
  static Optional<Drag> load(
      Sketch sketch, int loadCase, Feature feature, double fromAxis, double z) {
    Grab grab = new Grab(fromAxis, z);
    return switch (feature) {
      case LOAD_AT_HEAD, LOAD_AT_NUT ->
          Optional.of(ForceDrag.load(sketch, loadCase, feature == Feature.LOAD_AT_HEAD, grab));
      case LOAD_ENTERS, LOAD_LEAVES ->
          PlaneDrag.of(sketch, loadCase, feature == Feature.LOAD_ENTERS);
      default -> none();
    };
  }

  private static Optional<Drag> none() {
    return Optional.empty();
  }

  /** Draws a new layer from here: at the interface nearest to the press. */
  static Drag layer(Sketch sketch, double fromAxis, double z) {
    int index = Interfaces.nearest(sketch.joint(), z);
    return LayerDrag.at(sketch, index, new Grab(fromAxis, z));
  }

  /** Draws a new washer at an end, with the diameters of the table for the thread. */
  static Drag washer(Sketch sketch, End end, double fromAxis, double z) {
    return LayerDrag.washer(sketch, end, new Grab(fromAxis, z));
  }

  /** The sketch that was taken hold of. */
  Sketch start();

  /** What the pointer at this place makes of it. */
  Dragged at(double fromAxis, double z, Snap snap);

  /**
   * What exactly this value makes of it.
   *
   * @throws IllegalArgumentException where {@link #problem} has something to say
   */
  default Dragged exactly(double value) {
    Optional<String> problem = problem(value);
    if (problem.isPresent()) {
      throw new IllegalArgumentException(problem.get());
    }
    return set(value);
  }

  /** Like exactly, for a value that has been found free of problems. */
  Dragged set(double value);

  /** Why a value cannot be; empty when it can. */
  Optional<String> problem(double value);

  /** What typed digits measure. */
  Dimension dimension();

  /** The same hold, moving one of a pair alone, where there is a pair. */
  default Drag alone(boolean alone) {
    return this;
  }

  /**
   * The same hold, keeping what the pointer has decided besides the value before digits took over.
   */
  default Drag after(Dragged last) {
    return this;
  }

  /** What a text typed during the drag comes to. */
  default Typed typed(String text) {
    Reading reading = Reading.of(text, dimension(), start().units());
    if (reading instanceof Reading.Wrong wrong) {
      return new Typed.Wrong(wrong.problem());
    }
    double value = ((Reading.Value) reading).value();
    return problem(value).<Typed>map(Typed.Wrong::new).orElseGet(() -> new Typed.Value(set(value)));
  }
}

package clampwright.edit;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.Optional;
import java.util.function.DoubleFunction;

/**
 * A length of one element that follows the pointer.
 *
 * @param start sketch taken hold of
 * @param part the element
 * @param grab where it was taken hold of
 * @param length what is changed
 * @param alongAxis whether it follows the pointer along the axis, else outwards from it
 * @param rate change of the length per mm of the pointer
 */
record LengthDrag(Sketch start, Part part, Grab grab, Length length, boolean alongAxis, double rate)
    implements Drag {

  /** Nothing can be dragged thinner than this [mm]; typing can make it so. */
  private static final double THINNEST = 0.01;

  private static final double LONGEST = 1e5;

  /**
   * The length that is changed.
   *
   * @param label shown at the pointer
   * @param value at the start [mm]
   * @param low limit for dragging [mm]
   * @param high limit for dragging [mm]
   * @param change the element with another value
   */
  record Length(
      String label, double value, double low, double high, DoubleFunction<Element> change) {}

  static Drag face(Sketch sketch, Part part, Grab grab) {
    Element element = element(sketch, part);
    Length thickness =
        new Length("thickness", element.thickness(), THINNEST, LONGEST, element::withThickness);
    return new LengthDrag(sketch, part, grab, thickness, true, 1);
  }

  static Drag edge(Sketch sketch, Part part, boolean left, Grab grab) {
    Element element = element(sketch, part);
    if (element.outline() instanceof Outline.Strip strip) {
      return new LengthDrag(sketch, part, grab, distance(element, strip, left), false, 1);
    }
    double diameter =
        element.outline() instanceof Outline.Round round
            ? round.diameter()
            : 2 * Math.abs(grab.fromAxis());
    Length outside =
        new Length(
            "outside diameter",
            diameter,
            element.hole() + THINNEST,
            LONGEST,
            value -> element.withOutline(new Outline.Round(value)));
    return new LengthDrag(sketch, part, grab, outside, false, 2);
  }

  private static Length distance(Element element, Outline.Strip strip, boolean left) {
    DoubleFunction<Element> change =
        value ->
            element.withOutline(
                left
                    ? new Outline.Strip(value, strip.right())
                    : new Outline.Strip(strip.left(), value));
    return new Length(
        left ? "edge distance, left" : "edge distance, right",
        left ? strip.left() : strip.right(),
        element.hole() / 2 + THINNEST,
        LONGEST,
        change);
  }

  static Optional<Drag> hole(Sketch sketch, Part part, Grab grab) {
    if (sketch.joint().isTappedLayer(part.index())) {
      return Optional.empty();
    }
    Element element = element(sketch, part);
    Outline outline = element.outline();
    double edge = 2 * Math.min(outline.leftReach(), outline.rightReach());
    Length hole =
        new Length(
            "hole",
            element.hole(),
            THINNEST,
            Math.min(LONGEST, edge - THINNEST),
            element::withHole);
    return Optional.of(new LengthDrag(sketch, part, grab, hole, false, 2));
  }

  private static Element element(Sketch sketch, Part part) {
    return sketch.joint().elements().get(part.index());
  }

  @Override
  public Dragged at(double fromAxis, double z, Snap snap) {
    double moved = alongAxis ? z - grab.z() : grab.outwards(fromAxis);
    if (moved == 0) {
      return dragged(start, length.value());
    }
    double value = length.value() + rate * moved;
    return changed(snap.length(value, length.low(), length.high()));
  }

  @Override
  public Dragged set(double value) {
    return changed(value);
  }

  private Dragged changed(double value) {
    Joint joint = start.joint().withElement(part.index(), length.change().apply(value));
    return dragged(start.withJoint(joint), value);
  }

  private Dragged dragged(Sketch sketch, double value) {
    return new Dragged(
        sketch,
        part,
        length.label(),
        Dimension.LENGTH,
        value,
        Quantities.trimmedText(Dimension.LENGTH, start.units(), value),
        "Change " + length.label().split(",")[0] + " of " + Names.of(start.joint(), part));
  }

  @Override
  public Optional<String> problem(double value) {
    return value > 0
        ? Optional.empty()
        : Optional.of("The " + length.label() + " must be above 0.");
  }

  @Override
  public Dimension dimension() {
    return Dimension.LENGTH;
  }
}

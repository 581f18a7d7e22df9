package clampwright.edit;

import clampwright.catalog.Catalogue;
import clampwright.catalog.Washer;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Material;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.ScrewThread;
import clampwright.joint.Sketch;
import clampwright.quantity.UnitSystem;
import java.util.ArrayList;
import java.util.List;
import java.util.function.IntUnaryOperator;

/**
 * Changes of the stack: what comes in, goes out, and in what order. Pure; indices from the head.
 */
public final class Stacking {
  private Stacking() {}

  /**
   * A new layer: normal clearance hole, the material of the layer beside it.
   *
   * @param index of the new layer, 0 … number of elements
   * @param thickness [mm]
   */
  public static Change inserted(Sketch sketch, int index, double thickness, Outline outline) {
    Joint joint = sketch.joint();
    Element layer =
        new Element(
            Names.forLayer(joint.elements()),
            Element.Kind.LAYER,
            thickness,
            Catalogue.standard().usualHole(joint.fastener().thread()),
            outline,
            materialBeside(joint.elements(), index));
    return added("Insert ", sketch, index, layer);
  }

  /** A new wide layer about as thick as the bolt. */
  public static Change inserted(Sketch sketch, int index) {
    double usual = sketch.joint().fastener().thread().diameter();
    return inserted(sketch, index, rounded(usual, sketch.units()), Outline.WIDE);
  }

  private static Material materialBeside(List<Element> elements, int index) {
    for (int i : new int[] {index - 1, index}) {
      if (i >= 0 && i < elements.size() && !elements.get(i).isWasher()) {
        return elements.get(i).material();
      }
    }
    return Catalogue.standard().usualMaterial();
  }

  private static Change added(String verb, Sketch sketch, int index, Element element) {
    List<Element> elements = new ArrayList<>(sketch.joint().elements());
    elements.add(index, element);
    String name = verb + Names.of(sketch.joint().withElements(elements), Part.element(index));
    Sketch added = restacked(sketch, elements, i -> i < index ? i : i + 1);
    return new Change(name, added, Part.element(index));
  }

  private static Sketch restacked(Sketch sketch, List<Element> elements, IntUnaryOperator place) {
    return restacked(sketch, elements, -1, place);
  }

  private static Sketch restacked(
      Sketch sketch, List<Element> elements, int gone, IntUnaryOperator place) {
    return sketch
        .withJoint(joint -> Restacking.of(joint, elements, place))
        .withNotes(Noting.followed(sketch.notes(), gone, place));
  }

  /** The stack without an element; the one that takes its place is selected. */
  public static Change deleted(Sketch sketch, int index) {
    List<Element> elements = new ArrayList<>(sketch.joint().elements());
    elements.remove(index);
    Part then =
        elements.isEmpty() ? Part.JOINT : Part.element(Math.min(index, elements.size() - 1));
    String name = "Delete " + Names.of(sketch.joint(), Part.element(index));
    return new Change(name, restacked(sketch, elements, index, i -> i > index ? i - 1 : i), then);
  }

  /** An element taken out and put in again at another place. */
  public static Change moved(Sketch sketch, int from, int to) {
    List<Element> elements = new ArrayList<>(sketch.joint().elements());
    elements.add(to, elements.remove(from));
    String name = "Move " + Names.of(sketch.joint(), Part.element(from));
    return new Change(name, restacked(sketch, elements, i -> place(i, from, to)), Part.element(to));
  }

  /** Where an element lies after one has gone from a place to another. */
  private static int place(int index, int from, int to) {
    if (index == from) {
      return to;
    }
    int without = index > from ? index - 1 : index;
    return without >= to ? without + 1 : without;
  }

  /** Whether an element can go one place towards the head (−1) or the nut (+1). */
  public static boolean canMove(Sketch sketch, int index, int places) {
    int to = index + places;
    return to >= 0 && to < sketch.joint().elements().size();
  }

  /** A copy of an element behind it. */
  public static Change duplicated(Sketch sketch, int index) {
    List<Element> elements = sketch.joint().elements();
    Element copied = elements.get(index);
    Element copy = copied.withName(Names.forCopy(elements, copied.name()));
    Change added = added("", sketch, index + 1, copy);
    String name = "Duplicate " + Names.of(sketch.joint(), Part.element(index));
    return new Change(name, added.sketch(), added.then());
  }

  /** Another kind of outline for an element, as near to the old one as can be. */
  public static Change outlined(Sketch sketch, int index, OutlineKind kind) {
    Joint joint = sketch.joint();
    Element element = joint.elements().get(index);
    double usual = 3 * joint.fastener().thread().diameter();
    Outline outline = kind.from(element.outline(), rounded(usual, sketch.units()));
    String name = "Change outline of " + Names.of(joint, Part.element(index));
    return new Change(
        name,
        sketch.withJoint(joint.withElement(index, element.withOutline(outline))),
        Part.element(index));
  }

  /** Whether the element at this end of the stack is a washer. */
  public static boolean hasWasher(Sketch sketch, End end) {
    List<Element> elements = sketch.joint().elements();
    return !elements.isEmpty() && elements.get(endIndex(elements, end)).isWasher();
  }

  private static int endIndex(List<Element> elements, End end) {
    return end == End.HEAD ? 0 : elements.size() - 1;
  }

  /** Whether a washer can go to this end: a tapped hole leaves no room for one. */
  public static boolean canAddWasher(Sketch sketch, End end) {
    return end == End.HEAD || !sketch.joint().fastener().isTapped();
  }

  /** A washer of the table for the thread at an end. */
  public static Change washerAdded(Sketch sketch, End end) {
    Washer usual = Catalogue.standard().usualWasher(thread(sketch));
    return washerAdded(sketch, end, usual.thickness());
  }

  /** A washer of the table for the thread at an end, but of this thickness [mm]. */
  public static Change washerAdded(Sketch sketch, End end, double thickness) {
    Washer usual = Catalogue.standard().usualWasher(thread(sketch));
    List<Element> elements = sketch.joint().elements();
    Element washer =
        new Element(
            Names.forWasher(elements),
            Element.Kind.WASHER,
            thickness,
            usual.hole(),
            new Outline.Round(usual.outsideDiameter()),
            Catalogue.standard().usualMaterial());
    Change added = added("", sketch, end == End.HEAD ? 0 : elements.size(), washer);
    String name = end == End.HEAD ? "Add washer at the head" : "Add washer at the nut";
    return new Change(name, added.sketch(), added.then());
  }

  /** The stack without the washer at an end; there must be one. */
  public static Change washerRemoved(Sketch sketch, End end) {
    Change deleted = deleted(sketch, endIndex(sketch.joint().elements(), end));
    String name = end == End.HEAD ? "Remove washer at the head" : "Remove washer at the nut";
    return new Change(name, deleted.sketch(), deleted.then());
  }

  private static ScrewThread thread(Sketch sketch) {
    return sketch.joint().fastener().thread();
  }

  /** To whole millimetres or sixteenths of an inch, at least one. */
  private static double rounded(double length, UnitSystem units) {
    double step = units == UnitSystem.METRIC ? 1 : 25.4 / 16;
    return new Snap(step).length(length, step, Double.MAX_VALUE);
  }
}

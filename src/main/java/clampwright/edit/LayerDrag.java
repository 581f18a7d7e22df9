package clampwright.edit;

import clampwright.joint.Element;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import java.util.Optional;

/**
 * A new layer or washer that is drawn: as thick as the drag is long. A layer is wide while the
 * pointer goes along the axis; going sideways as well gives it a round edge at the pointer.
 *
 * @param start sketch taken hold of
 * @param grab where the drawing began
 * @param added the change that brings the new part in, of any thickness
 */
record LayerDrag(Sketch start, Grab grab, Change added) implements Drag {
  private static final double LONGEST = 1e5;

  /** How much of the way must go sideways before an edge is meant [–]. */
  private static final double SIDEWAYS = 1 / 3.0;

  static Drag at(Sketch sketch, int index, Grab grab) {
    return new LayerDrag(sketch, grab, Stacking.inserted(sketch, index));
  }

  static Drag washer(Sketch sketch, End end, Grab grab) {
    return new LayerDrag(sketch, grab, Stacking.washerAdded(sketch, end));
  }

  @Override
  public Dragged at(double fromAxis, double z, Snap snap) {
    double along = Math.abs(z - grab.z());
    double sideways = Math.abs(grab.outwards(fromAxis));
    double thickness = snap.length(along, 0, LONGEST);
    if (thickness == 0) {
      return dragged(start, 0, "");
    }
    Element drawn = element().withThickness(thickness);
    if (element().isWasher() || sideways <= SIDEWAYS * along) {
      return dragged(with(drawn), thickness, "");
    }
    double least = element().hole() + Math.max(0.02, 2 * snap.step());
    double edge = snap.length(2 * Math.abs(fromAxis), least, LONGEST);
    Sketch edged = with(drawn.withOutline(new Outline.Round(edge)));
    return dragged(edged, thickness, ", Ø " + text(edge));
  }

  @Override
  public Dragged set(double value) {
    return dragged(with(element().withThickness(value)), value, "");
  }

  @Override
  public Drag after(Dragged last) {
    if (last.sketch() == start) {
      return this;
    }
    Outline outline = last.sketch().joint().elements().get(added.then().index()).outline();
    Sketch edged = with(element().withOutline(outline));
    return new LayerDrag(start, grab, new Change(added.name(), edged, added.then()));
  }

  private Element element() {
    return added.sketch().joint().elements().get(added.then().index());
  }

  private Sketch with(Element element) {
    return added.sketch().withJoint(joint -> joint.withElement(added.then().index(), element));
  }

  private Dragged dragged(Sketch sketch, double thickness, String edge) {
    return new Dragged(
        sketch,
        sketch == start ? Part.JOINT : added.then(),
        "thickness",
        Dimension.LENGTH,
        thickness,
        text(thickness) + edge,
        added.name());
  }

  private String text(double length) {
    return Quantities.trimmedText(Dimension.LENGTH, start.units(), length);
  }

  @Override
  public Optional<String> problem(double value) {
    return value > 0 ? Optional.empty() : Optional.of("The thickness must be above 0.");
  }

  @Override
  public Dimension dimension() {
    return Dimension.LENGTH;
  }
}

package clampwright.mechanics.checks;

import clampwright.joint.Anchor;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Pressure between head, nut, washers and what lies under them: F over π/4·(D² − d²), D the smaller
 * outside diameter, d the larger hole. From one interface to the next the pressed diameter grows by
 * 1.6 t, up to the washer's own (VDI 2230-1, from memory). Chamfers and fillets are not counted.
 *
 * @param part below whose face it is, the one farther from head or nut
 * @param diameter D [mm]
 * @param hole d [mm]
 * @param limit the softer side's pressure limit [MPa]; empty where neither side has one
 */
public record Bearing(Part part, double diameter, double hole, OptionalDouble limit) {
  private static final double SPREAD = 1.6;

  /** Pressed area [mm²]. */
  public double area() {
    return Math.PI / 4 * (diameter * diameter - hole * hole);
  }

  /** The interfaces from the head inwards and from the nut inwards, as far as washers go. */
  public static List<Bearing> of(Joint joint) {
    List<Bearing> faces = new ArrayList<>();
    add(faces, joint, joint.fastener().head().bearingDiameter(), 1);
    if (joint.fastener().anchor() instanceof Anchor.Nut nut) {
      add(faces, joint, nut.bearingDiameter(), -1);
    }
    return faces;
  }

  private static void add(List<Bearing> faces, Joint joint, double face, int step) {
    List<Element> elements = joint.elements();
    int i = step > 0 ? 0 : elements.size() - 1;
    double pressed = face;
    double hole = 0;
    OptionalDouble above = joint.fastener().material().pressureLimit();
    boolean washer = true;
    while (washer && i >= 0 && i < elements.size() && !joint.isTappedLayer(i)) {
      Element element = elements.get(i);
      double outer = outerDiameter(element);
      double diameter = Math.min(pressed, outer);
      double inner = Math.max(hole, element.hole());
      if (diameter > inner) {
        OptionalDouble limit = softer(above, element.material().pressureLimit());
        faces.add(new Bearing(Part.element(i), diameter, inner, limit));
      }
      washer = element.isWasher();
      pressed = Math.min(outer, pressed + SPREAD * element.thickness());
      hole = element.hole();
      above = element.material().pressureLimit();
      i += step;
    }
  }

  private static double outerDiameter(Element element) {
    return element.outline() instanceof Outline.Round round
        ? round.diameter()
        : Double.POSITIVE_INFINITY;
  }

  private static OptionalDouble softer(OptionalDouble one, OptionalDouble other) {
    if (one.isPresent() && other.isPresent()) {
      return OptionalDouble.of(Math.min(one.getAsDouble(), other.getAsDouble()));
    }
    return one.isPresent() ? one : other;
  }
}

package clampwright.mechanics.checks;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Preload;
import clampwright.mechanics.Zone;
import clampwright.mechanics.ZoneArea;
import java.util.Optional;

/**
 * Pressure on the faces under head, nut and washers, and in parts narrower than the zone, under the
 * greatest bolt load that tightening or service brings.
 */
final class Pressed {
  private final Joint joint;
  private final Solved solved;
  private final Worst bearing = new Worst(CheckKind.BEARING_PRESSURE, Part.JOINT);
  private final Worst crushing = new Worst(CheckKind.CRUSHING, Part.JOINT);
  private double force;
  private int loadCase = -1;
  private int temperature = Preload.ROOM;
  private StiffnessMethod method;
  private boolean narrow;

  Pressed(Joint joint, Solved solved) {
    this.joint = joint;
    this.solved = solved;
    force = solved.preload().assemblyMax();
  }

  void add(double boltLoad, int loadCase, int temperature, StiffnessMethod method) {
    if (boltLoad > force) {
      force = boltLoad;
      this.loadCase = loadCase;
      this.temperature = temperature;
      this.method = method;
    }
  }

  /** Judges all faces and narrow parts by the greatest load. */
  void judge() {
    Verdict.Where where = new Verdict.Where(loadCase, temperature, Optional.ofNullable(method));
    for (Bearing face : Bearing.of(joint)) {
      if (face.limit().isPresent()) {
        judge(bearing, face.part(), face.area(), face.limit().getAsDouble(), where);
      }
    }
    for (int i = 0; i < solved.elements().size(); i++) {
      ElementFinding finding = solved.elements().get(i);
      if (finding.edgeLimited() || finding.edgeClipped() || finding.wholeWasher()) {
        narrow = true;
        Element element = joint.elements().get(i);
        if (element.material().pressureLimit().isPresent()) {
          double limit = element.material().pressureLimit().getAsDouble();
          judge(crushing, Part.element(i), smallestArea(i), limit, where);
        }
      }
    }
  }

  private void judge(Worst worst, Part part, double area, double limit, Verdict.Where where) {
    double pressure = force / area;
    if (pressure > 0) {
      worst.add(part, limit / pressure - 1, pressure, limit, where);
    }
  }

  /** Smallest area of the zone in an element [mm²]. */
  private double smallestArea(int index) {
    ElementFinding finding = solved.elements().get(index);
    Element element = joint.elements().get(index);
    double hole = Math.PI / 4 * finding.hole() * finding.hole();
    double smallest = finding.area();
    for (Zone.Piece piece : solved.zone().pieces()) {
      if (piece.element() == index) {
        double radius = Math.min(piece.fromRadius(), piece.toRadius());
        smallest = Math.min(smallest, ZoneArea.disc(radius, element.outline()) - hole);
      }
    }
    return smallest;
  }

  boolean hasNarrowPart() {
    return narrow;
  }

  Worst bearing() {
    return bearing;
  }

  Worst crushing() {
    return crushing;
  }
}

package clampwright.figure;

import clampwright.joint.Feature;
import clampwright.joint.Part;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Side;
import clampwright.mechanics.Zone;
import java.util.ArrayList;
import java.util.List;

/** Draws the hand method on the left half: governed zone, cones, effective cylinders, faces. */
final class ConeDrawing {
  private final Drawing drawing;
  private final StackLayout layout;
  private final Assessment.Solved solved;

  ConeDrawing(Drawing drawing, StackLayout layout, Assessment.Solved solved) {
    this.drawing = drawing;
    this.layout = layout;
    this.solved = solved;
  }

  /** The part of the zone that each side governs. */
  void fills() {
    for (Zone.Piece piece : solved.zone().pieces()) {
      fill(
          piece.element(),
          fillRole(piece.side()),
          piece.from(),
          piece.fromRadius(),
          piece.to(),
          piece.toRadius());
    }
    for (int i = 0; i < solved.elements().size(); i++) {
      ElementFinding finding = solved.elements().get(i);
      if (finding.wholeWasher()) {
        double radius = finding.effectiveDiameter() / 2;
        fill(i, fillRole(finding.governing()), finding.from(), radius, finding.to(), radius);
      }
    }
  }

  private void fill(int i, Role role, double from, double fromRadius, double to, double toRadius) {
    double hole = layout.holeRadius(i);
    double limit = Math.min(layout.reach(), outer(i));
    List<Point> points = new ArrayList<>();
    points.add(drawing.at(-Math.min(fromRadius, limit), from));
    if (fromRadius > limit != toRadius > limit) {
      double z = from + (to - from) * (limit - fromRadius) / (toRadius - fromRadius);
      points.add(drawing.at(-limit, z));
    }
    points.add(drawing.at(-Math.min(toRadius, limit), to));
    points.add(drawing.at(-hole, to));
    points.add(drawing.at(-hole, from));
    drawing.area(Tag.of(role, Part.element(i), Feature.BODY), points);
  }

  /** What of the left half there is to fill: a strip ends at its left edge. */
  private double outer(int i) {
    return layout.joint().elements().get(i).outline().leftReach();
  }

  private static Role fillRole(Side side) {
    return switch (side) {
      case HEAD -> Role.HEAD_GOVERNS;
      case NUT -> Role.NUT_GOVERNS;
      case BOTH -> Role.BOTH_GOVERN;
    };
  }

  /** Flanks of both cones, left in full, right faint; and the clamp faces. */
  void flanks() {
    cone(solved.zone().headCone(), Role.HEAD_CONE, Role.HEAD_CONE_FAINT, Part.HEAD_CONE);
    cone(solved.zone().nutCone(), Role.NUT_CONE, Role.NUT_CONE_FAINT, Part.NUT_CONE);
    Zone zone = solved.zone();
    int first = firstClamped();
    int last = lastClamped();
    face(Role.HEAD_FACE, Part.HEAD_CONE, zone.headFacePosition(), zone.headFaceDiameter(), first);
    face(Role.NUT_FACE, Part.NUT_CONE, zone.nutFacePosition(), zone.nutFaceDiameter(), last);
  }

  private int firstClamped() {
    return solved.zone().pieces().get(0).element();
  }

  private int lastClamped() {
    return solved.zone().pieces().get(solved.zone().pieces().size() - 1).element();
  }

  private void face(Role role, Part part, double z, double diameter, int element) {
    double hole = layout.holeRadius(element);
    for (int side : new int[] {-1, 1}) {
      drawing.line(
          Tag.of(role, part), drawing.at(side * hole, z), drawing.at(side * diameter / 2, z));
    }
  }

  private void cone(List<Zone.Piece> pieces, Role role, Role faint, Part part) {
    for (Zone.Piece piece : pieces) {
      List<Point> left = clipped(piece, -1);
      if (!left.isEmpty()) {
        drawing.path(Tag.of(role, part, Feature.FLANK), left);
        drawing.path(Tag.of(faint, part), clipped(piece, 1));
      }
    }
  }

  /** A flank up to the drawn reach; empty where it lies beyond. */
  private List<Point> clipped(Zone.Piece piece, int side) {
    double limit = layout.reach();
    double r1 = piece.fromRadius();
    double r2 = piece.toRadius();
    double z1 = piece.from();
    double z2 = piece.to();
    if (Math.min(r1, r2) >= limit) {
      return List.of();
    }
    if (r2 > limit) {
      z2 = z1 + (z2 - z1) * (limit - r1) / (r2 - r1);
      r2 = limit;
    } else if (r1 > limit) {
      z1 = z2 - (z2 - z1) * (limit - r2) / (r1 - r2);
      r1 = limit;
    }
    return List.of(drawing.at(side * r1, z1), drawing.at(side * r2, z2));
  }

  /** The effective cylinder of each element, dotted; what a straight edge cuts off is not drawn. */
  void cylinders() {
    for (int i = 0; i < solved.elements().size(); i++) {
      ElementFinding finding = solved.elements().get(i);
      double limit = Math.min(layout.reach(), outer(i));
      double radius = Math.min(finding.effectiveDiameter() / 2, limit);
      List<Point> points = new ArrayList<>();
      points.add(drawing.at(-layout.holeRadius(i), finding.from()));
      points.add(drawing.at(-radius, finding.from()));
      points.add(drawing.at(-radius, finding.to()));
      points.add(drawing.at(-layout.holeRadius(i), finding.to()));
      drawing.path(Tag.of(Role.EFFECTIVE_CYLINDER, Part.element(i)), points);
    }
  }
}

package clampwright.edit;

import clampwright.joint.Anchor;
import clampwright.joint.Criteria;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Material;
import clampwright.joint.Method;
import clampwright.joint.Outline;
import clampwright.joint.ScrewThread;
import clampwright.joint.Service;
import clampwright.joint.Sketch;
import clampwright.joint.Strength;
import clampwright.joint.Tightening;
import clampwright.joint.WasherRule;
import clampwright.quantity.UnitSystem;
import java.util.List;
import java.util.OptionalDouble;

/** Sketches for tests: an M10 bolt through parts with easy numbers. */
final class Sketches {
  static final Material STEEL =
      new Material(
          "carbon steel",
          Material.Family.STEEL,
          206_000,
          OptionalDouble.of(0.3),
          OptionalDouble.empty());

  private Sketches() {}

  static Element layer(String name, double thickness) {
    return layer(name, thickness, Outline.WIDE);
  }

  static Element layer(String name, double thickness, Outline outline) {
    return new Element(name, Element.Kind.LAYER, thickness, 11, outline, STEEL);
  }

  static Element washer(String name) {
    return new Element(name, Element.Kind.WASHER, 2, 10.5, new Outline.Round(20), STEEL);
  }

  /** Washer 2, Cover 10 wide, Spacer 6 round 24, Flange 16 strip 20 | 30. */
  static Sketch mixed() {
    return of(
        washer("Washer"),
        layer("Cover", 10),
        layer("Spacer", 6, new Outline.Round(24)),
        layer("Flange", 16, new Outline.Strip(20, 30)));
  }

  static Sketch empty() {
    return of();
  }

  static Sketch of(Element... elements) {
    Joint joint =
        new Joint(
            fastener(),
            List.of(elements),
            WasherRule.AUTOMATIC,
            WasherRule.AUTOMATIC,
            Method.USUAL,
            Tightening.force(30_000),
            Service.of(LoadCase.steady("Working load", 10_000, 1)),
            Criteria.USUAL);
    return new Sketch("Pump cover", joint, UnitSystem.METRIC);
  }

  private static Fastener fastener() {
    return new Fastener(
        new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5),
        new Head(Head.Style.HEXAGON, "own size", 14.6, 6.4, 16, 16),
        new Anchor.Nut("own size", 14.6, 8.4, 16),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0,
        new Strength("ISO 898-1", "8.8", OptionalDouble.of(580), OptionalDouble.of(640), 800),
        STEEL);
  }
}

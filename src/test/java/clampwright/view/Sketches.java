package clampwright.view;

import clampwright.catalog.Catalogue;
import clampwright.joint.Criteria;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Material;
import clampwright.joint.Method;
import clampwright.joint.Outline;
import clampwright.joint.Service;
import clampwright.joint.Sketch;
import clampwright.joint.Tightening;
import clampwright.joint.WasherRule;
import clampwright.quantity.UnitSystem;
import java.util.List;

/** Sketches for tests of the interface. */
public final class Sketches {
  private static final Material STEEL = Catalogue.standard().usualMaterial();

  private Sketches() {}

  /** M10 through a washer, a cover of 9 mm, a spacer of 6 mm and a flange of 16 mm; 25 kN. */
  public static Sketch cover() {
    return sketch(
        new Element("Washer", Element.Kind.WASHER, 2, 10.5, new Outline.Round(20), STEEL),
        new Element("Cover", Element.Kind.LAYER, 9, 11, Outline.WIDE, STEEL),
        new Element("Spacer", Element.Kind.LAYER, 6, 11, new Outline.Round(22), STEEL),
        new Element("Flange", Element.Kind.LAYER, 16, 11, new Outline.Strip(21, 60), STEEL));
  }

  public static Sketch sketch(Element... elements) {
    Joint joint =
        new Joint(
            Catalogue.standard().usualFastener(),
            List.of(elements),
            WasherRule.AUTOMATIC,
            WasherRule.AUTOMATIC,
            Method.USUAL,
            Tightening.force(25_000),
            Service.of(LoadCase.steady("Working load", 6_000, 1)),
            Criteria.USUAL);
    return new Sketch("Pump cover", joint, UnitSystem.METRIC);
  }
}

package clampwright.app;

import clampwright.catalog.Catalogue;
import clampwright.joint.Criteria;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Method;
import clampwright.joint.Service;
import clampwright.joint.Sketch;
import clampwright.joint.Tightening;
import clampwright.joint.WasherRule;
import clampwright.quantity.UnitSystem;
import java.util.List;

/** The sketch that "New" starts with: a usual bolt, no layer yet. */
final class NewSketch {
  /** A usual preload, as a share of the proof load (common practice, no source). */
  private static final double PRELOAD_SHARE = 0.75;

  private NewSketch() {}

  static Sketch create(UnitSystem units) {
    Fastener fastener = Catalogue.standard().usualFastener();
    double proof = fastener.strength().proof().orElse(0) * fastener.thread().stressArea();
    double preload = Math.floor(PRELOAD_SHARE * proof / 500) * 500;
    Joint joint =
        new Joint(
            fastener,
            List.of(),
            WasherRule.AUTOMATIC,
            WasherRule.AUTOMATIC,
            Method.USUAL,
            Tightening.force(preload),
            Service.of(LoadCase.steady("Working load", 0, 1)),
            Criteria.USUAL);
    return new Sketch("New sketch", joint, units);
  }
}

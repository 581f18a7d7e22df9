package clampwright.bench;

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
import clampwright.joint.Scatter;
import clampwright.joint.ScrewThread;
import clampwright.joint.Service;
import clampwright.joint.Strength;
import clampwright.joint.TemperatureCase;
import clampwright.joint.Tightening;
import clampwright.joint.WasherRule;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** The joint that the benchmarks measure with: M10 through twelve layers of two materials. */
final class TwelveLayers {
  private TwelveLayers() {}

  /**
   * The joint.
   *
   * @param everyOther outline of every other layer; the rest are round
   */
  static Joint with(Outline everyOther) {
    Material steel = material(Material.Family.STEEL, 206_000);
    Material aluminium = material(Material.Family.ALUMINIUM, 71_000);
    List<Element> elements = new ArrayList<>();
    for (int i = 0; i < 12; i++) {
      Outline outline = i % 2 == 0 ? everyOther : new Outline.Round(40 + i);
      Material material = i % 3 == 0 ? aluminium : steel;
      elements.add(
          new Element("Layer " + (i + 1), Element.Kind.LAYER, 3 + i, 11, outline, material));
    }
    return new Joint(
        fastener(steel),
        elements,
        WasherRule.AUTOMATIC,
        WasherRule.AUTOMATIC,
        Method.USUAL,
        Tightening.force(25_000),
        Service.of(LoadCase.steady("Working load", 8_000, 0.5)),
        Criteria.USUAL);
  }

  /**
   * The same without strips, under many loads at many temperatures, all of which pull and shear.
   */
  static Joint loaded(int loads, int temperatures) {
    List<LoadCase> cases = new ArrayList<>();
    for (int i = 0; i < loads; i++) {
      cases.add(
          LoadCase.steady("Load " + i, 6_000 + 400 * i, 0.5)
              .withAxial(1_000, 6_000 + 400 * i)
              .withShear(500 + 100 * i));
    }
    List<TemperatureCase> states = new ArrayList<>();
    for (int i = 0; i < temperatures; i++) {
      states.add(new TemperatureCase("State " + i, 20 + 40 * i, 20 + 30 * i));
    }
    Joint joint = with(Outline.WIDE);
    List<Element> elements =
        joint.elements().stream()
            .map(
                element ->
                    element.withMaterial(
                        element
                            .material()
                            .withTensile(OptionalDouble.of(360))
                            .withPressureLimit(OptionalDouble.of(500))))
            .toList();
    return joint
        .withElements(elements)
        .withService(new Service(20, states, cases))
        .withTightening(
            Tightening.force(25_000)
                .withScatter(new Scatter.PlusMinus(0.25))
                .withThreadFriction(OptionalDouble.of(0.12)));
  }

  private static Fastener fastener(Material steel) {
    return new Fastener(
        new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5),
        new Head(Head.Style.HEXAGON, "own size", 14.6, 6.4, 16, 16),
        new Anchor.Nut("own size", 14.6, 8.4, 16),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        0,
        new Strength("ISO 898-1", "8.8", OptionalDouble.of(580), OptionalDouble.of(640), 800),
        steel);
  }

  private static Material material(Material.Family family, double modulus) {
    return new Material(
        family.name(), family, modulus, OptionalDouble.of(0.3), OptionalDouble.of(12e-6));
  }
}

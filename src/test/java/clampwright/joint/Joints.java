package clampwright.joint;

import clampwright.quantity.UnitSystem;
import java.util.List;
import java.util.OptionalDouble;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.Tuple;

/**
 * Random joints for property tests: {@link #any} is all that the records allow, with every number a
 * double can be, and mostly without a solution; {@link #fitting} mostly has one.
 */
public final class Joints {
  private Joints() {}

  /** Any finite double, zeros of both signs among them. */
  public static Arbitrary<Double> finite() {
    Arbitrary<Double> bits = Arbitraries.longs().map(Double::longBitsToDouble);
    return Arbitraries.frequencyOf(
            Tuple.of(4, bits),
            Tuple.of(4, Arbitraries.doubles().between(-1e6, 1e6).ofScale(6)),
            Tuple.of(1, Arbitraries.of(0.0, -0.0, 0.1, 1.0 / 3, 1e15, -1e15, 25.4)))
        .filter(Double::isFinite);
  }

  /** Any double above 0. */
  public static Arbitrary<Double> positive() {
    return finite().map(Math::abs).filter(value -> value > 0);
  }

  private static Arbitrary<Double> notNegative() {
    return finite().map(Math::abs);
  }

  private static Arbitrary<Double> share() {
    return Arbitraries.oneOf(
        Arbitraries.of(0.0, 0.25, 0.4999), Arbitraries.doubles().between(0, 0.4999).ofScale(12));
  }

  private static Arbitrary<OptionalDouble> optional(Arbitrary<Double> values) {
    return Arbitraries.oneOf(
        Arbitraries.just(OptionalDouble.empty()), values.map(OptionalDouble::of));
  }

  /** Any text, also such as no keyboard types. */
  public static Arbitrary<String> text() {
    return Arbitraries.oneOf(
        Arbitraries.of("", "Cover", "Flansch außen", "\"</script>\\ \u2028\n\t", "\uD83D\uDD29"),
        Arbitraries.strings().ofMaxLength(12));
  }

  public static Arbitrary<Material> materials() {
    return Combinators.combine(
            text(),
            Arbitraries.of(Material.Family.class),
            positive(),
            optional(share()),
            optional(finite()))
        .as(Material::new);
  }

  public static Arbitrary<Outline> outlines() {
    return Arbitraries.oneOf(
        Arbitraries.just(Outline.WIDE),
        positive().map(Outline.Round::new),
        Combinators.combine(positive(), positive()).as(Outline.Strip::new));
  }

  public static Arbitrary<Element> elements() {
    return Combinators.combine(
            text(),
            Arbitraries.of(Element.Kind.class),
            positive(),
            positive(),
            outlines(),
            materials())
        .as(Element::new);
  }

  public static Arbitrary<ScrewThread> threads() {
    return Combinators.combine(
            text(), Arbitraries.of(ScrewThread.Form.class), positive(), positive())
        .filter((name, form, diameter, pitch) -> pitch <= diameter / 4)
        .as((name, form, diameter, pitch) -> new ScrewThread(name, form, diameter, pitch));
  }

  private static Arbitrary<Head> heads() {
    return Combinators.combine(
            Arbitraries.of(Head.Style.class),
            text(),
            positive(),
            positive(),
            positive(),
            positive())
        .as(Head::new);
  }

  private static Arbitrary<Anchor> anchors() {
    return Arbitraries.oneOf(
        Arbitraries.just(new Anchor.Tapped()),
        Combinators.combine(text(), positive(), positive(), positive()).as(Anchor.Nut::new));
  }

  private static Arbitrary<Strength> strengths() {
    return Combinators.combine(
            text(), text(), optional(positive()), optional(positive()), positive())
        .as(Strength::new);
  }

  public static Arbitrary<Fastener> fasteners() {
    Arbitrary<OptionalDouble> lengths = optional(positive());
    return Combinators.combine(
            Combinators.combine(threads(), heads(), anchors())
                .as((thread, head, anchor) -> new Object[] {thread, head, anchor}),
            lengths,
            optional(notNegative()),
            lengths,
            notNegative(),
            strengths(),
            materials())
        .as(
            (ends, length, shank, diameter, bore, strength, material) ->
                new Fastener(
                    (ScrewThread) ends[0],
                    (Head) ends[1],
                    (Anchor) ends[2],
                    length,
                    shank,
                    diameter,
                    bore,
                    strength,
                    material));
  }

  private static Arbitrary<AngleRule> angleRules(Arbitrary<Double> degrees) {
    return Arbitraries.oneOf(
        Arbitraries.of(AngleRule.FIXED_45, AngleRule.FIXED_30, AngleRule.VDI_2230),
        Combinators.combine(degrees, degrees).as(AngleRule.Typed::new));
  }

  public static Arbitrary<Method> methods() {
    return Combinators.combine(
            angleRules(finite()),
            optional(positive()),
            Arbitraries.of(StiffnessMethod.class),
            Arbitraries.of(true, false),
            Arbitraries.of(Method.ThreadArea.class))
        .as(Method::new);
  }

  /** Any joint, of up to six elements. */
  public static Arbitrary<Joint> any() {
    Arbitrary<WasherRule> rules = Arbitraries.of(WasherRule.class);
    return Combinators.combine(
            fasteners(),
            elements().list().ofMaxSize(6),
            rules,
            rules,
            methods(),
            Services.tightenings(),
            Services.services(),
            Services.criteria())
        .as(Joint::new);
  }

  /** Joints whose parts fit each other: most of them have a solution. */
  public static Arbitrary<Joint> fitting() {
    Arbitrary<Fastener> bolts =
        Combinators.combine(between(1, 80), between(1.2, 2.5), between(1.2, 2.5), anchors())
            .as(Joints::fittingBolt);
    return bolts.flatMap(
        bolt ->
            Combinators.combine(
                    fittingElements(bolt.thread().diameter()).list().ofMinSize(1).ofMaxSize(6),
                    Arbitraries.of(WasherRule.class),
                    angleRules(between(5, 60)),
                    Arbitraries.of(
                        StiffnessMethod.MID_PLANE_CYLINDERS, StiffnessMethod.FULL_FRUSTA),
                    between(0, 1e6),
                    between(-1e6, 1e6))
                .as(
                    (elements, rule, angle, method, force, axial) ->
                        new Joint(
                            bolt,
                            elements,
                            rule,
                            rule,
                            Method.USUAL.withAngle(angle).withStiffness(method),
                            Tightening.force(force),
                            Service.of(LoadCase.steady("Working load", axial, 1)),
                            Criteria.USUAL)));
  }

  private static Fastener fittingBolt(double d, double headFace, double nutFace, Anchor anchor) {
    OptionalDouble none = OptionalDouble.empty();
    boolean tapped = anchor instanceof Anchor.Tapped;
    return new Fastener(
        new ScrewThread("", ScrewThread.Form.METRIC, d, 0.15 * d),
        new Head(Head.Style.HEXAGON, "", headFace * d, d, 1.6 * d, 1.6 * d),
        tapped ? anchor : new Anchor.Nut("", nutFace * d, 0.8 * d, 1.6 * d),
        none,
        none,
        none,
        0,
        new Strength("", "", none, none, 800),
        new Material("", Material.Family.STEEL, 206_000, none, none));
  }

  private static Arbitrary<Element> fittingElements(double d) {
    Arbitrary<Outline> outlines =
        Arbitraries.oneOf(
            Arbitraries.just(Outline.WIDE),
            between(1.3, 6).map(share -> new Outline.Round(share * d)),
            Combinators.combine(between(0.7, 4), between(0.7, 4))
                .as((left, right) -> new Outline.Strip(left * d, right * d)));
    Arbitrary<Material> materials =
        between(1, 1e6)
            .map(
                modulus ->
                    new Material(
                        "",
                        Material.Family.OTHER,
                        modulus,
                        OptionalDouble.empty(),
                        OptionalDouble.empty()));
    return Combinators.combine(
            Arbitraries.of(Element.Kind.class),
            between(0.01, 10),
            between(1, 1.15),
            outlines,
            materials)
        .as(
            (kind, thickness, hole, outline, material) ->
                new Element("", kind, thickness * d, hole * d, outline, material));
  }

  private static Arbitrary<Double> between(double low, double high) {
    return Arbitraries.doubles().between(low, high).ofScale(6);
  }

  /** Any sketch. */
  public static Arbitrary<Sketch> sketches() {
    return Combinators.combine(text(), any(), Arbitraries.of(UnitSystem.class), notes())
        .as(Joints::noted);
  }

  /** Notes at an element only where the stack has it. */
  private static Sketch noted(String name, Joint joint, UnitSystem units, List<Note> notes) {
    return new Sketch(
        name,
        joint,
        units,
        notes.stream()
            .filter(
                note -> !note.part().isElement() || note.part().index() < joint.elements().size())
            .toList());
  }

  private static Arbitrary<List<Note>> notes() {
    Arbitrary<Part> parts =
        Arbitraries.of(
            Part.HEAD, Part.SHANK, Part.ANCHOR, Part.element(0), Part.element(1), Part.element(4));
    return Combinators.combine(text(), parts, finite(), finite()).as(Note::new).list().ofMaxSize(3);
  }
}

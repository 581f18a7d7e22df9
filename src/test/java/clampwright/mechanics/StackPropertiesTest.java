package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.AngleRule;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Outline;
import clampwright.joint.ScrewThread;
import clampwright.joint.StiffnessMethod;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;

/** What holds for every stack, whatever its numbers (mathematics, no source needed). */
class StackPropertiesTest {
  private static final double FACE = 16;
  private static final double HOLE = 11;
  private static final Fastener BOLT =
      Stacks.bolt(new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5), FACE, FACE, 206_000);

  @Property
  void flippedStackHasTheSameStiffness(
      @ForAll("stacks") List<Element> stack, @ForAll @DoubleRange(min = 5, max = 60) double angle) {
    List<Element> flipped = new ArrayList<>(stack);
    Collections.reverse(flipped);
    for (StiffnessMethod method : methods()) {
      double upright = Stacks.stiffness(joint(stack, angle), method);
      assertEquals(1, Stacks.stiffness(joint(flipped, angle), method) / upright, 1e-12);
    }
  }

  @Property
  void splittingALayerLeavesTheFullFrustaStiffness(
      @ForAll("stacks") List<Element> stack,
      @ForAll @DoubleRange(min = 5, max = 60) double angle,
      @ForAll @DoubleRange(min = 0.05, max = 0.95) double where) {
    for (int i = 0; i < stack.size(); i++) {
      List<Element> split = new ArrayList<>(stack);
      Element whole = split.remove(i);
      split.add(i, whole.withThickness(whole.thickness() * (1 - where)));
      split.add(i, whole.withThickness(whole.thickness() * where));
      double before = Stacks.stiffness(joint(stack, angle), StiffnessMethod.FULL_FRUSTA);
      double after = Stacks.stiffness(joint(split, angle), StiffnessMethod.FULL_FRUSTA);
      assertEquals(1, after / before, 1e-9);
    }
  }

  @Property
  void stiffeningAnElementNeverLowersTheStack(
      @ForAll("stacks") List<Element> stack,
      @ForAll @DoubleRange(min = 1, max = 50) double factor) {
    for (int i = 0; i < stack.size(); i++) {
      List<Element> stiffer = new ArrayList<>(stack);
      Element soft = stiffer.get(i);
      stiffer.set(i, soft.withMaterial(Stacks.steel(soft.material().modulus() * factor)));
      for (StiffnessMethod method : methods()) {
        assertTrue(
            Stacks.stiffness(joint(stiffer, 45), method)
                >= Stacks.stiffness(joint(stack, 45), method) * (1 - 1e-12));
      }
    }
  }

  /** 1/A is convex in z along a free cone, so one cylinder at its middle gives too little. */
  @Property
  void midPlaneIsNeverSofterForAPureCone(
      @ForAll @DoubleRange(min = 0.1, max = 200) double thickness,
      @ForAll @DoubleRange(min = 5, max = 60) double angle) {
    Slice slice = new Slice(0, 0, thickness, HOLE, Outline.WIDE, 206_000);
    double tan = Math.tan(Math.toRadians(angle));
    PressureZone cone =
        PressureZone.of(List.of(slice), FACE / 2, Double.POSITIVE_INFINITY, tan, tan);
    double middle = ZoneArea.at(cone.radiusAt(0, thickness / 2), slice);
    double cylinder = thickness / (slice.modulus() * middle);
    assertTrue(cylinder < cone.give());
  }

  /**
   * As α → 0 the zone becomes one plain cylinder: as wide as the faces, or as the narrowest edge if
   * that is narrower, since the cone from either side has to pass it.
   */
  @Property
  void withoutAngleTheZoneIsACylinder(@ForAll("stacks") List<Element> stack) {
    List<Slice> slices = Slice.of(joint(stack, 45));
    double radius = slices.stream().mapToDouble(Slice::edgeRadius).reduce(FACE / 2, Math::min);
    double expected = 0;
    for (Slice slice : slices) {
      expected += slice.thickness() / (slice.modulus() * ZoneArea.at(radius, slice));
    }
    assertEquals(1, PressureZone.of(slices, FACE / 2, FACE / 2, 0, 0).give() / expected, 1e-12);
    double almost = PressureZone.of(slices, FACE / 2, FACE / 2, 1e-9, 1e-9).give();
    assertEquals(1, almost / expected, 1e-6);
  }

  /** The mid-plane rule is the one-point rule of the integral: many thin slices approach it. */
  @Property(tries = 50)
  void manyThinSlicesApproachTheIntegral(@ForAll("stacks") List<Element> stack) {
    List<Element> thin = new ArrayList<>();
    for (Element element : stack) {
      for (int i = 0; i < 200; i++) {
        thin.add(element.withThickness(element.thickness() / 200));
      }
    }
    double cylinders = Stacks.stiffness(joint(thin, 45), StiffnessMethod.MID_PLANE_CYLINDERS);
    double integral = Stacks.stiffness(joint(stack, 45), StiffnessMethod.FULL_FRUSTA);
    assertEquals(1, cylinders / integral, 2e-3);
  }

  @Property
  void loadSharingConservesForce(
      @ForAll @DoubleRange(min = 0, max = 1e6) double preload,
      @ForAll @DoubleRange(min = -1e6, max = 1e6) double axial,
      @ForAll @DoubleRange(min = 0, max = 0.99) double loadFactor) {
    LoadSharing sharing = new LoadSharing(1e6, 1, loadFactor, Band.exact(preload), axial, axial);
    assertEquals(sharing.boltLoad(), sharing.clampLoad() + axial, 1e-6);
    assertTrue(sharing.boltLoad() >= 0 && sharing.clampLoad() >= -1e-6);
  }

  @Provide
  Arbitrary<List<Element>> stacks() {
    return layers().list().ofMinSize(1).ofMaxSize(8);
  }

  private static Arbitrary<Element> layers() {
    Arbitrary<Double> thickness = Arbitraries.doubles().between(0.2, 60);
    Arbitrary<Double> modulus = Arbitraries.doubles().between(1_000, 210_000);
    Arbitrary<Outline> wide = Arbitraries.just(Outline.WIDE);
    Arbitrary<Outline> round =
        Arbitraries.doubles().between(13, 80).map(diameter -> new Outline.Round(diameter));
    Arbitrary<Outline> strip =
        Combinators.combine(
                Arbitraries.doubles().between(6, 40), Arbitraries.doubles().between(6, 40))
            .as((left, right) -> new Outline.Strip(left, right));
    return Combinators.combine(thickness, modulus, Arbitraries.oneOf(wide, round, strip))
        .as((t, e, outline) -> Stacks.layer(t, HOLE, e, outline));
  }

  private static List<StiffnessMethod> methods() {
    return List.of(StiffnessMethod.MID_PLANE_CYLINDERS, StiffnessMethod.FULL_FRUSTA);
  }

  private static Joint joint(List<Element> stack, double angle) {
    return Stacks.joint(BOLT, new AngleRule.Typed(angle, angle), stack.toArray(new Element[0]));
  }
}

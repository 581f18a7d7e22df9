package clampwright.figure.working;

import clampwright.joint.Outline;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.Side;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * One cone from its clamp face to an element's mid-plane: the depth, the free cone, and the edge
 * that holds it or from which it starts again.
 *
 * @param found the joint
 * @param index of the element
 * @param side HEAD or NUT
 */
record ConeSteps(Found found, int index, Side side) {
  private static final double EQUAL = 1e-9;

  List<Step> steps() {
    List<Step> steps = new ArrayList<>();
    steps.add(depthStep());
    double free = face() + 2 * depth() * Math.tan(angle());
    boolean held = diameter() < free * (1 - EQUAL);
    steps.add(freeStep(free, held));
    if (held) {
      steps.add(heldStep(free));
    }
    return steps;
  }

  private Step depthStep() {
    String names = joined(i -> i == index ? found.name(i) + " / 2" : found.name(i));
    String thicknesses =
        joined(i -> length(found.finding(i).clampedThickness()) + (i == index ? " / 2" : ""));
    return new Step(
        "Depth from the " + (word().equals("lower") ? "lower face" : word() + "'s face"),
        names,
        thicknesses,
        found.numbers().lengthResult(depth()),
        Source.GEOMETRY);
  }

  private Step freeStep(double free, boolean held) {
    return new Step(
        held ? label() + ", free" : label(),
        "D_" + word() + " + 2·z·tan α",
        length(face()) + " + 2 × " + length(depth()) + " × tan " + found.numbers().angle(angle()),
        found.numbers().lengthResult(free),
        Source.CONES);
  }

  private Step heldStep(double free) {
    int holder = holder();
    double edge = edge(holder);
    if (holder == index) {
      return new Step(
          label(),
          "held to the edge of " + found.name(index) + ": min(D, D_edge)",
          "min(" + length(free) + ", " + length(edge) + ")",
          found.numbers().lengthResult(diameter()),
          Source.CONES);
    }
    return new Step(
        label(),
        "starts again from the edge of " + found.name(holder) + ": D_edge + 2·Δz·tan α",
        length(edge)
            + " + 2 × "
            + length(beyond(holder))
            + " × tan "
            + found.numbers().angle(angle()),
        found.numbers().lengthResult(diameter()),
        Source.CONES);
  }

  /** The element between face and mid-plane whose edge leaves the cone least room. */
  private int holder() {
    int tightest = index;
    for (int i : path()) {
      if (reach(i) < reach(tightest)) {
        tightest = i;
      }
    }
    return tightest;
  }

  private double reach(int holder) {
    return edge(holder) + 2 * beyond(holder) * Math.tan(angle());
  }

  /** From an element's far face to the mid-plane [mm]; 0 for the element itself. */
  private double beyond(int holder) {
    ElementFinding other = found.finding(holder);
    double middle = found.finding(index).middle();
    return Math.max(0, side == Side.HEAD ? middle - other.to() : other.from() - middle);
  }

  private double edge(int i) {
    return found.element(i).outline() instanceof Outline.Round round
        ? round.diameter()
        : Double.POSITIVE_INFINITY;
  }

  /** The elements between the clamp face and the mid-plane, in this order. */
  private int[] path() {
    boolean head = side == Side.HEAD;
    return (head
            ? IntStream.rangeClosed(0, index)
            : IntStream.iterate(found.count() - 1, i -> i >= index, i -> i - 1))
        .filter(i -> !found.finding(i).wholeWasher())
        .toArray();
  }

  private String joined(java.util.function.IntFunction<String> text) {
    List<String> texts = new ArrayList<>();
    for (int i : path()) {
      texts.add(text.apply(i));
    }
    return String.join(" + ", texts);
  }

  private double face() {
    return side == Side.HEAD ? found.zone().headFaceDiameter() : found.zone().nutFaceDiameter();
  }

  private double angle() {
    return side == Side.HEAD ? found.zone().headHalfAngle() : found.zone().nutHalfAngle();
  }

  private double depth() {
    ElementFinding finding = found.finding(index);
    return side == Side.HEAD ? finding.depthFromHead() : finding.depthFromNut();
  }

  private double diameter() {
    ElementFinding finding = found.finding(index);
    return side == Side.HEAD ? finding.headDiameter() : finding.nutDiameter();
  }

  private String length(double millimetres) {
    return found.numbers().length(millimetres);
  }

  private String word() {
    return side == Side.HEAD ? "head" : found.joint().fastener().isTapped() ? "lower" : "nut";
  }

  private String label() {
    return side == Side.HEAD ? "Head's cone" : word().equals("nut") ? "Nut's cone" : "Lower cone";
  }
}

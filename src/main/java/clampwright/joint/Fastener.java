package clampwright.joint;

import java.util.Objects;
import java.util.OptionalDouble;

/**
 * The bolt and what it is screwed into.
 *
 * @param thread its thread
 * @param head its head
 * @param anchor nut or tapped hole
 * @param length nominal length under the head [mm]; empty = the next standard length that fits
 * @param shankLength length of the plain shank [mm]; empty = length less standard thread length
 * @param shankDiameter diameter of the plain shank [mm]; empty = thread diameter
 * @param bore diameter of a lengthwise bore [mm]; 0 for a solid bolt
 * @param strength strength class
 * @param material its elastic material
 */
public record Fastener(
    ScrewThread thread,
    Head head,
    Anchor anchor,
    OptionalDouble length,
    OptionalDouble shankLength,
    OptionalDouble shankDiameter,
    double bore,
    Strength strength,
    Material material) {

  public Fastener {
    Objects.requireNonNull(thread, "thread");
    Objects.requireNonNull(head, "head");
    Objects.requireNonNull(anchor, "anchor");
    length.ifPresent(value -> Check.positive("bolt length", "mm", value));
    shankLength.ifPresent(value -> Check.notNegative("shank length", "mm", value));
    shankDiameter.ifPresent(value -> Check.positive("shank diameter", "mm", value));
    Check.notNegative("bore", "mm", bore);
    Objects.requireNonNull(strength, "strength");
    Objects.requireNonNull(material, "material");
  }

  public boolean isTapped() {
    return anchor instanceof Anchor.Tapped;
  }

  /** The shank's diameter in force [mm]. */
  public double plainDiameter() {
    return shankDiameter.orElse(thread.diameter());
  }

  public Fastener withThread(ScrewThread thread) {
    return new Fastener(
        thread, head, anchor, length, shankLength, shankDiameter, bore, strength, material);
  }

  public Fastener withHead(Head head) {
    return new Fastener(
        thread, head, anchor, length, shankLength, shankDiameter, bore, strength, material);
  }

  public Fastener withAnchor(Anchor anchor) {
    return new Fastener(
        thread, head, anchor, length, shankLength, shankDiameter, bore, strength, material);
  }

  public Fastener withLength(OptionalDouble length) {
    return new Fastener(
        thread, head, anchor, length, shankLength, shankDiameter, bore, strength, material);
  }

  public Fastener withShankLength(OptionalDouble shankLength) {
    return new Fastener(
        thread, head, anchor, length, shankLength, shankDiameter, bore, strength, material);
  }

  public Fastener withShankDiameter(OptionalDouble shankDiameter) {
    return new Fastener(
        thread, head, anchor, length, shankLength, shankDiameter, bore, strength, material);
  }

  public Fastener withBore(double bore) {
    return new Fastener(
        thread, head, anchor, length, shankLength, shankDiameter, bore, strength, material);
  }

  public Fastener withStrength(Strength strength) {
    return new Fastener(
        thread, head, anchor, length, shankLength, shankDiameter, bore, strength, material);
  }

  public Fastener withMaterial(Material material) {
    return new Fastener(
        thread, head, anchor, length, shankLength, shankDiameter, bore, strength, material);
  }
}

package clampwright.joint;

import java.util.Objects;

/**
 * One clamped part of the stack: a layer or a washer.
 *
 * @param name as the reader calls it; may be empty
 * @param kind what it is
 * @param thickness along the bolt axis [mm], above 0
 * @param hole hole diameter [mm], above 0; ignored in a tapped last layer, whose hole is the thread
 * @param outline its edge
 * @param material what it is made of
 */
public record Element(
    String name, Kind kind, double thickness, double hole, Outline outline, Material material) {

  /** What an element is: washers follow the washer rule when they touch the head or the nut. */
  public enum Kind {
    WASHER,
    LAYER
  }

  public Element {
    Objects.requireNonNull(name, "name");
    Objects.requireNonNull(kind, "kind");
    Check.positive("thickness", "mm", thickness);
    Check.positive("hole", "mm", hole);
    Objects.requireNonNull(outline, "outline");
    Objects.requireNonNull(material, "material");
  }

  public boolean isWasher() {
    return kind == Kind.WASHER;
  }

  public Element withName(String name) {
    return new Element(name, kind, thickness, hole, outline, material);
  }

  public Element withThickness(double thickness) {
    return new Element(name, kind, thickness, hole, outline, material);
  }

  public Element withHole(double hole) {
    return new Element(name, kind, thickness, hole, outline, material);
  }

  public Element withOutline(Outline outline) {
    return new Element(name, kind, thickness, hole, outline, material);
  }

  public Element withMaterial(Material material) {
    return new Element(name, kind, thickness, hole, outline, material);
  }
}

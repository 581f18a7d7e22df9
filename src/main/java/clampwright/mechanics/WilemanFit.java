package clampwright.mechanics;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Material;
import clampwright.mechanics.MemberStiffness.Why;
import java.util.List;
import java.util.Optional;

/**
 * The exponential fit of Wileman, Choudhury, Green (1991): k_m/(E·d) = A·exp(B·d/l).
 *
 * <p>Constants partly from memory: steel 0.78715, 0.62873; aluminium 0.79670, 0.63816; copper
 * 0.79568, 0.63553; grey cast iron 0.77871, 0.61616; any material 0.78952, 0.62914.
 *
 * @param a the factor A
 * @param b the exponent's B
 */
public record WilemanFit(double a, double b) {
  private static final double TOLERANCE = 0.10 + 1e-9;

  /** The constants for a material's family. */
  public static WilemanFit of(Material.Family family) {
    return switch (family) {
      case STEEL -> new WilemanFit(0.78715, 0.62873);
      case ALUMINIUM -> new WilemanFit(0.79670, 0.63816);
      case COPPER -> new WilemanFit(0.79568, 0.63553);
      case GREY_IRON -> new WilemanFit(0.77871, 0.61616);
      case OTHER -> new WilemanFit(0.78952, 0.62914);
    };
  }

  /**
   * k_m [N/mm].
   *
   * @param modulus E [MPa]
   * @param diameter d of the bolt [mm]
   * @param length l of the clamped stack [mm]
   */
  public double stiffness(double modulus, double diameter, double length) {
    return modulus * diameter * a * Math.exp(b * diameter / length);
  }

  /**
   * Why the fit does not hold for a joint; empty when it does: one material, no edge in the zone,
   * faces about 1.5 d and holes about d, both within 10 %.
   */
  static Optional<Why> obstacle(
      Joint joint, ClampFaces faces, List<Slice> slices, boolean edgesReached) {
    if (faces.headWhole() || faces.nutWhole()) {
      return Optional.of(Why.WHOLE_WASHER);
    }
    if (!oneMaterial(joint.elements())) {
      return Optional.of(Why.SEVERAL_MATERIALS);
    }
    if (edgesReached) {
      return Optional.of(Why.EDGES_REACHED);
    }
    double d = joint.fastener().thread().diameter();
    if (!about(faces.headDiameter(), 1.5 * d) || !about(faces.nutDiameter(), 1.5 * d)) {
      return Optional.of(Why.FACE_NOT_USUAL);
    }
    for (Slice slice : slices) {
      if (!about(slice.hole(), d)) {
        return Optional.of(Why.HOLE_NOT_USUAL);
      }
    }
    return Optional.empty();
  }

  private static boolean oneMaterial(List<Element> elements) {
    Material first = elements.get(0).material();
    for (Element element : elements) {
      if (element.material().modulus() != first.modulus()
          || element.material().family() != first.family()) {
        return false;
      }
    }
    return true;
  }

  private static boolean about(double value, double usual) {
    return Math.abs(value - usual) <= TOLERANCE * usual;
  }
}

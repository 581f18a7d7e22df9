package clampwright.joint;

import java.util.Objects;

/**
 * A bolt head.
 *
 * @param style its shape
 * @param standard where its size comes from; "own size" when typed
 * @param bearingDiameter diameter d_w of the bearing face [mm], above 0
 * @param height [mm], above 0
 * @param width across flats of a hexagon, outside diameter of a socket head [mm], above 0
 * @param rim outside diameter of the flange [mm]; equal to the width where there is no flange
 */
public record Head(
    Style style, String standard, double bearingDiameter, double height, double width, double rim) {

  /** Head shapes; the end-piece length of the bolt depends on it. */
  public enum Style {
    HEXAGON,
    SOCKET,
    FLANGE
  }

  public Head {
    Objects.requireNonNull(style, "style");
    Objects.requireNonNull(standard, "standard");
    Check.positive("bearing face diameter", "mm", bearingDiameter);
    Check.positive("head height", "mm", height);
    Check.positive("head width", "mm", width);
    Check.positive("flange diameter", "mm", rim);
  }

  public Head withBearingDiameter(double bearingDiameter) {
    return new Head(style, standard, bearingDiameter, height, width, rim);
  }
}

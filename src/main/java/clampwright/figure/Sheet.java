package clampwright.figure;

/**
 * Where the stack lies on a sheet.
 *
 * @param width of the sheet [mm]
 * @param height of the sheet [mm]
 * @param scale sheet mm per mm of the joint, above 0
 * @param axisX x of the bolt axis on the sheet [mm]
 * @param headY y of the face under the head on the sheet [mm]
 */
public record Sheet(double width, double height, double scale, double axisX, double headY) {
  public Sheet {
    if (!(width > 0 && height > 0 && scale > 0)) {
      throw new IllegalArgumentException("a sheet has a size and a scale above 0");
    }
  }

  /** Sheet x of a signed distance from the axis, positive to the right. */
  public double x(double fromAxis) {
    return axisX + fromAxis * scale;
  }

  /** Sheet y of a position z under the head. */
  public double y(double z) {
    return headY + z * scale;
  }

  /** Signed distance from the axis at a sheet x [mm of the joint]. */
  public double fromAxis(double x) {
    return (x - axisX) / scale;
  }

  /** Position z under the head at a sheet y [mm of the joint]. */
  public double z(double y) {
    return (y - headY) / scale;
  }

  /** The same sheet zoomed by a factor about a point that stays where it is. */
  public Sheet zoomed(double factor, Point about) {
    return new Sheet(
        width,
        height,
        scale * factor,
        about.x() + (axisX - about.x()) * factor,
        about.y() + (headY - about.y()) * factor);
  }

  /** The same sheet moved by a distance on it. */
  public Sheet panned(double dx, double dy) {
    return new Sheet(width, height, scale, axisX + dx, headY + dy);
  }
}

package clampwright.mechanics;

import clampwright.joint.Anchor;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Joint;
import clampwright.joint.ScrewThread;

/**
 * The lengths of the bolt in force, typed or by standard.
 *
 * @param length nominal length under the head [mm]
 * @param shankLength length of the plain shank [mm], 0 for a bolt threaded to the head
 */
record BoltLength(double length, double shankLength) {
  private static final double INCH = 25.4;

  /** Nominal lengths of metric bolts up to 200 mm (ISO 888, from memory); every 20 mm beyond. */
  private static final double[] METRIC = {
    6, 8, 10, 12, 16, 20, 25, 30, 35, 40, 45, 50, 55, 60, 65, 70, 80, 90, 100, 110, 120, 130, 140,
    150, 160, 180, 200
  };

  static BoltLength of(Joint joint) {
    Fastener fastener = joint.fastener();
    double length =
        fastener.length().orElseGet(() -> nextStandard(fastener.thread(), least(joint)));
    double shank =
        fastener
            .shankLength()
            .orElseGet(() -> Math.max(0, length - threadLength(fastener, length)));
    return new BoltLength(length, Math.min(shank, length));
  }

  /**
   * The least length that fits: grip + nut height + 2 pitches; in a tapped hole one diameter of
   * engagement (common practice, no source).
   */
  private static double least(Joint joint) {
    Fastener fastener = joint.fastener();
    return fastener.anchor() instanceof Anchor.Nut nut
        ? joint.stackThickness() + nut.height() + 2 * fastener.thread().pitch()
        : aboveTappedLayer(joint) + fastener.thread().diameter();
  }

  /** Thickness of everything above a tapped last layer [mm]; 0 for an empty stack. */
  static double aboveTappedLayer(Joint joint) {
    int count = joint.elements().size();
    return count == 0 ? 0 : joint.stackThickness() - joint.elements().get(count - 1).thickness();
  }

  /**
   * Next standard length at or above a least one [mm]. Inch bolts: every 1/4 in up to 5 in, then
   * every 1/2 in (common practice, no source).
   */
  static double nextStandard(ScrewThread thread, double least) {
    double enough = least - 1e-9;
    if (thread.form() == ScrewThread.Form.UNIFIED) {
      double step = enough <= 5 * INCH ? INCH / 4 : INCH / 2;
      return Math.ceil(enough / step) * step;
    }
    for (double length : METRIC) {
      if (length >= enough) {
        return length;
      }
    }
    return Math.ceil(enough / 20) * 20;
  }

  /**
   * Standard thread length [mm]: ISO 4014 2d + 6 up to 125, 2d + 12 up to 200, 2d + 25 beyond; ISO
   * 4762 2d + 12; ASME B18.2.1 2D + 1/4 in up to 6 in, 2D + 1/2 in beyond; ASME B18.3 2D + 1/2 in.
   */
  static double threadLength(Fastener fastener, double length) {
    double twice = 2 * fastener.thread().diameter();
    boolean socket = fastener.head().style() == Head.Style.SOCKET;
    if (fastener.thread().form() == ScrewThread.Form.UNIFIED) {
      return twice + (socket || length > 6 * INCH + 1e-9 ? INCH / 2 : INCH / 4);
    }
    if (socket) {
      return twice + 12;
    }
    return twice + (length <= 125 ? 6 : length <= 200 ? 12 : 25);
  }
}

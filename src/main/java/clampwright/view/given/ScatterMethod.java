package clampwright.view.given;

import clampwright.joint.Scatter;

/** Ways of tightening with the scatter that practice counts for them. */
enum ScatterMethod {
  DRY_TORQUE("torque, unlubricated", "", 0.35),
  LUBRICATED_TORQUE("torque, lubricated", "", 0.25),
  TENSIONER("hydraulic tensioner", "", 0.15),
  WASHER("indicating washer", "load-", 0.1),
  ELONGATION("bolt elongation", "", 0.05),
  TYPED("typed", "", Double.NaN);

  private static final double SAME = 1e-9;

  private final String label;
  private final String before;
  private final double share;

  ScatterMethod(String label, String before, double share) {
    this.label = label;
    this.before = before;
    this.share = share;
  }

  String label() {
    return label;
  }

  /** As listed, in full and with the scatter. */
  String listed() {
    return this == TYPED ? label : before + label + ", ±" + Math.round(share * 100) + " %";
  }

  String origin() {
    return this == TYPED ? "" : "list in NASA practice, second-hand";
  }

  Scatter scatter() {
    return new Scatter.PlusMinus(share);
  }

  /** The method whose scatter this is; typed where it is nobody's. */
  static ScatterMethod of(Scatter scatter) {
    for (ScatterMethod method : values()) {
      boolean same = Math.abs(method.share - scatter.share()) < SAME;
      if (same && scatter instanceof Scatter.PlusMinus) {
        return method;
      }
    }
    return TYPED;
  }
}

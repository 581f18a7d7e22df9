package clampwright.mechanics.checks;

import clampwright.joint.Allowables;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.ScrewThread;
import clampwright.mechanics.Torque;

/**
 * What the bolt bears. NaN stands for what is not known inside this package; it never leaves it.
 *
 * @param area stress area less the bore [mm²]
 * @param ultimate P_u = min(R_m·A_s, stripping load), or typed [N]
 * @param yieldLoad P_y = R_p0.2·A_s, or typed [N]; NaN where unknown
 * @param yield R_p0.2 [MPa]; NaN where unknown
 * @param threadArm torque in the thread per newton of preload [mm]; NaN without friction
 * @param plasticSection π(d_s³ − b³)/12 [mm³]
 * @param elasticSection π(d_s⁴ − b⁴)/(16 d_s) [mm³]
 */
public record BoltLimits(
    double area,
    double ultimate,
    double yieldLoad,
    double yield,
    double threadArm,
    double plasticSection,
    double elasticSection) {

  /** The limits of a joint's bolt. */
  public static BoltLimits of(Joint joint, Stripping stripping) {
    Fastener fastener = joint.fastener();
    ScrewThread thread = fastener.thread();
    Allowables typed = joint.criteria().allowables();
    double bore = fastener.bore();
    double area = area(fastener);
    double d = (thread.pitchDiameter() + thread.minorDiameter()) / 2;
    double yield = fastener.strength().yield().orElse(Double.NaN);
    double rupture = fastener.strength().tensile() * area;
    return new BoltLimits(
        area,
        typed.ultimate().orElse(Math.min(rupture, stripping.load())),
        typed.yield().orElse(yield * area),
        yield,
        joint.tightening().frictionInThread().isPresent()
            ? Torque.threadArm(thread, joint.tightening().frictionInThread().getAsDouble())
            : Double.NaN,
        Math.PI * (d * d * d - bore * bore * bore) / 12,
        Math.PI * (Math.pow(d, 4) - Math.pow(bore, 4)) / (16 * d));
  }

  /** Stress area less the bore [mm²]. */
  static double area(Fastener fastener) {
    return fastener.thread().stressArea() - Math.PI / 4 * fastener.bore() * fastener.bore();
  }
}

package clampwright.joint;

import java.util.OptionalDouble;

/**
 * Typed limits of the bolt that stand instead of those of its strength class.
 *
 * @param ultimate P_u [N]; empty = R_m·A_s, or the stripping load where that is less
 * @param yield P_y [N]; empty = R_p0.2·A_s
 * @param shear shear strength τ_u [MPa]; empty = 0.6·R_m
 * @param amplitude endurable stress amplitude [MPa]; empty = by the fatigue rule
 */
public record Allowables(
    OptionalDouble ultimate, OptionalDouble yield, OptionalDouble shear, OptionalDouble amplitude) {
  public static final Allowables OF_STRENGTH_CLASS =
      new Allowables(
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty());

  public Allowables {
    ultimate.ifPresent(value -> Check.positive("ultimate load", "N", value));
    yield.ifPresent(value -> Check.positive("yield load", "N", value));
    shear.ifPresent(value -> Check.positive("shear strength", "MPa", value));
    amplitude.ifPresent(value -> Check.positive("endurable amplitude", "MPa", value));
  }

  public Allowables withUltimate(OptionalDouble ultimate) {
    return new Allowables(ultimate, yield, shear, amplitude);
  }

  public Allowables withYield(OptionalDouble yield) {
    return new Allowables(ultimate, yield, shear, amplitude);
  }

  public Allowables withShear(OptionalDouble shear) {
    return new Allowables(ultimate, yield, shear, amplitude);
  }

  public Allowables withAmplitude(OptionalDouble amplitude) {
    return new Allowables(ultimate, yield, shear, amplitude);
  }
}

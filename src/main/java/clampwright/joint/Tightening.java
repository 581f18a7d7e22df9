package clampwright.joint;

import java.util.Objects;
import java.util.OptionalDouble;

/**
 * How the bolt is tightened and what is lost afterwards.
 *
 * @param target what is given at assembly
 * @param scatter of the assembly preload
 * @param threadFriction μ in the thread for the bolt's torsion, where the target does not name it;
 *     empty where unknown
 * @param embedment settling of the surfaces
 * @param relaxation share ρ of the least assembly preload that is lost with time [–], 0 … 1
 * @param creep a further share lost to creep [–], 0 … 1
 */
public record Tightening(
    Target target,
    Scatter scatter,
    OptionalDouble threadFriction,
    Embedment embedment,
    double relaxation,
    double creep) {

  public Tightening {
    Objects.requireNonNull(target, "target");
    Objects.requireNonNull(scatter, "scatter");
    threadFriction.ifPresent(value -> Check.positive("friction in the thread", "", value));
    Objects.requireNonNull(embedment, "embedment");
    Check.between("relaxation", 0, relaxation, 1);
    Check.between("creep", 0, creep, 1);
  }

  /** A plain force without scatter or losses [N]. */
  public static Tightening force(double force) {
    return new Tightening(
        new Target.Force(force), Scatter.NONE, OptionalDouble.empty(), Embedment.NONE, 0, 0);
  }

  /** Friction in the thread, from the target or given beside it [–]. */
  public OptionalDouble frictionInThread() {
    return target instanceof Target.FrictionTorque torque
        ? OptionalDouble.of(torque.threadFriction())
        : threadFriction;
  }

  public Tightening withTarget(Target target) {
    return new Tightening(target, scatter, threadFriction, embedment, relaxation, creep);
  }

  public Tightening withScatter(Scatter scatter) {
    return new Tightening(target, scatter, threadFriction, embedment, relaxation, creep);
  }

  public Tightening withThreadFriction(OptionalDouble threadFriction) {
    return new Tightening(target, scatter, threadFriction, embedment, relaxation, creep);
  }

  public Tightening withEmbedment(Embedment embedment) {
    return new Tightening(target, scatter, threadFriction, embedment, relaxation, creep);
  }

  public Tightening withRelaxation(double relaxation) {
    return new Tightening(target, scatter, threadFriction, embedment, relaxation, creep);
  }

  public Tightening withCreep(double creep) {
    return new Tightening(target, scatter, threadFriction, embedment, relaxation, creep);
  }
}

package clampwright.joint;

/** What is given when the bolt is tightened. */
public sealed interface Target {

  /**
   * The preload itself.
   *
   * @param force [N], 0 or more
   */
  record Force(double force) implements Target {
    public Force {
      Check.notNegative("preload", "N", force);
    }
  }

  /**
   * A share of the proof load, proof strength times stress area.
   *
   * @param fraction [–], 0 … 1
   */
  record ProofFraction(double fraction) implements Target {
    public ProofFraction {
      Check.between("share of the proof load", 0, fraction, 1);
    }
  }

  /**
   * A torque and a nut factor, F = T/(K·d).
   *
   * @param torque T [N·mm], 0 or more
   * @param nutFactor K [–], above 0
   */
  record NutFactorTorque(double torque, double nutFactor) implements Target {
    public NutFactorTorque {
      Check.notNegative("torque", "N·mm", torque);
      Check.positive("nut factor", "", nutFactor);
    }
  }

  /**
   * A torque and the friction in the thread and under the turned face.
   *
   * @param torque T [N·mm], 0 or more
   * @param threadFriction μ in the thread [–], above 0
   * @param faceFriction μ under the head or nut that is turned [–], above 0
   */
  record FrictionTorque(double torque, double threadFriction, double faceFriction)
      implements Target {
    public FrictionTorque {
      Check.notNegative("torque", "N·mm", torque);
      Check.positive("friction in the thread", "", threadFriction);
      Check.positive("friction under the head", "", faceFriction);
    }
  }
}

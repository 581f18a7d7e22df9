package clampwright.joint;

/** How far the assembly preload strays to either side of what was aimed at. */
public sealed interface Scatter {

  Scatter NONE = new PlusMinus(0);

  /** The share s by which it strays, F_0 = F_nom·(1 ± s) [–]. */
  double share();

  /**
   * Plus or minus a share.
   *
   * @param share s [–], 0 or more and below 1
   */
  record PlusMinus(double share) implements Scatter {
    public PlusMinus {
      Check.notNegative("scatter", "", share);
      if (share >= 1) {
        throw Check.refused("scatter", "", share, "must be below 1");
      }
    }
  }

  /**
   * The tightening factor, greatest over least preload (VDI 2230-1).
   *
   * @param factor α_A [–], 1 or more
   */
  record TighteningFactor(double factor) implements Scatter {
    public TighteningFactor {
      Check.finite("tightening factor", "", factor);
      if (factor < 1) {
        throw Check.refused("tightening factor", "", factor, "must be 1 or more");
      }
    }

    /** s = (α_A − 1)/(α_A + 1). */
    @Override
    public double share() {
      return (factor - 1) / (factor + 1);
    }
  }
}

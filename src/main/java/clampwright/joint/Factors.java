package clampwright.joint;

/**
 * The factors that loads are multiplied by in the checks; all 1 until the user sets them.
 *
 * @param fitting FF, on every load [–]
 * @param ultimate FS against rupture [–]
 * @param yield FS against yield [–]
 * @param parting FS against parting [–]
 * @param slip FS against slip [–]
 */
public record Factors(double fitting, double ultimate, double yield, double parting, double slip) {
  public static final Factors NONE = new Factors(1, 1, 1, 1, 1);

  public Factors {
    Check.positive("fitting factor", "", fitting);
    Check.positive("factor against rupture", "", ultimate);
    Check.positive("factor against yield", "", yield);
    Check.positive("factor against parting", "", parting);
    Check.positive("factor against slip", "", slip);
  }

  public Factors withFitting(double fitting) {
    return new Factors(fitting, ultimate, yield, parting, slip);
  }

  public Factors withUltimate(double ultimate) {
    return new Factors(fitting, ultimate, yield, parting, slip);
  }

  public Factors withYield(double yield) {
    return new Factors(fitting, ultimate, yield, parting, slip);
  }

  public Factors withParting(double parting) {
    return new Factors(fitting, ultimate, yield, parting, slip);
  }

  public Factors withSlip(double slip) {
    return new Factors(fitting, ultimate, yield, parting, slip);
  }
}

package clampwright.mechanics;

import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import clampwright.joint.Material;
import clampwright.joint.Service;
import clampwright.joint.TemperatureCase;
import clampwright.joint.Tightening;
import java.util.ArrayList;
import java.util.List;

/**
 * The preload from tightening to service. What the parts' stiffness decides – settling and
 * temperature – is kept as a length and becomes a force with the series stiffness k_b·k_m/(k_b +
 * k_m) of a method.
 *
 * @param nominal preload aimed at, F_nom [N]
 * @param share scatter s [–]
 * @param embedment settling of the surfaces f_Z [mm]
 * @param lost share of the least assembly preload lost to relaxation and creep [–]
 * @param mismatches free expansion of members over bolt in each temperature case; empty where an
 *     expansion is not known
 */
public record Preload(
    double nominal, double share, double embedment, double lost, List<Mismatch> mismatches) {

  /** A temperature case as seen by a load that may meet any. */
  public static final int ANY = -1;

  /** The temperature at assembly. */
  public static final int ROOM = -2;

  /**
   * How much longer the members would grow than the bolt if both were free.
   *
   * @param name of the temperature case
   * @param length Σ α_i·t_i·ΔT_i − α_b·l·ΔT_b [mm]; positive clamps harder
   */
  public record Mismatch(String name, double length) {}

  public Preload {
    mismatches = List.copyOf(mismatches);
  }

  static Preload of(Joint joint, double nominal, List<ElementFinding> findings) {
    Tightening tightening = joint.tightening();
    int faces = joint.fastener().isTapped() ? 1 : 2;
    int interfaces = joint.elements().size() - 1;
    return new Preload(
        nominal,
        tightening.scatter().share(),
        Embedding.amount(tightening.embedment(), faces, interfaces),
        Math.min(1, tightening.relaxation() + tightening.creep()),
        mismatches(joint, findings));
  }

  private static List<Mismatch> mismatches(Joint joint, List<ElementFinding> findings) {
    Service service = joint.service();
    if (service.temperatures().isEmpty() || !isExpansionKnown(joint)) {
      return List.of();
    }
    double members = 0;
    double grip = 0;
    for (int i = 0; i < findings.size(); i++) {
      double thickness = findings.get(i).clampedThickness();
      members += joint.elements().get(i).material().expansion().orElseThrow() * thickness;
      grip += thickness;
    }
    double bolt = joint.fastener().material().expansion().orElseThrow() * grip;
    List<Mismatch> mismatches = new ArrayList<>();
    for (TemperatureCase state : service.temperatures()) {
      double length =
          members * (state.members() - service.assembly())
              - bolt * (state.bolt() - service.assembly());
      mismatches.add(new Mismatch(state.name(), length));
    }
    return mismatches;
  }

  private static boolean isExpansionKnown(Joint joint) {
    Fastener fastener = joint.fastener();
    return fastener.material().expansion().isPresent()
        && joint.elements().stream()
            .map(Element::material)
            .map(Material::expansion)
            .allMatch(java.util.OptionalDouble::isPresent);
  }

  /** The temperature case that a load meets; ANY where it names none, or one that is gone. */
  public int state(LoadCase load) {
    for (int i = 0; i < mismatches.size(); i++) {
      if (load.temperature().isPresent()
          && load.temperature().get().equals(mismatches.get(i).name())) {
        return i;
      }
    }
    return ANY;
  }

  /** Least preload at assembly, F_nom·(1 − s) [N]. */
  public double assemblyMin() {
    return nominal * (1 - share);
  }

  /** Greatest preload at assembly, F_nom·(1 + s) [N]. */
  public double assemblyMax() {
    return nominal * (1 + share);
  }

  /** Loss to settling F_Z = f_Z·k_b·k_m/(k_b + k_m) [N]. */
  public double settling(double series) {
    return embedment * series;
  }

  /** Loss to relaxation and creep, a share of the least assembly preload [N]. */
  public double relaxed() {
    return lost * assemblyMin();
  }

  /** Change in a temperature case ΔF = mismatch·k_b·k_m/(k_b + k_m) [N]; 0 at assembly. */
  public double thermal(double series, int state) {
    return state < 0 ? 0 : mismatches.get(state).length() * series;
  }

  /** Greatest change over the temperature cases and the assembly temperature [N], 0 or more. */
  public double thermalMax(double series) {
    double most = 0;
    for (int i = 0; i < mismatches.size(); i++) {
      most = Math.max(most, thermal(series, i));
    }
    return most;
  }

  /** Least change over the temperature cases and the assembly temperature [N], 0 or less. */
  public double thermalMin(double series) {
    double least = 0;
    for (int i = 0; i < mismatches.size(); i++) {
      least = Math.min(least, thermal(series, i));
    }
    return least;
  }

  /**
   * Least preload in service, F_0,min less all losses, plus the temperature's change [N]; not above
   * 0 means loose.
   */
  public double min(double series, int state) {
    double thermal = state == ANY ? thermalMin(series) : thermal(series, state);
    return assemblyMin() - relaxed() - settling(series) + thermal;
  }

  /**
   * Greatest preload in service, F_0,max plus the temperature's change; no loss is credited [N].
   */
  public double max(double series, int state) {
    double thermal = state == ANY ? thermalMax(series) : thermal(series, state);
    return assemblyMax() + thermal;
  }

  /**
   * The preload in service.
   *
   * @param series k_b·k_m/(k_b + k_m) [N/mm]
   * @param state index of a temperature case, ROOM, or ANY for the envelope of all; the nominal of
   *     the envelope is that at assembly temperature
   */
  public Band inService(double series, int state) {
    double losses = relaxed() + settling(series);
    double nominal = this.nominal - losses + (state == ANY ? 0 : thermal(series, state));
    return new Band(min(series, state), nominal, max(series, state));
  }
}

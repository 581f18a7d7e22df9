package clampwright.joint;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;

/**
 * What the joint meets in service.
 *
 * @param assembly temperature at which it is tightened [°C]
 * @param temperatures states of service besides the one of assembly; may be empty
 * @param loads load cases, at least one
 */
public record Service(double assembly, List<TemperatureCase> temperatures, List<LoadCase> loads) {

  /** Room temperature [°C] (common practice, no source). */
  public static final double ROOM = 20;

  public Service {
    Check.temperature("temperature at assembly", assembly);
    temperatures = List.copyOf(temperatures);
    loads = List.copyOf(loads);
    if (loads.isEmpty()) {
      throw new IllegalArgumentException("a joint has a load case, if only one of no load");
    }
  }

  /** One load case at room temperature. */
  public static Service of(LoadCase load) {
    return new Service(ROOM, List.of(), List.of(load));
  }

  public Service withAssembly(double assembly) {
    return new Service(assembly, temperatures, loads);
  }

  public Service withTemperatures(List<TemperatureCase> temperatures) {
    return new Service(assembly, temperatures, loads);
  }

  public Service withTemperature(int index, UnaryOperator<TemperatureCase> change) {
    return withTemperatures(changed(temperatures, index, change));
  }

  public Service withLoads(List<LoadCase> loads) {
    return new Service(assembly, temperatures, loads);
  }

  public Service withLoad(int index, UnaryOperator<LoadCase> change) {
    return withLoads(changed(loads, index, change));
  }

  private static <T> List<T> changed(List<T> list, int index, UnaryOperator<T> change) {
    List<T> changed = new ArrayList<>(list);
    changed.set(index, change.apply(changed.get(index)));
    return changed;
  }
}

package clampwright.joint;

import java.util.Objects;

/**
 * One state of service in which bolt and members are warmer or colder than at assembly.
 *
 * @param name as the reader calls it
 * @param members temperature of every part of the stack [°C]
 * @param bolt temperature of the bolt [°C]
 */
public record TemperatureCase(String name, double members, double bolt) {
  public TemperatureCase {
    Objects.requireNonNull(name, "name");
    Check.temperature("temperature of the members", members);
    Check.temperature("temperature of the bolt", bolt);
  }

  public TemperatureCase withName(String name) {
    return new TemperatureCase(name, members, bolt);
  }

  public TemperatureCase withMembers(double members) {
    return new TemperatureCase(name, members, bolt);
  }

  public TemperatureCase withBolt(double bolt) {
    return new TemperatureCase(name, members, bolt);
  }
}

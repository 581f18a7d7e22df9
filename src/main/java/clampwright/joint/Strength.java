package clampwright.joint;

import java.util.Objects;
import java.util.OptionalDouble;

/**
 * The strength class of a bolt.
 *
 * @param standard such as ISO 898-1
 * @param grade such as 8.8
 * @param proof proof strength [MPa]; empty where the source gives none
 * @param yield yield or 0.2 % proof stress [MPa]; empty where the source gives none
 * @param tensile tensile strength R_m [MPa], above 0
 */
public record Strength(
    String standard, String grade, OptionalDouble proof, OptionalDouble yield, double tensile) {
  public Strength {
    Objects.requireNonNull(standard, "standard");
    Objects.requireNonNull(grade, "grade");
    proof.ifPresent(value -> Check.positive("proof strength", "MPa", value));
    yield.ifPresent(value -> Check.positive("yield strength", "MPa", value));
    Check.positive("tensile strength", "MPa", tensile);
  }
}

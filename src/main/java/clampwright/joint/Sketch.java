package clampwright.joint;

import clampwright.quantity.UnitSystem;
import java.util.Objects;
import java.util.function.UnaryOperator;

/**
 * The document: a joint with what belongs to its presentation.
 *
 * @param name of the sketch, as it stands above the drawing
 * @param joint what is sketched
 * @param units in which the reader sees it; the joint itself never changes with them
 */
public record Sketch(String name, Joint joint, UnitSystem units) {
  public Sketch {
    Objects.requireNonNull(name, "name");
    Objects.requireNonNull(joint, "joint");
    Objects.requireNonNull(units, "units");
  }

  public Sketch withName(String name) {
    return new Sketch(name, joint, units);
  }

  public Sketch withJoint(Joint joint) {
    return new Sketch(name, joint, units);
  }

  public Sketch withJoint(UnaryOperator<Joint> change) {
    return withJoint(change.apply(joint));
  }

  public Sketch withUnits(UnitSystem units) {
    return new Sketch(name, joint, units);
  }
}

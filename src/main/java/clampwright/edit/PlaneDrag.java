package clampwright.edit;

import clampwright.joint.Introduction;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import java.util.Optional;

/**
 * The part at whose mid-plane the load enters or leaves; where n was typed, the other end goes to
 * the last part.
 *
 * @param start sketch taken hold of
 * @param loadCase index of the load case
 * @param enters whether it is where the load enters, nearer the head
 */
record PlaneDrag(Sketch start, int loadCase, boolean enters) implements Drag {

  static Optional<Drag> of(Sketch sketch, int loadCase, boolean enters) {
    return sketch.joint().elements().isEmpty()
        ? Optional.empty()
        : Optional.of(new PlaneDrag(sketch, loadCase, enters));
  }

  private int last() {
    return start.joint().elements().size() - 1;
  }

  private Introduction.Planes planes() {
    return start.joint().service().loads().get(loadCase).introduction()
            instanceof Introduction.Planes planes
        ? planes
        : new Introduction.Planes(0, last());
  }

  @Override
  public Dragged at(double fromAxis, double z, Snap snap) {
    int found = 0;
    for (int i = 1; i <= last(); i++) {
      if (z >= Interfaces.position(start.joint(), i)) {
        found = i;
      }
    }
    return moved(found);
  }

  /** Puts it at a part counted from 1 at the head. */
  @Override
  public Dragged set(double value) {
    return moved((int) value - 1);
  }

  private Dragged moved(int to) {
    Introduction.Planes planes = planes();
    Introduction.Planes changed =
        enters
            ? new Introduction.Planes(Math.min(to, planes.lower()), planes.lower())
            : new Introduction.Planes(planes.upper(), Math.max(to, planes.upper()));
    int at = enters ? changed.upper() : changed.lower();
    return new Dragged(
        start.withJoint(
            joint ->
                joint.withService(
                    joint.service().withLoad(loadCase, load -> load.withIntroduction(changed)))),
        Part.LOAD,
        enters ? "load enters at" : "load leaves at",
        Dimension.RATIO,
        at + 1,
        Names.of(start.joint(), Part.element(at)),
        "Move load");
  }

  @Override
  public Optional<String> problem(double value) {
    boolean whole = value == Math.rint(value) && value >= 1 && value <= last() + 1;
    return whole
        ? Optional.empty()
        : Optional.of("The part is a whole number from 1 to " + (last() + 1) + ".");
  }

  @Override
  public Dimension dimension() {
    return Dimension.RATIO;
  }
}

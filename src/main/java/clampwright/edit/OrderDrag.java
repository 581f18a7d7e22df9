package clampwright.edit;

import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import java.util.Optional;

/**
 * The body of an element that changes places with its neighbours when its mid-plane passes theirs.
 *
 * @param start sketch taken hold of
 * @param part the element
 * @param grab where it was taken hold of
 */
record OrderDrag(Sketch start, Part part, Grab grab) implements Drag {

  static Drag of(Sketch sketch, Part part, Grab grab) {
    return new OrderDrag(sketch, part, grab);
  }

  @Override
  public Dragged at(double fromAxis, double z, Snap snap) {
    Joint joint = start.joint();
    int from = part.index();
    double middle = Interfaces.middle(joint, from) + z - grab.z();
    int to = 0;
    for (int i = 0; i < joint.elements().size(); i++) {
      boolean passed = i < from ? middle >= Interfaces.middle(joint, i) : passedBelow(i, middle);
      to += i != from && passed ? 1 : 0;
    }
    return moved(to);
  }

  private boolean passedBelow(int index, double middle) {
    return middle > Interfaces.middle(start.joint(), index);
  }

  /** Puts it at a place counted from 1 at the head. */
  @Override
  public Dragged set(double value) {
    return moved((int) value - 1);
  }

  private Dragged moved(int to) {
    Change change = Stacking.moved(start, part.index(), to);
    boolean stays = to == part.index();
    return new Dragged(
        stays ? start : change.sketch(),
        change.then(),
        "place",
        Dimension.RATIO,
        to + 1,
        (to + 1) + " of " + count(),
        change.name());
  }

  private int count() {
    return start.joint().elements().size();
  }

  @Override
  public Optional<String> problem(double value) {
    boolean whole = value == Math.rint(value);
    return whole && value >= 1 && value <= count()
        ? Optional.empty()
        : Optional.of("The place is a whole number from 1 to " + count() + ".");
  }

  @Override
  public Dimension dimension() {
    return Dimension.RATIO;
  }
}

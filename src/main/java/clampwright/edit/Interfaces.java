package clampwright.edit;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import java.util.List;

/** Positions of the interfaces of a stack, and where a press means to insert. */
public final class Interfaces {
  private Interfaces() {}

  /** z of the face of an element towards the head; for the number of elements, of the last face. */
  public static double position(Joint joint, int index) {
    double z = 0;
    for (Element element : joint.elements().subList(0, index)) {
      z += element.thickness();
    }
    return z;
  }

  /** z of the mid-plane of an element. */
  static double middle(Joint joint, int index) {
    return position(joint, index) + joint.elements().get(index).thickness() / 2;
  }

  /**
   * The interface at which a new layer drawn from here comes in: the nearest one that does not part
   * a washer from the head or nut it belongs to.
   */
  public static int nearest(Joint joint, double z) {
    int count = joint.elements().size();
    int from = leadingWashers(joint.elements());
    int to = count - trailingWashers(joint.elements());
    if (from > to) { // nothing but washers
      from = Math.min(1, count);
      to = Math.max(from, count - 1);
    }
    int nearest = from;
    for (int i = from + 1; i <= to; i++) {
      boolean nearer = Math.abs(position(joint, i) - z) < Math.abs(position(joint, nearest) - z);
      nearest = nearer ? i : nearest;
    }
    return nearest;
  }

  private static int leadingWashers(List<Element> elements) {
    int count = 0;
    while (count < elements.size() && elements.get(count).isWasher()) {
      count++;
    }
    return count;
  }

  private static int trailingWashers(List<Element> elements) {
    int count = 0;
    while (count < elements.size() && elements.get(elements.size() - 1 - count).isWasher()) {
      count++;
    }
    return count;
  }

  /** The interface at the head side of a part; the last one for anything below the stack. */
  public static int above(Joint joint, Part part) {
    int count = joint.elements().size();
    return part.isElement() ? Math.min(part.index(), count) : count;
  }

  /** The end of the stack that a position is nearer to. */
  public static End end(Joint joint, double z) {
    return z <= joint.stackThickness() / 2 ? End.HEAD : End.NUT;
  }
}

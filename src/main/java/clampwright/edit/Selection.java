package clampwright.edit;

import clampwright.joint.Element;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import java.util.List;
import java.util.function.Supplier;
import javafx.beans.property.SimpleObjectProperty;

/** The selected part. Whatever it is set to, it never points at an element that is not there. */
final class Selection extends SimpleObjectProperty<Part> {
  private final Supplier<Sketch> sketch;

  Selection(Object bean, Supplier<Sketch> sketch) {
    super(bean, "selection", Part.JOINT);
    this.sketch = sketch;
  }

  @Override
  public void set(Part part) {
    super.set(part != null && exists(part, sketch.get()) ? part : Part.JOINT);
  }

  static boolean exists(Part part, Sketch sketch) {
    if (part.isNote()) {
      return part.index() < sketch.notes().size();
    }
    return !part.isElement() || part.index() < sketch.joint().elements().size();
  }

  /**
   * Where a part has got to in a changed sketch: the same element at its new place; where it was
   * itself changed, the one at its place; where it is gone, the one that has moved up into its
   * place, or the last; {@link Part#JOINT} in an empty stack.
   */
  static Part followed(Part part, Sketch from, Sketch to) {
    if (!part.isElement()) {
      return part;
    }
    List<Element> before = from.joint().elements();
    List<Element> after = to.joint().elements();
    if (after.isEmpty()) {
      return Part.JOINT;
    }
    int at = nearest(after, before.get(part.index()), part.index());
    return Part.element(at >= 0 ? at : Math.min(part.index(), after.size() - 1));
  }

  /** The place of the very same element nearest to where it was; −1 when it is gone. */
  private static int nearest(List<Element> elements, Element element, int place) {
    int found = -1;
    for (int i = 0; i < elements.size(); i++) {
      boolean same = elements.get(i) == element;
      if (same && (found < 0 || Math.abs(i - place) < Math.abs(found - place))) {
        found = i;
      }
    }
    return found;
  }
}

package clampwright.edit;

import clampwright.joint.Element;
import clampwright.joint.Introduction;
import clampwright.joint.Joint;
import clampwright.joint.LoadCase;
import java.util.List;
import java.util.function.IntUnaryOperator;

/** A changed stack, in which the loads stay with the elements that they were drawn at. */
final class Restacking {
  private Restacking() {}

  /**
   * The joint with other elements.
   *
   * @param place where an element of the old stack lies in the new one; for one that is gone, where
   *     its load goes
   */
  static Joint of(Joint joint, List<Element> elements, IntUnaryOperator place) {
    List<LoadCase> loads =
        joint.service().loads().stream()
            .map(load -> load.withIntroduction(moved(load.introduction(), place, elements.size())))
            .toList();
    return joint.withElements(elements).withService(joint.service().withLoads(loads));
  }

  private static Introduction moved(Introduction introduction, IntUnaryOperator place, int count) {
    if (introduction instanceof Introduction.Planes planes && count > 0) {
      int one = Math.min(count - 1, place.applyAsInt(planes.upper()));
      int other = Math.min(count - 1, place.applyAsInt(planes.lower()));
      return new Introduction.Planes(Math.min(one, other), Math.max(one, other));
    }
    return introduction;
  }
}

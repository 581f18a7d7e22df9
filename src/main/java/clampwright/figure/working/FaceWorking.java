package clampwright.figure.working;

import clampwright.joint.Part;
import clampwright.mechanics.Side;
import java.util.ArrayList;
import java.util.List;

/**
 * The working of a clamp face and the cone that fans from it: washer rule, diameter, half-angle.
 *
 * @param found the joint
 * @param side HEAD or NUT
 */
record FaceWorking(Found found, Side side) {

  Working working() {
    boolean tapped = found.joint().fastener().isTapped();
    List<Step> steps = new ArrayList<>(new FaceSteps(found, side).decision());
    if (side == Side.NUT && tapped) {
      steps.add(new TappedSteps(found).depth());
    }
    steps.add(new FaceSteps(found, side).face());
    steps.addAll(new AngleSteps(found).inForce(side));
    Part part = side == Side.HEAD ? Part.HEAD : Part.ANCHOR;
    steps.addAll(found.notices(part::equals));
    String title = side == Side.HEAD ? "Head's" : tapped ? "Lower" : "Nut's";
    return new Working(title + " clamp face and cone", steps);
  }
}

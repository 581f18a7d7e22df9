package clampwright.figure.working;

import clampwright.figure.Sentences;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.LoadSharing;
import clampwright.mechanics.Notice;
import clampwright.mechanics.Zone;
import java.util.List;
import java.util.function.Predicate;

/**
 * A joint with what it comes to: what every working starts from.
 *
 * @param joint as given
 * @param solved what it comes to
 * @param numbers in the reader's units
 * @param loadCase index of the load case that is worked out
 */
record Found(Joint joint, Solved solved, Numbers numbers, int loadCase) {

  LoadSharing sharing() {
    return solved.cases().get(loadCase);
  }

  /** The temperature state that the load case meets. */
  int state() {
    return solved.preload().state(joint.service().loads().get(loadCase));
  }

  Element element(int index) {
    return joint.elements().get(index);
  }

  ElementFinding finding(int index) {
    return solved.elements().get(index);
  }

  int count() {
    return solved.elements().size();
  }

  Zone zone() {
    return solved.zone();
  }

  String name(int index) {
    return PartNames.element(joint, index);
  }

  /** The notices about such parts, as remarks. */
  List<Step> notices(Predicate<Part> concerned) {
    return solved.notices().stream()
        .filter(notice -> concerned.test(notice.part()))
        .map(this::remark)
        .toList();
  }

  private Step remark(Notice notice) {
    return Step.remark("Note: " + PartNames.of(notice.part(), joint), Sentences.notice(notice), "");
  }
}

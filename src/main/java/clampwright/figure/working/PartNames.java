package clampwright.figure.working;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Part;

/** What the parts are called in a working. */
final class PartNames {
  private PartNames() {}

  static String of(Part part, Joint joint) {
    return switch (part.kind()) {
      case JOINT -> "Joint";
      case HEAD -> "Head";
      case SHANK -> "Bolt";
      case ANCHOR -> joint.fastener().isTapped() ? "Tapped hole" : "Nut";
      case HEAD_CONE -> "Head's cone";
      case NUT_CONE -> joint.fastener().isTapped() ? "Lower cone" : "Nut's cone";
      case LOAD -> "Load";
      case PRELOAD -> "Preload";
      case NOTE -> "Note";
      case ELEMENT -> element(joint, part.index());
    };
  }

  /** Its name, or its place where it has none. */
  static String element(Joint joint, int index) {
    Element element = joint.elements().get(index);
    String kind = element.isWasher() ? "Washer " : "Layer ";
    return element.name().isBlank() ? kind + (index + 1) : element.name().strip();
  }
}

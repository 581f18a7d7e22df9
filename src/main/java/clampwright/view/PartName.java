package clampwright.view;

import clampwright.edit.Names;
import clampwright.joint.Joint;
import clampwright.joint.Part;

/** What the parts of a joint are called at the head of a line. */
public final class PartName {
  private PartName() {}

  /** A part's name; empty for the joint as a whole or a part that is not there. */
  public static String of(Part part, Joint joint) {
    if (part.equals(Part.JOINT) || part.index() >= joint.elements().size()) {
      return "";
    }
    String name = Names.of(joint, part);
    return Character.toUpperCase(name.charAt(0)) + name.substring(1);
  }

  /** A sentence with the name of the part it is about before it. */
  public static String before(String name, String sentence) {
    return name.isEmpty() ? sentence : name + ": " + sentence;
  }
}

package clampwright.view.section;

import clampwright.edit.Names;
import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;

/** The drawing in words, for whoever cannot see it. */
final class Description {
  private Description() {}

  static String of(Sketch sketch, Part selected) {
    Joint joint = sketch.joint();
    StringBuilder text = new StringBuilder("Section of " + sketch.name() + ". ");
    text.append(joint.fastener().thread().designation()).append(" bolt through ");
    text.append(joint.elements().isEmpty() ? "nothing yet" : "");
    for (int i = 0; i < joint.elements().size(); i++) {
      Element element = joint.elements().get(i);
      text.append(i == 0 ? "" : ", ")
          .append(Names.of(joint, Part.element(i)))
          .append(" ")
          .append(Quantities.trimmedText(Dimension.LENGTH, sketch.units(), element.thickness()));
    }
    text.append(".");
    return selected.equals(Part.JOINT)
        ? text.toString()
        : text + " Selected: " + Names.of(joint, selected) + ".";
  }
}

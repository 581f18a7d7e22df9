package clampwright.app;

import clampwright.joint.Joint;
import clampwright.joint.Part;

/** Names a part for somebody who sees no drawing. */
final class Places {
  private Places() {}

  /**
   * Such as {@code layer 3 'Cover'}, counted from the head, washers too; empty for the joint as a
   * whole.
   */
  static String of(Part part, Joint joint) {
    return switch (part.kind()) {
      case JOINT -> "";
      case ELEMENT -> layer(part.index(), joint.elements().get(part.index()).name());
      case HEAD -> "head";
      case SHANK -> "bolt";
      case ANCHOR -> joint.fastener().isTapped() ? "tapped hole" : "nut";
      case HEAD_CONE -> "head's cone";
      case NUT_CONE -> "nut's cone";
      case LOAD -> "load";
      case PRELOAD -> "preload";
      case NOTE -> "note";
    };
  }

  /** A sentence with its place in front. */
  static String told(Part part, Joint joint, String sentence) {
    String place = of(part, joint);
    return place.isEmpty() ? sentence : place + ": " + sentence;
  }

  private static String layer(int index, String name) {
    String place = "layer " + (index + 1);
    return name.isBlank() ? place : place + " '" + oneLine(name) + "'";
  }

  /** A name as part of a line; a file may hold line ends in it. */
  static String oneLine(String name) {
    return name.replaceAll("\\R|\\p{Cntrl}", " ");
  }
}

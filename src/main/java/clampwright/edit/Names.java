package clampwright.edit;

import clampwright.joint.Element;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/** Names of parts, given to new ones and used in the names of steps. */
public final class Names {
  private Names() {}

  /** What a part is called in a sentence: its name, or its place where it has none. */
  public static String of(Joint joint, Part part) {
    return switch (part.kind()) {
      case JOINT -> "joint";
      case HEAD -> "head";
      case SHANK -> "bolt";
      case ANCHOR -> joint.fastener().isTapped() ? "tapped hole" : "nut";
      case HEAD_CONE -> "head's cone";
      case NUT_CONE -> "nut's cone";
      case LOAD -> "load";
      case PRELOAD -> "preload";
      case NOTE -> "note";
      case ELEMENT -> of(joint.elements().get(part.index()), part.index());
    };
  }

  private static String of(Element element, int index) {
    String kind = element.isWasher() ? "washer " : "layer ";
    return element.name().isBlank() ? kind + (index + 1) : element.name();
  }

  /** The first of "Layer 1", "Layer 2", … that is not taken, from the number of layers upwards. */
  static String forLayer(List<Element> elements) {
    long layers = elements.stream().filter(element -> !element.isWasher()).count();
    return free(elements, "Layer ", layers + 1);
  }

  /** "Washer", else the first of "Washer 2", … that is not taken. */
  static String forWasher(List<Element> elements) {
    return taken(elements).contains("Washer") ? free(elements, "Washer ", 2) : "Washer";
  }

  /** "Cover 2" for a copy of "Cover"; a copy of a part without a name has none either. */
  static String forCopy(List<Element> elements, String name) {
    return name.isBlank() ? name : free(elements, name.replaceFirst(" \\d+$", "") + " ", 2);
  }

  private static String free(List<Element> elements, String stem, long from) {
    Set<String> taken = taken(elements);
    long number = from;
    while (taken.contains(stem + number)) {
      number++;
    }
    return stem + number;
  }

  private static Set<String> taken(List<Element> elements) {
    return elements.stream().map(Element::name).collect(Collectors.toSet());
  }
}

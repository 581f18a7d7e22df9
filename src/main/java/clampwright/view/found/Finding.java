package clampwright.view.found;

import clampwright.figure.working.Headline;
import clampwright.mechanics.Assessment.Solved;
import clampwright.quantity.Dimension;
import java.util.function.ToDoubleFunction;

/** The numbers that a joint comes to. */
enum Finding {
  MEMBERS(
      "Members  k",
      "m",
      "Member stiffness",
      Dimension.STIFFNESS,
      solved -> solved.sharing().memberStiffness()),
  BOLT("Bolt  k", "b", "Bolt stiffness", Dimension.STIFFNESS, solved -> solved.bolt().stiffness()),
  LOAD_FACTOR(
      "Load factor  Φ",
      "",
      "Load factor",
      Dimension.RATIO,
      solved -> solved.sharing().loadFactor()),
  PARTING_LOAD(
      "Parts at", "", "Parting load", Dimension.FORCE, solved -> solved.sharing().partingLoad()),
  BOLT_LOAD("Bolt load", "", "Bolt load", Dimension.FORCE, solved -> solved.sharing().boltLoad()),
  CLAMP_LOAD(
      "Clamp load", "", "Clamp load", Dimension.FORCE, solved -> solved.sharing().clampLoad());

  private final String label;
  private final String index;
  private final String title;
  private final Dimension dimension;
  private final ToDoubleFunction<Solved> value;

  Finding(
      String label,
      String index,
      String title,
      Dimension dimension,
      ToDoubleFunction<Solved> value) {
    this.label = label;
    this.index = index;
    this.title = title;
    this.dimension = dimension;
    this.value = value;
  }

  /** As it stands above the number. */
  String label() {
    return label;
  }

  /** The subscript of its symbol; may be empty. */
  String index() {
    return index;
  }

  /** Its name in words. */
  String title() {
    return title;
  }

  Dimension dimension() {
    return dimension;
  }

  /** What its working is filed under. */
  Headline headline() {
    return Headline.valueOf(name());
  }

  double of(Solved solved) {
    return value.applyAsDouble(solved);
  }

  /** The id of its readout. */
  String id() {
    return "found-" + name().toLowerCase(java.util.Locale.ROOT).replace('_', '-');
  }
}

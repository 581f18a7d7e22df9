package clampwright.view.found;

import clampwright.figure.working.Headline;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.LoadSharing;
import clampwright.quantity.Dimension;
import java.util.function.ToDoubleBiFunction;

/** The numbers that a joint comes to. */
enum Finding {
  MEMBERS(
      "Members  k",
      "m",
      "Member stiffness",
      Dimension.STIFFNESS,
      (solved, sharing) -> sharing.memberStiffness()),
  BOLT(
      "Bolt  k",
      "b",
      "Bolt stiffness",
      Dimension.STIFFNESS,
      (solved, sharing) -> solved.bolt().stiffness()),
  LOAD_FACTOR(
      "Load factor  Φ",
      "",
      "Load factor",
      Dimension.RATIO,
      (solved, sharing) -> sharing.loadFactor()),
  PARTING_LOAD(
      "Parts at, least",
      "",
      "Parting load",
      Dimension.FORCE,
      (solved, sharing) -> sharing.partingLoad()),
  BOLT_LOAD(
      "Bolt load, most", "", "Bolt load", Dimension.FORCE, (solved, sharing) -> sharing.boltLoad()),
  CLAMP_LOAD(
      "Clamp load, least",
      "",
      "Clamp load",
      Dimension.FORCE,
      (solved, sharing) -> sharing.clampLoad());

  private final String label;
  private final String index;
  private final String title;
  private final Dimension dimension;
  private final ToDoubleBiFunction<Solved, LoadSharing> value;

  Finding(
      String label,
      String index,
      String title,
      Dimension dimension,
      ToDoubleBiFunction<Solved, LoadSharing> value) {
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

  /** Its value in a load case. */
  double of(Solved solved, int loadCase) {
    return value.applyAsDouble(solved, solved.cases().get(loadCase));
  }

  /** The id of its readout. */
  String id() {
    return "found-" + name().toLowerCase(java.util.Locale.ROOT).replace('_', '-');
  }
}

package clampwright.figure;

import java.util.EnumSet;
import java.util.Set;

/** What a picture can show besides the parts themselves. */
public enum Show {
  /** Both cones, the clamp faces and what each side governs. */
  CONES("cones", "pressure cones"),
  CYLINDERS("cylinders", "effective cylinders"),
  GOVERNING("governing", "governing marks"),
  DIMENSIONS("dimensions", "dimensions"),
  NAMES("names", "names of parts"),
  FORCES("forces", "load and preload"),
  READOUTS("readouts", "readouts"),
  LADDER("ladder", "load ladder"),
  DIAGRAM("diagram", "joint diagram");

  /** What a picture shows unless asked otherwise. */
  public static final Set<Show> USUAL =
      EnumSet.of(CONES, CYLINDERS, GOVERNING, DIMENSIONS, NAMES, FORCES);

  private final String word;
  private final String title;

  Show(String word, String title) {
    this.word = word;
    this.title = title;
  }

  /** For the command line. */
  public String word() {
    return word;
  }

  /** For a reader. */
  public String title() {
    return title;
  }

  /** Whether a mark of the section is drawn when these are shown. */
  static boolean isShown(Role role, Set<Show> shown) {
    return switch (role) {
      case HEAD_FACE,
          NUT_FACE,
          HEAD_CONE,
          NUT_CONE,
          HEAD_CONE_FAINT,
          NUT_CONE_FAINT,
          HEAD_GOVERNS,
          NUT_GOVERNS,
          BOTH_GOVERN ->
          shown.contains(CONES);
      case EFFECTIVE_CYLINDER -> shown.contains(CYLINDERS);
      case HEAD_MARK, NUT_MARK, BOTH_MARK -> shown.contains(GOVERNING);
      case DIMENSION -> shown.contains(DIMENSIONS);
      case NAME, SUBNAME -> shown.contains(NAMES);
      case LEADER -> shown.contains(DIMENSIONS) || shown.contains(NAMES);
      case LOAD, LOAD_FOOT, PRELOAD -> shown.contains(FORCES);
      default -> true;
    };
  }
}

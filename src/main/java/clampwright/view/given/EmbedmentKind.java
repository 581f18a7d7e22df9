package clampwright.view.given;

import clampwright.joint.Embedment;

/** Where the amount of settling comes from. */
enum EmbedmentKind {
  NONE("none"),
  TYPED("typed"),
  FINE("Rz < 10 µm"),
  MEDIUM("Rz 10–40 µm"),
  COARSE("Rz 40–160 µm");

  private static final String SOURCE = "VDI 2230-1 table 5, from memory";

  private final String label;

  EmbedmentKind(String label) {
    this.label = label;
  }

  String label() {
    return label;
  }

  boolean isRoughness() {
    return this != NONE && this != TYPED;
  }

  String origin() {
    return isRoughness() ? SOURCE : "";
  }

  static EmbedmentKind of(Embedment embedment) {
    if (embedment instanceof Embedment.FromRoughness rough) {
      return switch (rough.roughness()) {
        case FINE -> FINE;
        case MEDIUM -> MEDIUM;
        case COARSE -> COARSE;
      };
    }
    return embedment.equals(Embedment.NONE) ? NONE : TYPED;
  }

  /** Settling of this kind, sheared as before; there is no amount to a typed one. */
  Embedment in(Embedment before) {
    boolean sheared = before instanceof Embedment.FromRoughness rough && rough.sheared();
    return switch (this) {
      case NONE, TYPED -> Embedment.NONE;
      case FINE -> new Embedment.FromRoughness(Embedment.Roughness.FINE, sheared);
      case MEDIUM -> new Embedment.FromRoughness(Embedment.Roughness.MEDIUM, sheared);
      case COARSE -> new Embedment.FromRoughness(Embedment.Roughness.COARSE, sheared);
    };
  }
}

package clampwright.figure.working;

import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Method.ThreadArea;
import clampwright.joint.ScrewThread;
import clampwright.mechanics.BoltStiffness.Kind;
import clampwright.mechanics.BoltStiffness.Piece;

/** Area and length of one spring of the bolt, in symbols and with the numbers put in. */
record BoltSpringText(Found found, Piece piece) {

  String areaFormula() {
    String circle =
        switch (piece.kind()) {
          case HEAD, NUT, TAPPED_THREAD -> "π/4·d²";
          case SHANK -> "π/4·d_s²";
          case THREAD_IN_GRIP, ENGAGED_THREAD ->
              isStressArea() ? "A_s = π/4·" + thread("d", "P") + "²" : "A_d3 = π/4·" + core() + "²";
        };
    return isHollow() ? circle + " − π/4·d_i²" : circle;
  }

  String area() {
    String d = length(fastener().thread().diameter());
    String p = length(fastener().thread().pitch());
    String circle =
        switch (piece.kind()) {
          case HEAD, NUT, TAPPED_THREAD -> d + "²";
          case SHANK -> length(fastener().plainDiameter()) + "²";
          case THREAD_IN_GRIP, ENGAGED_THREAD ->
              "(%s − %s × %s)²".formatted(d, isStressArea() ? reduction() : "1.226869", p);
        };
    return isHollow()
        ? "π / 4 × (" + circle + " − " + length(fastener().bore()) + "²)"
        : "π / 4 × " + circle;
  }

  String lengthFormula() {
    return switch (piece.kind()) {
      case HEAD, ENGAGED_THREAD, NUT, TAPPED_THREAD -> share() + "·d";
      case SHANK -> "shank in the grip";
      case THREAD_IN_GRIP -> "grip − shank";
    };
  }

  String length() {
    return switch (piece.kind()) {
      case HEAD, ENGAGED_THREAD, NUT, TAPPED_THREAD ->
          "(" + share() + " × " + length(fastener().thread().diameter()) + ")";
      case SHANK, THREAD_IN_GRIP -> length(piece.length());
    };
  }

  String source() {
    return switch (piece.kind()) {
      case HEAD, NUT, TAPPED_THREAD, ENGAGED_THREAD -> Source.VDI;
      case SHANK -> Source.ELASTIC_BAR;
      case THREAD_IN_GRIP ->
          !isStressArea() ? "core area, ISO 724" : isUnified() ? "ASME B1.1" : "ISO 898-1";
    };
  }

  /** The end piece as a share of d (VDI 2230-1, from memory). */
  private String share() {
    return switch (piece.kind()) {
      case HEAD -> fastener().head().style() == Head.Style.SOCKET ? "0.4" : "0.5";
      case ENGAGED_THREAD -> "0.5";
      case TAPPED_THREAD -> "0.33";
      default -> "0.4";
    };
  }

  private boolean isStressArea() {
    return piece.kind() == Kind.THREAD_IN_GRIP
        && found.joint().method().threadArea() == ThreadArea.STRESS_AREA;
  }

  /** Nut and tapped thread give way around the bolt: a bore does not matter to them. */
  private boolean isHollow() {
    boolean around = piece.kind() == Kind.NUT || piece.kind() == Kind.TAPPED_THREAD;
    return fastener().bore() > 0 && !around;
  }

  private String thread(String d, String p) {
    return "(" + d + " − " + reduction() + "·" + p + ")";
  }

  private static String core() {
    return "(d − 1.226869·P)";
  }

  private String reduction() {
    return isUnified() ? "0.974279" : "0.938194";
  }

  private boolean isUnified() {
    return fastener().thread().form() == ScrewThread.Form.UNIFIED;
  }

  private Fastener fastener() {
    return found.joint().fastener();
  }

  private String length(double millimetres) {
    return found.numbers().length(millimetres);
  }
}

package clampwright.mechanics;

import clampwright.joint.Anchor;
import clampwright.joint.Element;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Joint;
import clampwright.joint.Method.ThreadArea;
import clampwright.mechanics.BoltStiffness.Kind;
import clampwright.mechanics.BoltStiffness.Piece;
import java.util.ArrayList;
import java.util.List;

/**
 * The bolt as springs in series, 1/k_b = Σ l_i/(E·A_i) (Shigley eq. 8-17 without the end pieces;
 * end pieces by VDI 2230-1, from memory: hexagon head 0.5 d, socket head 0.4 d, engaged thread 0.5
 * d on A_d3, nut 0.4 d, tapped thread 0.33 d).
 */
final class BoltSprings {
  private BoltSprings() {}

  static BoltStiffness of(Joint joint, BoltLength lengths) {
    double grip = grip(joint);
    List<Piece> pieces = new ArrayList<>(6);
    boolean ends = joint.method().endsCounted();
    if (ends) {
      pieces.add(head(joint.fastener()));
    }
    addGrip(pieces, joint, lengths, grip);
    if (ends) {
      pieces.add(engagedThread(joint.fastener()));
      pieces.add(anchor(joint));
    }
    double give = 0;
    for (Piece piece : pieces) {
      give += piece.length() / (piece.modulus() * piece.area());
    }
    return new BoltStiffness(
        1 / give,
        pieces,
        lengths.length(),
        lengths.shankLength(),
        grip,
        engagement(joint, lengths));
  }

  /**
   * Length over which the bolt stretches [mm]: the stack; in a tapped joint down to the tapped
   * surface with the ends counted, else to the virtual face (Shigley's effective grip).
   */
  static double grip(Joint joint) {
    if (!joint.fastener().isTapped()) {
      return joint.stackThickness();
    }
    double above = BoltLength.aboveTappedLayer(joint);
    boolean ends = joint.method().endsCounted() && above > 0;
    return ends ? above : above + Slice.virtualDepth(joint);
  }

  private static void addGrip(List<Piece> pieces, Joint joint, BoltLength lengths, double grip) {
    Fastener fastener = joint.fastener();
    double modulus = fastener.material().modulus();
    double shank = Math.min(lengths.shankLength(), grip);
    if (shank > 0) {
      double area = hollow(fastener, circle(fastener.plainDiameter()));
      pieces.add(new Piece(Kind.SHANK, shank, area, modulus));
    }
    if (grip > shank) {
      boolean stress = joint.method().threadArea() == ThreadArea.STRESS_AREA;
      double solid = stress ? fastener.thread().stressArea() : fastener.thread().minorArea();
      pieces.add(new Piece(Kind.THREAD_IN_GRIP, grip - shank, hollow(fastener, solid), modulus));
    }
  }

  private static Piece head(Fastener fastener) {
    double share = fastener.head().style() == Head.Style.SOCKET ? 0.4 : 0.5;
    double d = fastener.thread().diameter();
    return new Piece(
        Kind.HEAD, share * d, hollow(fastener, circle(d)), fastener.material().modulus());
  }

  private static Piece engagedThread(Fastener fastener) {
    return new Piece(
        Kind.ENGAGED_THREAD,
        0.5 * fastener.thread().diameter(),
        hollow(fastener, fastener.thread().minorArea()),
        fastener.material().modulus());
  }

  /** Nut or tapped thread, on the nominal area: there the part around the bolt gives way. */
  private static Piece anchor(Joint joint) {
    double d = joint.fastener().thread().diameter();
    if (joint.fastener().isTapped()) {
      Element tapped = joint.elements().get(joint.elements().size() - 1);
      return new Piece(Kind.TAPPED_THREAD, 0.33 * d, circle(d), tapped.material().modulus());
    }
    return new Piece(Kind.NUT, 0.4 * d, circle(d), joint.fastener().material().modulus());
  }

  private static double engagement(Joint joint, BoltLength lengths) {
    if (joint.fastener().anchor() instanceof Anchor.Nut nut) {
      return Math.min(nut.height(), lengths.length() - joint.stackThickness());
    }
    double layer = joint.elements().get(joint.elements().size() - 1).thickness();
    return Math.min(layer, lengths.length() - BoltLength.aboveTappedLayer(joint));
  }

  private static double circle(double diameter) {
    return Math.PI / 4 * diameter * diameter;
  }

  private static double hollow(Fastener fastener, double solid) {
    return solid - circle(fastener.bore());
  }
}

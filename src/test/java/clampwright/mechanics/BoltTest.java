package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.AngleRule;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Joint;
import clampwright.joint.Method;
import clampwright.joint.ScrewThread;
import clampwright.mechanics.BoltStiffness.Kind;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BoltTest {
  private static final double E = 205_000;
  private static final ScrewThread M10 = new ScrewThread("M10", ScrewThread.Form.METRIC, 10, 1.5);
  private static final Fastener BOLT = Stacks.bolt(M10, 16, 16, E);

  /** Thread lengths: ISO 4014 2d + 6, 2d + 12, 2d + 25; ISO 4762 2d + 12. */
  @ParameterizedTest
  @CsvSource({
    "HEXAGON, 60, 26", "HEXAGON, 125, 26", "HEXAGON, 130, 32", "HEXAGON, 200, 32",
    "HEXAGON, 220, 45", "SOCKET, 60, 32", "SOCKET, 160, 32", "FLANGE, 60, 26",
  })
  void metricThreadLength(Head.Style style, double length, double expected) {
    assertEquals(expected, BoltLength.threadLength(styled(BOLT, style), length), 1e-12);
  }

  /** Thread lengths: ASME B18.2.1 2D + 1/4 in to 6 in, then 2D + 1/2 in; B18.3 2D + 1/2 in. */
  @ParameterizedTest
  @CsvSource({"HEXAGON, 3, 1.25", "HEXAGON, 6, 1.25", "HEXAGON, 7, 1.5", "SOCKET, 3, 1.5"})
  void inchThreadLength(Head.Style style, double length, double expected) {
    ScrewThread half = new ScrewThread("1/2-13 UNC", ScrewThread.Form.UNIFIED, 12.7, 25.4 / 13);
    Fastener bolt = styled(Stacks.bolt(half, 19, 19, E), style);
    assertEquals(expected * 25.4, BoltLength.threadLength(bolt, length * 25.4), 1e-9);
  }

  /** Least length = grip + nut height + 2 P = 40 + 8 + 3 = 51, so 55 (ISO 888, from memory). */
  @Test
  void automaticLength() {
    Joint joint = Stacks.joint(BOLT, AngleRule.FIXED_45, Stacks.layer(40, 11, E));
    BoltStiffness bolt = Stacks.solved(joint).bolt();
    assertEquals(55, bolt.length());
    assertEquals(29, bolt.shankLength());
    assertEquals(8, bolt.engagement());
  }

  /** Tapped: grip above + 1 d = 25 + 10 = 35 is itself a standard length. */
  @Test
  void automaticLengthTapped() {
    BoltStiffness bolt = Stacks.solved(tapped(true)).bolt();
    assertEquals(35, bolt.length());
    assertEquals(10, bolt.engagement());
  }

  /**
   * Series by hand, M10: head 5 mm on 78.5398 mm², shank 29 on 78.5398, thread 11 on A_s 57.9896,
   * engaged 5 on A_d3 52.2923, nut 4 on 78.5398 (end pieces by VDI 2230-1, from memory): Σ l/A =
   * 0.0636620 + 0.3692396 + 0.1896892 + 0.0956164 + 0.0509296 = 0.7691366 /mm.
   */
  @Test
  void endsCounted() {
    Joint joint = Stacks.joint(BOLT, AngleRule.FIXED_45, Stacks.layer(40, 11, E));
    assertEquals(E / 0.7691365620, Stacks.solved(joint).bolt().stiffness(), 0.01);
  }

  /** Without the ends: Shigley eq. 8-17, A_d A_t E/(A_d l_t + A_t l_d). */
  @Test
  void endsNotCounted() {
    Joint joint =
        Stacks.joint(BOLT, AngleRule.FIXED_45, Stacks.layer(40, 11, E))
            .withMethod(Method.USUAL.withEndsCounted(false));
    double plain = Math.PI / 4 * 100;
    double stress = M10.stressArea();
    double expected = plain * stress * E / (plain * 11 + stress * 29);
    assertEquals(expected, Stacks.solved(joint).bolt().stiffness(), 1e-6);
  }

  /** A bore takes its area from every spring of the bolt, not from the nut. */
  @Test
  void hollow() {
    Fastener fastener = BOLT.withBore(4).withShankLength(OptionalDouble.of(0));
    Joint joint = Stacks.joint(fastener, AngleRule.FIXED_45, Stacks.layer(40, 11, E));
    double bore = Math.PI / 4 * 16;
    BoltStiffness bolt = Stacks.solved(joint).bolt();
    assertFalse(bolt.pieces().stream().anyMatch(piece -> piece.kind() == Kind.SHANK));
    assertEquals(M10.stressArea() - bore, piece(bolt, Kind.THREAD_IN_GRIP).area(), 1e-9);
    assertEquals(Math.PI / 4 * 100, piece(bolt, Kind.NUT).area(), 1e-9);
  }

  @Test
  void neckedShank() {
    Fastener fastener = BOLT.withShankDiameter(OptionalDouble.of(7.5));
    Joint joint = Stacks.joint(fastener, AngleRule.FIXED_45, Stacks.layer(40, 11, E));
    BoltStiffness bolt = Stacks.solved(joint).bolt();
    assertEquals(Math.PI / 4 * 56.25, piece(bolt, Kind.SHANK).area(), 1e-9);
    assertEquals(29, piece(bolt, Kind.SHANK).length(), 1e-12);
  }

  /** With the ends counted a tapped grip ends at the surface; without, at the virtual face. */
  @Test
  void tappedGrip() {
    assertEquals(25, Stacks.solved(tapped(true)).bolt().grip());
    assertEquals(30, Stacks.solved(tapped(false)).bolt().grip());
    BoltStiffness bolt = Stacks.solved(tapped(true)).bolt();
    assertEquals(3.3, piece(bolt, Kind.TAPPED_THREAD).length(), 1e-12);
    assertEquals(71_000, piece(bolt, Kind.TAPPED_THREAD).modulus());
  }

  @Test
  void minorAreaIsSofter() {
    Joint joint = Stacks.joint(BOLT, AngleRule.FIXED_45, Stacks.layer(40, 11, E));
    Joint minor = joint.withMethod(Method.USUAL.withThreadArea(Method.ThreadArea.MINOR_AREA));
    assertTrue(Stacks.solved(minor).bolt().stiffness() < Stacks.solved(joint).bolt().stiffness());
  }

  private static Joint tapped(boolean ends) {
    return Stacks.joint(
            Stacks.tapped(BOLT),
            AngleRule.FIXED_45,
            Stacks.layer(25, 11, E),
            Stacks.layer(40, 11, 71_000))
        .withMethod(Method.USUAL.withEndsCounted(ends));
  }

  private static BoltStiffness.Piece piece(BoltStiffness bolt, Kind kind) {
    return bolt.pieces().stream().filter(piece -> piece.kind() == kind).findFirst().orElseThrow();
  }

  private static Fastener styled(Fastener fastener, Head.Style style) {
    Head head = fastener.head();
    return fastener.withHead(
        new Head(
            style,
            head.standard(),
            head.bearingDiameter(),
            head.height(),
            head.width(),
            head.rim()));
  }
}

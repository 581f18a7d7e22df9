package clampwright.paint;

import clampwright.figure.Role;
import java.util.EnumMap;
import java.util.Map;

/**
 * Role → look. Blue #0072B2 and vermilion #D55E00 are safe for colour-blind readers (Okabe–Ito) and
 * always doubled by line style or letter.
 */
public final class Palette {
  private static final int WHITE_PAPER = 0xFFFFFFFF;
  private static final int BLACK = 0xFF000000;

  public static final Palette LIGHT =
      new Palette(
          0xFFFBFAF6,
          0xFF20262E,
          0xFF6B7280,
          0xFF0072B2,
          0xFFD55E00,
          0xFF6A4C93,
          0xFFEDF0F3,
          0xFFE3E6EA,
          0xFFFFFFFF,
          0xFF9AA1AA,
          0xFF00526B,
          0xFFB3261E,
          0xFF8A6100);
  public static final Palette DARK =
      new Palette(
          0xFF1B1E22,
          0xFFE9E7E1,
          0xFF9AA1AA,
          0xFF56B4E9,
          0xFFFF8C42,
          0xFFB9A2E3,
          0xFF262C33,
          0xFF2F363E,
          0xFF1F242A,
          0xFF6B7480,
          0xFF8ED3F0,
          0xFFFF8A80,
          0xFFE0B050);

  /** For white paper. */
  public static final Palette WHITE = LIGHT.onWhite();

  /** Black on white: hatching, line styles and letters carry everything. */
  public static final Palette BLACK_AND_WHITE = LIGHT.inBlack();

  private final Map<Role, Look> looks = new EnumMap<>(Role.class);
  private final int paper;

  private Palette(
      int paper,
      int ink,
      int quiet,
      int head,
      int nut,
      int both,
      int layer,
      int washer,
      int bolt,
      int hatch,
      int accent,
      int alarm,
      int caution) {
    this.paper = paper;
    put(Role.PAPER, new Look(0, 0, paper));
    put(Role.LAYER_BODY, new Look(0, 0, layer));
    put(Role.WASHER_BODY, new Look(0, 0, washer));
    put(Role.BOLT_BODY, new Look(0, 0, bolt));
    put(Role.OUTLINE, new Look(ink, 0.35, 0));
    put(Role.FINE_LINE, new Look(ink, 0.2, 0));
    put(Role.HATCH, new Look(hatch, 0.2, 0));
    put(Role.AXIS, new Look(quiet, 0.25, 0, 5, 1, 0.6, 1));
    put(Role.HEAD_FACE, new Look(head, 0.9, 0));
    put(Role.NUT_FACE, new Look(nut, 0.9, 0));
    put(Role.HEAD_CONE, new Look(head, 0.45, 0));
    put(Role.NUT_CONE, new Look(nut, 0.45, 0, 1.9, 1));
    put(Role.HEAD_CONE_FAINT, new Look(faded(head, 0x80), 0.25, 0));
    put(Role.NUT_CONE_FAINT, new Look(faded(nut, 0x80), 0.25, 0, 1.9, 1));
    put(Role.HEAD_GOVERNS, new Look(0, 0, faded(head, 0x38)));
    put(Role.NUT_GOVERNS, new Look(0, 0, faded(nut, 0x38)));
    put(Role.BOTH_GOVERN, new Look(0, 0, faded(both, 0x38)));
    put(Role.EFFECTIVE_CYLINDER, new Look(ink, 0.3, 0, 0.35, 0.65));
    put(Role.HEAD_MARK, new Look(head, 0.3, paper));
    put(Role.NUT_MARK, new Look(nut, 0.3, paper));
    put(Role.BOTH_MARK, new Look(both, 0.3, paper));
    put(Role.DIMENSION, new Look(ink, 0.2, ink));
    put(Role.LEADER, new Look(faded(quiet, 0xA0), 0.18, 0));
    put(Role.NAME, new Look(ink, 0.2, 0));
    put(Role.SUBNAME, new Look(quiet, 0.2, 0));
    put(Role.CAPTION, new Look(quiet, 0.2, 0));
    put(Role.LOAD, new Look(ink, 0.7, ink));
    put(Role.LOAD_FOOT, new Look(ink, 0.4, paper));
    put(Role.PRELOAD, new Look(accent, 0.5, accent));
    put(Role.SCALE, new Look(quiet, 0.25, 0));
    put(Role.SCALE_TEXT, new Look(quiet, 0.2, 0));
    put(Role.POINT, new Look(ink, 0.35, paper));
    put(Role.POINT_CHOSEN, new Look(ink, 0.35, ink));
    put(Role.PRELOAD_BAND, new Look(0, 0, faded(accent, 0x48)));
    put(Role.RUNG, new Look(ink, 0.35, 0));
    put(Role.RUNG_BOLT, new Look(caution, 0.45, 0));
    put(Role.RUNG_PRELOAD, new Look(accent, 0.45, 0));
    put(Role.BOLT_LINE, new Look(ink, 0.45, 0));
    put(Role.MEMBERS_LINE, new Look(accent, 0.45, 0, 1.9, 0.8));
    put(Role.BOLT_LINE_FAINT, new Look(faded(ink, 0x70), 0.2, 0));
    put(Role.MEMBERS_LINE_FAINT, new Look(faded(accent, 0x90), 0.2, 0, 1.9, 0.8));
    put(Role.BIN_HOLDS, new Look(0, 0, faded(accent, 0x90)));
    put(Role.BIN_FAILS, new Look(0, 0, alarm));
    put(Role.NOTE, new Look(ink, 0.25, 0));
    put(Role.NOTE_PLATE, new Look(0, 0, paper));
    put(Role.SELECTION, new Look(accent, 0.55, 0));
    put(Role.GRIP, new Look(accent, 0.5, paper));
    put(Role.HOT, new Look(accent, 0.8, 0));
    put(Role.INSERT_GRIP, new Look(faded(quiet, 0xB0), 0.25, paper));
    put(Role.PROBLEM, new Look(alarm, 0.3, alarm));
    put(Role.PROBLEM_PLATE, new Look(alarm, 0.3, paper));
  }

  private Palette(int paper, Map<Role, Look> looks) {
    this.paper = paper;
    this.looks.putAll(looks);
  }

  /** The same colours, but white where the paper shows. */
  private Palette onWhite() {
    Map<Role, Look> changed = new EnumMap<>(Role.class);
    looks.forEach(
        (role, look) ->
            changed.put(
                role,
                look.fill() == paper
                    ? new Look(look.stroke(), look.width(), WHITE_PAPER, look.dash())
                    : look));
    return new Palette(WHITE_PAPER, changed);
  }

  /**
   * Every line black, bodies and governed zones unfilled, small filled marks black. The fainter
   * lines of the right half stay thin.
   */
  private Palette inBlack() {
    Map<Role, Look> changed = new EnumMap<>(Role.class);
    looks.forEach((role, look) -> changed.put(role, black(role, look)));
    return new Palette(WHITE_PAPER, changed);
  }

  private Look black(Role role, Look look) {
    int stroke = look.stroke() >>> 24 == 0 ? 0 : BLACK;
    int fill =
        switch (role) {
          case LAYER_BODY, WASHER_BODY, BOLT_BODY, NOTE_PLATE -> WHITE_PAPER;
          case HEAD_GOVERNS, NUT_GOVERNS, BOTH_GOVERN -> 0;
          case PRELOAD_BAND, BIN_HOLDS -> 0xFFD0D0D0;
          default -> look.fill() >>> 24 == 0 ? 0 : look.fill() == paper ? WHITE_PAPER : BLACK;
        };
    return new Look(stroke, look.width(), fill, look.dash());
  }

  /** The same, with lines and dashes so many times as wide and long. */
  public Palette scaled(double times) {
    Map<Role, Look> changed = new EnumMap<>(Role.class);
    looks.forEach(
        (role, look) -> {
          double[] dash = look.dash().clone();
          for (int i = 0; i < dash.length; i++) {
            dash[i] *= times;
          }
          changed.put(role, new Look(look.stroke(), times * look.width(), look.fill(), dash));
        });
    return new Palette(paper, changed);
  }

  private void put(Role role, Look look) {
    looks.put(role, look);
  }

  /** The same colour, less opaque. */
  private static int faded(int colour, int alpha) {
    return colour & 0xFFFFFF | alpha << 24;
  }

  public Look of(Role role) {
    return looks.get(role);
  }

  /** Colour of the paper, 0xAARRGGBB. */
  public int paper() {
    return paper;
  }
}

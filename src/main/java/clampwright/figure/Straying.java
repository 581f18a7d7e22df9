package clampwright.figure;

import clampwright.joint.Joint;
import clampwright.joint.Target;
import clampwright.mechanics.spread.Input;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;

/** Inputs that stray, in words. */
public final class Straying {
  private Straying() {}

  /** What an input is called, such as "thickness of Lid". */
  public static String name(Input input, Joint joint) {
    return switch (input.kind()) {
      case PRELOAD -> "preload at assembly";
      case THICKNESS -> "thickness of " + part(joint, input.index());
      case MODULUS -> "modulus of " + (input.index() < 0 ? "the bolt" : part(joint, input.index()));
      case THREAD_FRICTION -> "friction in the thread";
      case FACE_FRICTION ->
          joint.tightening().target() instanceof Target.NutFactorTorque
              ? "nut factor"
              : "friction under the head";
      case SLIP_FRICTION -> "friction between the parts";
      case INTRODUCTION -> "n of " + Sentences.loadCase(joint, input.index());
      case MEMBERS_TEMPERATURE -> "temperature of the parts";
      case BOLT_TEMPERATURE -> "temperature of the bolt";
      case ANGLE -> "half-angle";
    };
  }

  private static String part(Joint joint, int index) {
    String name = joint.elements().get(index).name();
    return name.isBlank() ? "layer " + (index + 1) : name;
  }

  /** How far it is off, with its sign. */
  public static String off(Input input, double off, UnitSystem units) {
    Dimension dimension =
        switch (input.kind()) {
          case INTRODUCTION -> Dimension.RATIO;
          case MEMBERS_TEMPERATURE, BOLT_TEMPERATURE -> Dimension.TEMPERATURE_CHANGE;
          case ANGLE -> Dimension.ANGLE;
          default -> Dimension.SHARE;
        };
    double value = dimension == Dimension.ANGLE ? Math.toRadians(off) : off;
    String text = Quantities.trimmedText(dimension, units, Math.abs(value));
    return off == 0 ? "as given" : (off < 0 ? "\u2212" : "+") + text;
  }

  /** Both limits, as one where they are alike. */
  public static String limits(Input input, UnitSystem units) {
    return input.low() == -input.high()
        ? off(input, input.high(), units).replace('+', '\u00b1')
        : off(input, input.low(), units) + " … " + off(input, input.high(), units);
  }
}

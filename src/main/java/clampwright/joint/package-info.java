/**
 * The bolted joint as immutable records, and the sketch that holds it.
 *
 * <p>Units everywhere below this package's edge: millimetre, newton, megapascal, kelvin. Records
 * refuse values that can never be right (a negative thickness); what is merely impossible together
 * (a hole wider than the clamp face) is a finding of {@code clampwright.mechanics}.
 */
package clampwright.joint;

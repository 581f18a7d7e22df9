/**
 * The calculation: pure functions from a joint to its assessment.
 *
 * <p>Units: mm, N, MPa, rad; stiffness N/mm. Axial positions z are measured from under the head
 * towards the nut. Sources by short name: Shigley (Shigley's Mechanical Engineering Design, ch. 8),
 * VDI 2230-1, ISO 898-1, ISO 724, ASME B1.1, Wileman 1991 (Wileman, Choudhury, Green, "Computation
 * of member stiffness in bolted connections", J. Mech. Des. 113). Formulas of VDI 2230-1 and
 * Wileman are quoted from memory.
 */
package clampwright.mechanics;

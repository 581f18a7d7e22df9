/**
 * Pictures as data. A figure is a list of marks in sheet millimetres, each with a role and the part
 * it depicts; never a colour, never a pixel. Painters give roles a look; hit testing reads the same
 * marks that were painted.
 */
package clampwright.figure;

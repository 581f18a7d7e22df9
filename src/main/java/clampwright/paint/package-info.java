/** Gives the roles of a figure their look. Knows no screen. */
package clampwright.paint;

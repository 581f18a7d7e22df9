/** Figures as PNG, SVG and PDF; needs no display. */
package clampwright.paint.print;

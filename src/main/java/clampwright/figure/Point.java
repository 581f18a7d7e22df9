package clampwright.figure;

/**
 * A point on the sheet.
 *
 * @param x to the right [sheet mm]
 * @param y downwards [sheet mm]
 */
public record Point(double x, double y) {}

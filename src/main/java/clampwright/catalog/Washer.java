package clampwright.catalog;

/**
 * A washer size.
 *
 * @param hole inside diameter [mm]
 * @param outsideDiameter [mm]
 * @param thickness [mm]
 */
public record Washer(double hole, double outsideDiameter, double thickness) {}

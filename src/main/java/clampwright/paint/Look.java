package clampwright.paint;

/**
 * How a role looks.
 *
 * @param stroke colour of lines and type, 0xAARRGGBB; 0 for none
 * @param width of lines [sheet mm]
 * @param fill colour of areas, 0xAARRGGBB; 0 for none
 * @param dash lengths of strokes and gaps in turn [sheet mm]; none for a full line
 */
public record Look(int stroke, double width, int fill, double... dash) {}

package clampwright.figure;

import java.util.List;

/**
 * A picture.
 *
 * @param title for whoever cannot see it
 * @param width of the sheet [mm]
 * @param height of the sheet [mm]
 * @param marks in painting order
 */
public record Figure(String title, double width, double height, List<Mark> marks) {
  public Figure {
    marks = List.copyOf(marks);
  }
}

package clampwright.view;

import javafx.scene.control.Label;

/** Headings that panes share. */
public final class Headings {
  private static final String HAIR_SPACES = "\u200a\u200a";

  private Headings() {}

  /** The small spaced capitals at the top of a pane. */
  public static Label pane(String title) {
    String capitals = title.toUpperCase(java.util.Locale.ROOT);
    Label heading = new Label(String.join(HAIR_SPACES, capitals.split("")));
    heading.getStyleClass().add("pane-heading");
    heading.setAccessibleText(title);
    return heading;
  }
}

package clampwright.view.schedule;

import javafx.geometry.VPos;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;

/** An element's share of the members' give, as a bar and in percent. */
final class ShareBar extends Region {
  private static final double BAR_HEIGHT = 10;
  private static final double TEXT_WIDTH = 44;

  private final Region bar = new Region();
  private final Label percent = new Label();
  private double share;

  ShareBar() {
    getStyleClass().add("share");
    bar.getStyleClass().add("bar");
    getChildren().addAll(bar, percent);
    setMaxWidth(Double.MAX_VALUE);
  }

  void show(double share) {
    this.share = share;
    percent.setText(Math.round(share * 100) + " %");
    requestLayout();
  }

  @Override
  protected void layoutChildren() {
    double length = Math.max(1, share * Math.max(0, getWidth() - TEXT_WIDTH));
    bar.resizeRelocate(0, snapPositionY((getHeight() - BAR_HEIGHT) / 2), length, BAR_HEIGHT);
    layoutInArea(
        percent, length + 6, 0, TEXT_WIDTH, getHeight(), 0, javafx.geometry.HPos.LEFT, VPos.CENTER);
  }

  @Override
  protected double computePrefWidth(double height) {
    return 300;
  }
}

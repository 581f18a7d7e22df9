package clampwright.view.spread;

import javafx.scene.layout.Region;

/** A bar from one margin to another on a common scale, with ticks at 0 and at the given margin. */
final class Track extends Region {
  private static final double TALL = 9;

  private final Region bar = new Region();
  private final Region given = new Region();
  private final Region zero = new Region();
  private double from;
  private double to;
  private double low;
  private double high;
  private double at;

  Track() {
    getStyleClass().add("spread-track");
    bar.getStyleClass().add("spread-bar");
    given.getStyleClass().add("spread-given");
    zero.getStyleClass().add("spread-zero");
    getChildren().addAll(bar, given, zero);
    setMinHeight(18);
    setPrefHeight(18);
  }

  /**
   * Shows a bar.
   *
   * @param from left end of the scale
   * @param to right end of the scale
   * @param low lower end of the bar
   * @param high upper end of the bar
   * @param at the given margin
   */
  void show(double from, double to, double low, double high, double at) {
    this.from = from;
    this.to = to;
    this.low = low;
    this.high = high;
    this.at = at;
    requestLayout();
  }

  @Override
  protected void layoutChildren() {
    double left = x(Math.min(at, Math.min(low, high)));
    double right = x(Math.max(at, Math.max(low, high)));
    double top = snapPositionY((getHeight() - TALL) / 2);
    bar.resizeRelocate(left, top, Math.max(2, right - left), TALL);
    given.resizeRelocate(x(at) - 1, top - 3, 2, TALL + 6);
    zero.resizeRelocate(x(0), 0, 1, getHeight());
    zero.setVisible(from < 0 && to > 0);
  }

  private double x(double margin) {
    double share = (margin - from) / (to - from);
    return snapPositionX(Math.max(0, Math.min(1, share)) * getWidth());
  }
}

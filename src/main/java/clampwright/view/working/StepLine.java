package clampwright.view.working;

import clampwright.figure.working.Step;
import clampwright.view.MathText;
import java.util.List;
import javafx.scene.layout.Region;
import javafx.scene.text.TextAlignment;

/**
 * One step: what, formula, numbers put in, result, source, side by side; words that only remark
 * reach over formula, numbers and result.
 */
final class StepLine extends Region {
  private static final double GAP = 18;
  private static final double ABOVE = 3;

  /** Shares of the width. */
  private static final double[] SHARES = {0.15, 0.26, 0.29, 0.085, 0.215};

  private final MathText label = new MathText("step-label");
  private final MathText formula = new MathText("step-formula");
  private final MathText numbers = new MathText("step-numbers");
  private final MathText result = new MathText("step-result");
  private final MathText source = new MathText("step-source");
  private final List<MathText> cells = List.of(label, formula, numbers, result, source);
  private boolean remark;

  StepLine() {
    getStyleClass().add("step");
    result.setTextAlignment(TextAlignment.RIGHT);
    getChildren().addAll(cells);
  }

  void show(Step step) {
    label.show(step.label());
    formula.show(step.formula());
    numbers.show(step.numbers().isEmpty() ? "" : "= " + step.numbers());
    result.show(step.result().isEmpty() ? "" : "= " + step.result());
    source.show(step.source());
    remark = step.isRemark();
    requestLayout();
  }

  private double width(int cell, double line) {
    double room = line - (SHARES.length - 1) * GAP;
    if (remark && cell == 1) {
      return room * (SHARES[1] + SHARES[2] + SHARES[3]) + 2 * GAP;
    }
    return Math.floor(room * SHARES[cell]);
  }

  @Override
  protected void layoutChildren() {
    double x = 0;
    double room = getWidth() - (SHARES.length - 1) * GAP;
    for (int i = 0; i < cells.size(); i++) {
      MathText cell = cells.get(i);
      double width = width(i, getWidth());
      cell.resizeRelocate(Math.round(x), ABOVE, width, cell.prefHeight(width));
      x += room * SHARES[i] + GAP;
    }
  }

  @Override
  protected double computePrefHeight(double width) {
    double line = width < 0 ? getWidth() : width;
    double height = 0;
    for (int i = 0; i < cells.size(); i++) {
      height = Math.max(height, cells.get(i).prefHeight(width(i, line)));
    }
    return Math.ceil(height) + 2 * ABOVE;
  }

  @Override
  public javafx.geometry.Orientation getContentBias() {
    return javafx.geometry.Orientation.HORIZONTAL;
  }
}

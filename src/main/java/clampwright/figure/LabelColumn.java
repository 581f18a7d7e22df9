package clampwright.figure;

/** Places labels in a column: as near to what they name as they can be without overlapping. */
final class LabelColumn {
  private LabelColumn() {}

  /** Distance between labels so that all fit [sheet mm], at most the usual one. */
  static double spacing(int count, double usual, double top, double bottom) {
    return count <= 1 ? usual : Math.min(usual, (bottom - top) / (count - 1));
  }

  /**
   * Middles of the labels: the least squares of the moves, in order, at least a spacing apart
   * (pooling of adjacent violators), then kept between top and bottom.
   *
   * @param wanted middles in rising order [sheet mm]
   */
  static double[] placed(double[] wanted, double spacing, double top, double bottom) {
    int count = wanted.length;
    double[] mean = new double[count];
    int[] size = new int[count];
    int blocks = 0;
    for (int i = 0; i < count; i++) {
      mean[blocks] = wanted[i] - i * spacing;
      size[blocks++] = 1;
      while (blocks > 1 && mean[blocks - 2] >= mean[blocks - 1]) {
        int both = size[blocks - 2] + size[blocks - 1];
        mean[blocks - 2] =
            (mean[blocks - 2] * size[blocks - 2] + mean[blocks - 1] * size[blocks - 1]) / both;
        size[blocks - 2] = both;
        blocks--;
      }
    }
    double[] places = new double[count];
    double last = bottom - (count - 1) * spacing;
    int i = 0;
    for (int block = 0; block < blocks; block++) {
      for (int k = 0; k < size[block]; k++, i++) {
        places[i] = Math.max(top, Math.min(last, mean[block])) + i * spacing;
      }
    }
    return places;
  }
}

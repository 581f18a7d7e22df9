package clampwright.catalog;

import clampwright.joint.ScrewThread;

/** Nominal sizes by which heads, nuts, washers and holes are found for a thread. */
final class Size {
  private Size() {}

  /** The size that a thread goes by in the other tables: M10 for M10x1.25, 1/2 for 1/2-13 UNC. */
  static String of(ScrewThread thread) {
    String designation = thread.designation();
    if (thread.form() == ScrewThread.Form.METRIC) {
      int fine = designation.indexOf('x');
      return fine < 0 ? designation : designation.substring(0, fine);
    }
    int dash = designation.lastIndexOf('-');
    return dash < 0 ? designation : designation.substring(0, dash);
  }

  /** Nominal diameter of a size [in], of the forms 1/4, 1 1/8, 1, #10. */
  static double inches(String size) {
    if (size.startsWith("#")) {
      return 0.06 + 0.013 * Integer.parseInt(size.substring(1));
    }
    double sum = 0;
    for (String part : size.split(" ")) {
      String[] fraction = part.split("/");
      sum +=
          fraction.length == 1
              ? Double.parseDouble(fraction[0])
              : Double.parseDouble(fraction[0]) / Double.parseDouble(fraction[1]);
    }
    return sum;
  }
}

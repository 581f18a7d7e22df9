package clampwright.catalog;

import clampwright.joint.Head;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.apache.commons.csv.CSVRecord;

/** Reads the heads, by nominal size. Gaps in the tables are filled by estimates that say so. */
final class Heads {
  /** d_w over head diameter of ISO 4762 heads, where a socket head's table gives no face. */
  private static final double FACE_SHARE = 0.955;

  private static final String GRADE_B = ", grade B";

  private Heads() {}

  static Map<String, List<Entry<Head>>> read() {
    Map<String, List<Entry<Head>>> bySize = new LinkedHashMap<>();
    for (CSVRecord row : Table.read("heads")) {
      bySize.computeIfAbsent(row.get("size"), size -> new ArrayList<>()).add(entry(row));
    }
    return bySize;
  }

  private static Entry<Head> entry(CSVRecord row) {
    Head.Style style = style(row.get("standard"));
    double width =
        first(Table.length(row, "across_flats_nominal"), Table.length(row, "head_dia_plain_max"));
    double rim = Table.length(row, "flange_dia_max").orElse(width);
    OptionalDouble face = Table.length(row, "bearing_face_dia_min");
    OptionalDouble height = Table.length(row, "head_height_nominal");
    String standard = standard(row);
    Head head =
        new Head(
            style,
            standard,
            face.orElse(FACE_SHARE * width),
            height.orElseGet(() -> estimatedHeight(row)),
            width,
            rim);
    return new Entry<>(
        standard, style.name(), head, row.get("source"), provenance(row, face, height));
  }

  private static String standard(CSVRecord row) {
    String grade = row.get("grade").equals("B") ? GRADE_B : "";
    return row.get("standard") + grade;
  }

  /** Whether two heads are of one standard; large sizes come in product grade B only. */
  static boolean sameStandard(Head one, Head other) {
    return one.standard().replace(GRADE_B, "").equals(other.standard().replace(GRADE_B, ""));
  }

  private static Head.Style style(String standard) {
    if (standard.contains("socket")) {
      return Head.Style.SOCKET;
    }
    return standard.contains("flange") ? Head.Style.FLANGE : Head.Style.HEXAGON;
  }

  /** Drawn only: a flange head is about as high as 0.9 d (common practice, no source). */
  private static double estimatedHeight(CSVRecord row) {
    String size = row.get("size");
    double nominal =
        size.startsWith("M") ? Double.parseDouble(size.substring(1)) : 25.4 * Size.inches(size);
    return 0.9 * nominal;
  }

  private static String provenance(CSVRecord row, OptionalDouble face, OptionalDouble height) {
    String provenance = row.get("provenance");
    if (face.isEmpty()) {
      provenance +=
          "; bearing face estimated as 0.955 of the head's diameter (common practice, no source)";
    }
    if (height.isEmpty()) {
      provenance += "; height estimated as 0.9 d, drawn only (common practice, no source)";
    }
    return provenance;
  }

  private static double first(OptionalDouble one, OptionalDouble other) {
    return one.isPresent() ? one.getAsDouble() : other.orElseThrow();
  }
}

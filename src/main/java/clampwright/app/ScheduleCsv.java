package clampwright.app;

import clampwright.figure.Sentences;
import clampwright.joint.Element;
import clampwright.joint.Outline;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.ElementFinding;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;

/**
 * The schedule as comma-separated values (RFC 4180) in the sketch's units, with all figures of each
 * number. Columns that a joint without a solution has no numbers for stay empty.
 */
final class ScheduleCsv {
  private final Sketch sketch;
  private final UnitSystem units;

  private ScheduleCsv(Sketch sketch) {
    this.sketch = sketch;
    units = sketch.units();
  }

  static String of(Sketch sketch) {
    ScheduleCsv schedule = new ScheduleCsv(sketch);
    StringBuilder text = new StringBuilder();
    try (CSVPrinter printer = new CSVPrinter(text, CSVFormat.RFC4180)) {
      printer.printRecord(schedule.titles());
      Assessment assessment = Assessment.of(sketch.joint());
      for (int i = 0; i < sketch.joint().elements().size(); i++) {
        printer.printRecord(schedule.row(i, assessment));
      }
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
    return text.toString();
  }

  private List<String> titles() {
    String length = " " + Quantities.unit(Dimension.LENGTH, units);
    return List.of(
        "No.",
        "Part",
        "Material",
        "Thickness" + length,
        "Hole" + length,
        "Outline" + length,
        "From head" + length,
        "From nut" + length,
        "Governs",
        "Effective diameter" + length,
        "Area " + Quantities.unit(Dimension.AREA, units),
        "Stiffness " + Quantities.unit(Dimension.STIFFNESS, units));
  }

  private List<String> row(int index, Assessment assessment) {
    Element element = sketch.joint().elements().get(index);
    List<String> row = new ArrayList<>();
    row.add(Integer.toString(index + 1));
    row.add(element.name());
    row.add(element.material().name());
    row.add(number(Dimension.LENGTH, element.thickness()));
    row.add(
        sketch.joint().isTappedLayer(index) ? "tapped" : number(Dimension.LENGTH, element.hole()));
    row.add(outline(element.outline()));
    if (assessment instanceof Solved solved) {
      addFound(row, solved.elements().get(index));
    } else {
      row.addAll(List.of("", "", "", "", "", ""));
    }
    return row;
  }

  private void addFound(List<String> row, ElementFinding finding) {
    row.add(number(Dimension.LENGTH, finding.depthFromHead()));
    row.add(number(Dimension.LENGTH, finding.depthFromNut()));
    row.add(Sentences.side(finding.governing()));
    row.add(number(Dimension.LENGTH, finding.effectiveDiameter()));
    row.add(number(Dimension.AREA, finding.area()));
    row.add(number(Dimension.STIFFNESS, finding.stiffness()));
  }

  private String outline(Outline outline) {
    if (outline instanceof Outline.Round round) {
      return "round " + number(Dimension.LENGTH, round.diameter());
    }
    if (outline instanceof Outline.Strip strip) {
      return "edges "
          + number(Dimension.LENGTH, strip.left())
          + " and "
          + number(Dimension.LENGTH, strip.right());
    }
    return "wide";
  }

  private String number(Dimension dimension, double value) {
    return Quantities.field(dimension, units, value);
  }
}

package clampwright.app;

import clampwright.figure.Sentences;
import clampwright.figure.Verdicts;
import clampwright.joint.Element;
import clampwright.joint.Factors;
import clampwright.joint.Joint;
import clampwright.joint.Sketch;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.ElementFinding;
import clampwright.mechanics.LoadSharing;
import clampwright.mechanics.MemberStiffness;
import clampwright.mechanics.Side;
import clampwright.mechanics.Zone;
import clampwright.mechanics.checks.Checks;
import clampwright.mechanics.checks.Verdict;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;

/** The readouts as tables for a person, in the sketch's units. */
final class FoundTable {
  private final Sketch sketch;
  private final Solved solved;
  private final UnitSystem units;

  private FoundTable(Sketch sketch, Solved solved) {
    this.sketch = sketch;
    this.solved = solved;
    this.units = sketch.units();
  }

  static String of(Sketch sketch, Solved solved) {
    return new FoundTable(sketch, solved).text();
  }

  private String text() {
    return String.join(
        "\n",
        Places.oneLine(sketch.name()) + "\n",
        zone(),
        parts(),
        readouts(),
        methods(),
        checks(),
        notices() + Sentences.CAUTION + "\n");
  }

  private String zone() {
    Zone zone = solved.zone();
    TextTable table = new TextTable("ll");
    String head = text(Dimension.ANGLE, zone.headHalfAngle());
    String nut = text(Dimension.ANGLE, zone.nutHalfAngle());
    String angle = head.equals(nut) ? head : "head " + head + ", nut " + nut;
    String rule = Sentences.angleRule(sketch.joint().method().angle());
    table.row("half-angle", angle + " (" + rule + ")");
    table.row(
        "clamp faces",
        "Ø "
            + text(Dimension.LENGTH, zone.headFaceDiameter())
            + " and Ø "
            + text(Dimension.LENGTH, zone.nutFaceDiameter())
            + ", "
            + text(Dimension.LENGTH, zone.length())
            + " apart");
    table.row("head's washer", Sentences.washerDecision(zone.headWasher(), Side.HEAD, units));
    if (!sketch.joint().fastener().isTapped()) {
      table.row("nut's washer", Sentences.washerDecision(zone.nutWasher(), Side.NUT, units));
    }
    return table.text();
  }

  private String text(Dimension dimension, double value) {
    return Quantities.text(dimension, units, value);
  }

  private String parts() {
    TextTable table = new TextTable("rlrrrlrrr");
    table.row(
        "",
        "part",
        "t " + unit(Dimension.LENGTH),
        "from head",
        "from nut",
        "governs",
        "Ø eff. " + unit(Dimension.LENGTH),
        "A " + unit(Dimension.AREA),
        "k " + unit(Dimension.STIFFNESS));
    for (int i = 0; i < solved.elements().size(); i++) {
      part(table, i, sketch.joint().elements().get(i), solved.elements().get(i));
    }
    return table.text();
  }

  private void part(TextTable table, int index, Element element, ElementFinding finding) {
    String limited = finding.edgeLimited() ? ", held by an edge" : "";
    String clipped = finding.edgeClipped() ? ", cut by an edge" : "";
    table.row(
        Integer.toString(index + 1),
        Places.oneLine(element.name()),
        number(Dimension.LENGTH, element.thickness()),
        number(Dimension.LENGTH, finding.depthFromHead()),
        number(Dimension.LENGTH, finding.depthFromNut()),
        Sentences.side(finding.governing()) + limited + clipped,
        number(Dimension.LENGTH, finding.effectiveDiameter()),
        number(Dimension.AREA, finding.area()),
        number(Dimension.STIFFNESS, finding.stiffness()));
  }

  private String readouts() {
    LoadSharing sharing = solved.sharing();
    StiffnessMethod chosen = sketch.joint().method().stiffness();
    TextTable table = new TextTable("lrl");
    String members = "members, " + Sentences.method(chosen);
    readout(table, members, Dimension.STIFFNESS, sharing.memberStiffness());
    readout(table, "bolt", Dimension.STIFFNESS, solved.bolt().stiffness());
    readout(table, "load factor Φ", Dimension.RATIO, sharing.loadFactor());
    readout(table, "preload in service, least", Dimension.FORCE, sharing.preload().min());
    readout(table, "preload in service, nominal", Dimension.FORCE, sharing.preload().nominal());
    readout(table, "preload in service, most", Dimension.FORCE, sharing.preload().max());
    readout(table, "axial load", Dimension.FORCE, sharing.axialMax());
    readout(table, "bolt load, most", Dimension.FORCE, sharing.boltLoad());
    readout(table, "clamp load, least", Dimension.FORCE, sharing.clampLoad());
    readout(table, "parts at, least", Dimension.FORCE, sharing.partingLoad());
    return table.text();
  }

  private void readout(TextTable table, String label, Dimension dimension, double value) {
    table.row(label, number(dimension, value), unit(dimension));
  }

  private String methods() {
    TextTable table = new TextTable("lrrl");
    table.row("by method", "members " + unit(Dimension.STIFFNESS), "Φ", "");
    for (StiffnessMethod method : StiffnessMethod.values()) {
      String name = Sentences.method(method);
      if (solved.members().get(method) instanceof MemberStiffness.Value value) {
        String stiffness = number(Dimension.STIFFNESS, value.stiffness());
        table.row(
            name,
            stiffness,
            number(Dimension.RATIO, value.loadFactor(solved.sharing().introduction())),
            "");
      } else if (solved.members().get(method) instanceof MemberStiffness.NotApplicable not) {
        table.row(name, "–", "–", "not applicable: " + not.why().text());
      }
    }
    return table.text();
  }

  private String checks() {
    Joint joint = sketch.joint();
    TextTable table = new TextTable("lrrrl");
    table.row("check", "demand", "capacity", "margin", "");
    for (Verdict verdict : Checks.of(joint, solved)) {
      String name = Sentences.check(verdict.kind());
      if (verdict instanceof Verdict.Judged judged) {
        Dimension dimension = Verdicts.dimension(judged.kind());
        table.row(
            name,
            text(dimension, judged.demand()),
            text(dimension, judged.capacity()),
            Verdicts.margin(judged.margin()),
            said(judged));
      } else if (verdict instanceof Verdict.NotApplicable not) {
        table.row(name, "–", "–", "–", "not applicable: " + not.why().text());
      }
    }
    return table.text() + factors();
  }

  private String said(Verdict.Judged judged) {
    String where = Sentences.where(judged.where(), joint());
    String fails = judged.passes() ? "" : "fails";
    return fails.isEmpty() || where.isEmpty() ? fails + where : fails + "; " + where;
  }

  private String factors() {
    boolean none = joint().criteria().factors().equals(Factors.NONE);
    return none ? "All factors are 1.0: none has been set.\n" : "";
  }

  private Joint joint() {
    return sketch.joint();
  }

  private String notices() {
    Joint joint = sketch.joint();
    StringBuilder notices = new StringBuilder();
    solved
        .notices()
        .forEach(
            notice ->
                notices
                    .append("Note. ")
                    .append(Places.told(notice.part(), joint, Sentences.notice(notice)))
                    .append('\n'));
    return notices.isEmpty() ? "" : notices + "\n";
  }

  private String number(Dimension dimension, double value) {
    return Quantities.number(dimension, units, value);
  }

  private String unit(Dimension dimension) {
    return Quantities.unit(dimension, units);
  }
}

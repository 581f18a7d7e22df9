package clampwright.view.found;

import clampwright.edit.SketchModel;
import clampwright.figure.Sentences;
import clampwright.figure.working.Headline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.Assessment.Unsolved;
import clampwright.quantity.UnitSystem;
import clampwright.view.Headings;
import clampwright.view.OncePerPulse;
import clampwright.view.PartName;
import clampwright.view.found.Remarks.Remark;
import java.util.EnumMap;
import java.util.Map;
import java.util.function.Consumer;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** What the joint comes to, or, while it has no solution, why: then there are no numbers at all. */
public final class FoundPane extends ScrollPane {
  private final SketchModel model;
  private final Map<Finding, Readout> readouts = new EnumMap<>(Finding.class);
  private final MethodSpread spread = new MethodSpread();
  private final MethodList methods = new MethodList();
  private final Region noticeRule = rule();
  private final Remarks notices;
  private final Remarks reasons;
  private final VBox solvedSheet = new VBox();
  private final VBox unsolvedSheet = new VBox();

  /**
   * The pane.
   *
   * @param openWorking what pressing a readout does
   */
  public FoundPane(SketchModel model, Consumer<Headline> openWorking) {
    this.model = model;
    getStyleClass().add("found");
    notices = new Remarks(this::nameOf, model.selectionProperty()::set);
    notices.setId("notices");
    reasons = new Remarks(this::nameOf, model.selectionProperty()::set);
    reasons.setId("reasons");
    for (Finding finding : Finding.values()) {
      Readout readout = new Readout(finding);
      readout.setOnAction(event -> openWorking.accept(finding.headline()));
      readouts.put(finding, readout);
    }
    solvedSheet
        .getChildren()
        .addAll(
            readoutGrid(), rule(), heading("Φ by method"), spread, methods, noticeRule, notices);
    solvedSheet.getStyleClass().add("solved");
    Label none = new Label("No solution yet");
    none.getStyleClass().add("no-solution");
    unsolvedSheet.getChildren().addAll(none, reasons);
    unsolvedSheet.getStyleClass().add("unsolved");
    VBox sheet = new VBox(Headings.pane("Found"), solvedSheet, unsolvedSheet);
    sheet.getStyleClass().add("sheet");
    setContent(sheet);
    setFitToWidth(true);
    setHbarPolicy(ScrollBarPolicy.NEVER);
    setAccessibleText("Found");
    OncePerPulse.keep(
        this,
        this::follow,
        model.sketchProperty(),
        model.assessmentProperty(),
        model.shownCaseProperty());
  }

  private String nameOf(Part part) {
    return PartName.of(part, model.sketch().joint());
  }

  private GridPane readoutGrid() {
    GridPane grid = new GridPane();
    grid.getStyleClass().add("readouts");
    for (Finding finding : Finding.values()) {
      grid.add(readouts.get(finding), finding.ordinal() % 2, finding.ordinal() / 2);
    }
    readouts.get(Finding.BOLT_LOAD).getStyleClass().add("minor");
    readouts.get(Finding.CLAMP_LOAD).getStyleClass().add("minor");
    return grid;
  }

  private static Region rule() {
    Region rule = new Region();
    rule.getStyleClass().add("rule");
    return rule;
  }

  private static Label heading(String text) {
    Label heading = new Label(text);
    heading.getStyleClass().add("found-heading");
    return heading;
  }

  private void follow() {
    Sketch sketch = model.sketch();
    Assessment assessment = model.assessment();
    boolean solved = assessment instanceof Solved;
    solvedSheet.setVisible(solved);
    solvedSheet.setManaged(solved);
    unsolvedSheet.setVisible(!solved);
    unsolvedSheet.setManaged(!solved);
    if (assessment instanceof Solved found) {
      show(found, sketch);
      reasons.show(java.util.List.of());
    } else {
      show((Unsolved) assessment, sketch.units());
    }
  }

  private void show(Solved solved, Sketch sketch) {
    int shown = model.loadCase();
    double introduction = solved.cases().get(shown).introduction();
    readouts.forEach((finding, readout) -> readout.show(finding.of(solved, shown), sketch.units()));
    spread.show(solved.members(), sketch.joint().method().stiffness(), introduction);
    methods.show(
        solved.members(), sketch.joint().method().stiffness(), introduction, sketch.units());
    noticeRule.setVisible(!solved.notices().isEmpty());
    notices.show(
        solved.notices().stream()
            .map(notice -> new Remark(notice.part(), Sentences.notice(notice)))
            .toList());
  }

  private void show(Unsolved unsolved, UnitSystem units) {
    reasons.show(
        unsolved.reasons().stream()
            .map(reason -> new Remark(reason.part(), Sentences.reason(reason, units)))
            .toList());
  }
}

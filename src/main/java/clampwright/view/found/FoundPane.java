package clampwright.view.found;

import clampwright.edit.SketchModel;
import clampwright.figure.LoadLadderFigure;
import clampwright.figure.MethodSpreadFigure;
import clampwright.figure.Sentences;
import clampwright.figure.working.Headline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.joint.StiffnessMethod;
import clampwright.mechanics.Assessment;
import clampwright.mechanics.Assessment.Solved;
import clampwright.mechanics.Assessment.Unsolved;
import clampwright.mechanics.checks.CheckKind;
import clampwright.mechanics.checks.Verdict;
import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import clampwright.view.FigurePlace;
import clampwright.view.Headings;
import clampwright.view.OncePerPulse;
import clampwright.view.PartName;
import clampwright.view.found.Remarks.Remark;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** What the joint comes to, or, while it has no solution, why: then there are no numbers at all. */
public final class FoundPane extends ScrollPane {
  private final SketchModel model;
  private final Map<Finding, Readout> readouts = new EnumMap<>(Finding.class);
  private final FigurePlace spread =
      new FigurePlace("Load factor by method; the list below has the numbers").tall(60);
  private final FigurePlace ladder =
      new FigurePlace("Load ladder: preload, bolt load, limits and parting on one axis").tall(150);
  private final Label ladderUnit = new Label();
  private final CheckLine worst = new CheckLine("least margin: ", "worst");
  private final CheckList checks;
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
   * @param openCheck what pressing a check does
   */
  public FoundPane(
      SketchModel model, Consumer<Headline> openWorking, Consumer<CheckKind> openCheck) {
    this.model = model;
    checks = new CheckList(openCheck);
    worst.setOnAction(
        event -> least(model.verdicts()).ifPresent(at -> openCheck.accept(at.kind())));
    spread.getStyleClass().add("method-spread");
    ladder.setId("load-ladder");
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
            readoutGrid(),
            worst,
            noticeRule,
            notices,
            rule(),
            heading("Φ by method"),
            spread,
            rule(),
            headed("Load ladder", ladderUnit),
            ladder,
            rule(),
            headed("Checks", new Label("margin")),
            checks,
            rule(),
            methods);
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

  private static HBox headed(String text, Label right) {
    right.getStyleClass().add("method-head");
    Region gap = new Region();
    HBox.setHgrow(gap, Priority.ALWAYS);
    return new HBox(heading(text), gap, right);
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
      reasons.show(List.of());
    } else {
      show((Unsolved) assessment, sketch.units());
    }
  }

  private void show(Solved solved, Sketch sketch) {
    int shown = model.loadCase();
    double introduction = solved.cases().get(shown).introduction();
    readouts.forEach((finding, readout) -> readout.show(finding.of(solved, shown), sketch.units()));
    StiffnessMethod chosen = sketch.joint().method().stiffness();
    spread.show(
        (width, height) ->
            MethodSpreadFigure.of(solved.members(), chosen, introduction, width, height));
    ladder.show((width, height) -> LoadLadderFigure.of(sketch, solved, shown, width, height));
    ladderUnit.setText(Quantities.unit(Dimension.FORCE, sketch.units()));
    checks.show(model.verdicts(), sketch.joint());
    Optional<Verdict.Judged> least = least(model.verdicts());
    worst.setVisible(least.isPresent());
    worst.setManaged(least.isPresent());
    least.ifPresent(verdict -> worst.show(verdict, sketch.joint()));
    methods.show(solved.members(), chosen, introduction, sketch.units());
    noticeRule.setVisible(!solved.notices().isEmpty());
    noticeRule.setManaged(noticeRule.isVisible());
    notices.setManaged(noticeRule.isVisible());
    notices.show(
        solved.notices().stream()
            .map(notice -> new Remark(notice.part(), Sentences.notice(notice)))
            .toList());
  }

  private static Optional<Verdict.Judged> least(List<Verdict> verdicts) {
    return verdicts.stream()
        .filter(Verdict.Judged.class::isInstance)
        .map(Verdict.Judged.class::cast)
        .min(Comparator.comparingDouble(Verdict.Judged::margin));
  }

  private void show(Unsolved unsolved, UnitSystem units) {
    reasons.show(
        unsolved.reasons().stream()
            .map(reason -> new Remark(reason.part(), Sentences.reason(reason, units)))
            .toList());
  }
}

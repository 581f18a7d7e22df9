package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.LoadCase;
import clampwright.joint.Sketch;
import clampwright.view.field.Choice;
import clampwright.view.field.ChoiceField;
import clampwright.view.field.SketchChoice;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Button;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;

/** Chooses the load case that is shown; adds and removes cases. */
final class LoadCases extends HBox {
  private final SketchModel model;
  private final ChoiceField<Integer> shown;
  private final Button remove = Fields.smallButton("−", "Remove load case");

  LoadCases(SketchModel model) {
    this.model = model;
    getStyleClass().addAll("field-with-buttons", "case-field");
    shown = new ChoiceField<>(model, shown(model), this::show);
    shown.setId("load-case");
    HBox.setHgrow(shown, Priority.ALWAYS);
    Button add = Fields.smallButton("+", "Add load case");
    add.setId("add-load-case");
    add.setOnAction(event -> add());
    remove.setId("remove-load-case");
    remove.setOnAction(event -> remove());
    getChildren().addAll(shown, add, remove);
    model.shownCaseProperty().addListener(observable -> shown.refresh());
    model.sketchProperty().addListener(observable -> follow());
    follow();
  }

  private static List<LoadCase> loads(Sketch sketch) {
    return sketch.joint().service().loads();
  }

  private static SketchChoice<Integer> shown(SketchModel model) {
    return new SketchChoice<>(
        "Load case shown",
        sketch -> Optional.of(model.loadCase()),
        (sketch, index) -> sketch,
        index -> LoadFields.named(loads(model.sketch()).get(index).name()),
        LoadCases::choices,
        (sketch, index) -> "");
  }

  private static List<Choice<Integer>> choices(Sketch sketch) {
    List<Choice<Integer>> choices = new ArrayList<>();
    for (LoadCase load : loads(sketch)) {
      choices.add(Choice.of(LoadFields.named(load.name()), choices.size()));
    }
    return choices;
  }

  private void show(int index) {
    model.endTyping();
    model.shownCaseProperty().set(index);
  }

  /** A copy of the shown one, which then is the one shown. */
  private void add() {
    List<LoadCase> loads = new ArrayList<>(loads(model.sketch()));
    List<String> taken = loads.stream().map(LoadCase::name).toList();
    String name = FreeName.of("Load case ", loads.size() + 1, taken);
    loads.add(loads.get(model.loadCase()).withName(name));
    change("Add load case", loads);
    show(loads.size() - 1);
  }

  private void remove() {
    List<LoadCase> loads = new ArrayList<>(loads(model.sketch()));
    loads.remove(model.loadCase());
    change("Remove load case", loads);
    show(model.loadCase());
  }

  private void change(String step, List<LoadCase> loads) {
    model.change(
        step,
        sketch -> sketch.withJoint(joint -> joint.withService(joint.service().withLoads(loads))));
  }

  private void follow() {
    remove.setDisable(loads(model.sketch()).size() < 2);
    shown.refresh();
  }
}

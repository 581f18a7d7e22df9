package clampwright.view.diagram;

import clampwright.edit.SketchModel;
import clampwright.figure.JointDiagramFigure;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment.Solved;
import clampwright.view.FigurePlace;
import clampwright.view.OncePerPulse;
import javafx.scene.control.Label;
import javafx.scene.layout.StackPane;

/** The joint diagram of the load case shown; while there is no solution, nothing but that. */
public final class JointDiagramPane extends StackPane {
  private final SketchModel model;
  private final FigurePlace place =
      new FigurePlace("Joint diagram: force in bolt and members over the stretch of the bolt");
  private final Label none = new Label("No solution yet");

  public JointDiagramPane(SketchModel model) {
    this.model = model;
    getStyleClass().add("joint-diagram");
    setId("joint-diagram");
    place.setMaxWidth(760);
    none.getStyleClass().add("no-solution");
    getChildren().addAll(place, none);
    OncePerPulse.keep(
        this,
        this::follow,
        model.sketchProperty(),
        model.assessmentProperty(),
        model.shownCaseProperty());
  }

  private void follow() {
    boolean solved = model.assessment() instanceof Solved;
    place.setVisible(solved);
    none.setVisible(!solved);
    if (model.assessment() instanceof Solved found) {
      Sketch sketch = model.sketch();
      int shown = model.loadCase();
      place.show((width, height) -> JointDiagramFigure.of(sketch, found, shown, width, height));
    }
  }
}

package clampwright.view.working;

import clampwright.edit.SketchModel;
import clampwright.figure.working.Headline;
import clampwright.figure.working.Step;
import clampwright.figure.working.Working;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.view.OncePerPulse;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.ColumnConstraints;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import javafx.scene.text.Text;
import javafx.scene.text.TextFlow;

/** The working of the selected part, or of a readout that was pressed: formula, numbers, source. */
public final class WorkingPane extends ScrollPane {
  private static final Pattern LOW = Pattern.compile("_([A-Za-z0-9]+)");

  private final SketchModel model;
  private final TextFlow title = new TextFlow();
  private final GridPane grid = new GridPane();
  private Optional<Headline> headline = Optional.empty();
  private Part shown;

  /** A pane that follows the model. */
  public WorkingPane(SketchModel model) {
    this.model = model;
    getStyleClass().add("working");
    grid.getStyleClass().add("working-grid");
    grid.setHgap(18);
    grid.setVgap(5);
    for (double share : new double[] {17, 24, 32, 12, 15}) {
      ColumnConstraints column = new ColumnConstraints();
      column.setPercentWidth(share);
      grid.getColumnConstraints().add(column);
    }
    VBox sheet = new VBox(8, title, grid);
    sheet.getStyleClass().add("working-sheet");
    setContent(sheet);
    setFitToWidth(true);
    shown = model.selectionProperty().get();
    OncePerPulse.keep(
        this,
        this::follow,
        model.sketchProperty(),
        model.assessmentProperty(),
        model.selectionProperty());
  }

  /** Shows the working of a readout until another part is selected. */
  public void show(Headline headline) {
    this.headline = Optional.of(headline);
    shown = model.selectionProperty().get();
    follow();
  }

  private void follow() {
    Part selected = model.selectionProperty().get();
    if (!selected.equals(shown)) {
      shown = selected;
      headline = Optional.empty();
    }
    Sketch sketch = model.sketch();
    Working working =
        headline
            .map(wanted -> Working.of(wanted, sketch.joint(), model.assessment(), sketch.units()))
            .orElseGet(
                () -> Working.of(selected, sketch.joint(), model.assessment(), sketch.units()));
    title.getChildren().setAll(texts(working.title(), "working-title"));
    title.setAccessibleText(working.title());
    grid.getChildren().clear();
    int row = 0;
    for (Step step : working.steps()) {
      add(step, row++);
    }
  }

  private void add(Step step, int row) {
    grid.add(cell(step.label(), "working-label"), 0, row);
    if (step.isRemark()) {
      grid.add(cell(step.formula(), "working-remark"), 1, row, 3, 1);
    } else {
      grid.add(cell(step.formula(), "working-formula"), 1, row);
      grid.add(cell(step.numbers(), "working-numbers"), 2, row);
      grid.add(cell(step.result(), "working-result"), 3, row);
    }
    grid.add(cell(step.source(), "working-source"), 4, row);
  }

  private static TextFlow cell(String text, String style) {
    TextFlow cell = new TextFlow();
    cell.getChildren().setAll(texts(text, style));
    return cell;
  }

  /** The text with what follows an underscore set low, as in k_m. */
  private static List<Text> texts(String text, String style) {
    List<Text> texts = new ArrayList<>();
    Matcher low = LOW.matcher(text);
    int end = 0;
    while (low.find()) {
      texts.add(text(text.substring(end, low.start()), style));
      Text index = text(low.group(1), style);
      index.getStyleClass().add("working-index");
      index.setTranslateY(3);
      texts.add(index);
      end = low.end();
    }
    texts.add(text(text.substring(end), style));
    return texts;
  }

  private static Text text(String text, String style) {
    Text node = new Text(text);
    node.getStyleClass().addAll("working-text", style);
    return node;
  }
}

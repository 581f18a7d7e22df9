package clampwright.view.found;

import clampwright.quantity.Dimension;
import clampwright.quantity.Quantities;
import clampwright.quantity.UnitSystem;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;

/** A number with its name and unit; pressing it opens the working behind it. */
final class Readout extends Button {
  private final Finding finding;
  private final Label value = styled("readout-value");
  private final Label unit = styled("readout-unit");

  Readout(Finding finding) {
    this.finding = finding;
    getStyleClass().setAll("readout");
    setId(finding.id());
    Label name = styled("readout-name");
    name.setText(finding.label());
    Label index = styled("readout-index");
    index.setText(finding.index());
    index.setTranslateY(3);
    HBox title = new HBox(1, name, index);
    HBox number = new HBox(5, value, unit);
    title.setAlignment(Pos.BASELINE_LEFT);
    number.setAlignment(Pos.BASELINE_LEFT);
    value.setId(finding.id() + "-value");
    VBox content = new VBox(title, number);
    content.setMouseTransparent(true);
    setGraphic(content);
    setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
    setAlignment(Pos.TOP_LEFT);
    setMaxWidth(Double.MAX_VALUE);
  }

  private static Label styled(String style) {
    Label label = new Label();
    label.getStyleClass().add(style);
    label.setMinWidth(USE_PREF_SIZE);
    return label;
  }

  void show(double number, UnitSystem units) {
    Dimension dimension = finding.dimension();
    String text = Quantities.number(dimension, units, number);
    String symbol = Quantities.unit(dimension, units);
    if (!text.equals(value.getText()) || !symbol.equals(unit.getText())) {
      value.setText(text);
      unit.setText(symbol);
      setAccessibleText(finding.title() + " " + text + " " + symbol);
    }
  }
}

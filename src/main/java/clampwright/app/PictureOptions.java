package clampwright.app;

import clampwright.figure.PictureFigure;
import clampwright.figure.Preset;
import clampwright.figure.Show;
import clampwright.quantity.UnitSystem;
import clampwright.store.PictureFormat;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.Separator;
import javafx.scene.control.TextField;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;

/** What is asked of a picture, as controls. */
final class PictureOptions extends VBox {
  private static final double SCREEN = 96;

  private final ComboBox<Preset> preset = box(Preset.values());
  private final ComboBox<Picture.Theme> theme = box(Picture.Theme.values());
  private final ComboBox<PictureFormat> kind = box(PictureFormat.values());
  private final ComboBox<Integer> dpi = new ComboBox<>();
  private final ComboBox<Optional<UnitSystem>> units = new ComboBox<>();
  private final TextField caption = new TextField();
  private final CheckBox carries = new CheckBox("opens again as this sketch");
  private final Map<Show, CheckBox> shows = new EnumMap<>(Show.class);

  /**
   * The controls.
   *
   * @param changed called after each change
   */
  PictureOptions(Runnable changed) {
    getStyleClass().add("picture-options");
    preset.setConverter(named(Preset::title));
    preset.setValue(Preset.PAGE);
    theme.setConverter(named(Picture.Theme::title));
    theme.setValue(Picture.Theme.LIGHT);
    kind.setConverter(named(PictureFormat::name));
    kind.setValue(PictureFormat.PNG);
    dpi.getItems().setAll(96, 150, 200, 300, 600);
    dpi.setConverter(named(value -> value + " dpi"));
    dpi.setValue(300);
    units
        .getItems()
        .setAll(
            List.of(
                Optional.empty(), Optional.of(UnitSystem.METRIC), Optional.of(UnitSystem.INCH)));
    units.setConverter(named(PictureOptions::words));
    units.setValue(Optional.empty());
    units.setId("picture-units");
    preset.setId("picture-preset");
    theme.setId("picture-theme");
    kind.setId("picture-kind");
    dpi.setId("picture-dpi");
    caption.setId("picture-caption");
    caption.setPromptText("a sentence below the picture");
    GridPane grid = new GridPane();
    grid.setHgap(10);
    grid.setVgap(8);
    grid.addRow(0, new Label("For"), preset);
    grid.addRow(1, new Label("Colours"), theme);
    grid.addRow(2, new Label("Units"), units);
    grid.addRow(3, new Label("File"), kind);
    grid.addRow(4, new Label("Resolution"), dpi);
    grid.addRow(5, new Label("Caption"), caption);
    getChildren().add(grid);
    carries.setId("picture-carries");
    carries.setSelected(true);
    for (Show show : Show.values()) {
      CheckBox check = new CheckBox(show.title());
      check.setId("picture-show-" + show.word());
      check.setSelected(Show.USUAL.contains(show));
      check.setOnAction(event -> changed.run());
      shows.put(show, check);
      getChildren().add(check);
    }
    Separator line = new Separator();
    getChildren().addAll(line, carries);
    Stream.of(preset, theme, units, kind, dpi)
        .forEach(
            box -> {
              box.setMaxWidth(Double.MAX_VALUE);
              box.valueProperty().addListener(observable -> follow(changed));
            });
    caption.textProperty().addListener(observable -> changed.run());
  }

  private static String words(Optional<UnitSystem> units) {
    if (units.isEmpty()) {
      return "as on the screen";
    }
    return units.get() == UnitSystem.METRIC ? "mm · N" : "in · lbf";
  }

  private static <T> ComboBox<T> box(T[] values) {
    ComboBox<T> box = new ComboBox<>();
    box.getItems().setAll(values);
    return box;
  }

  private static <T> StringConverter<T> named(java.util.function.Function<T, String> name) {
    return new StringConverter<>() {
      @Override
      public String toString(T value) {
        return value == null ? "" : name.apply(value);
      }

      @Override
      public T fromString(String text) {
        throw new UnsupportedOperationException("chosen from the list only");
      }
    };
  }

  private void follow(Runnable changed) {
    dpi.setDisable(kind.getValue() != PictureFormat.PNG);
    changed.run();
  }

  /** The picture that is asked for, of a load case. */
  Picture picture(int loadCase) {
    Set<Show> shown = EnumSet.noneOf(Show.class);
    shows.forEach(
        (show, check) -> {
          if (check.isSelected()) {
            shown.add(show);
          }
        });
    PictureFigure.Request request =
        new PictureFigure.Request(preset.getValue(), shown, caption.getText(), loadCase);
    double resolution = kind.getValue() == PictureFormat.PNG ? dpi.getValue() : SCREEN;
    return new Picture(
        kind.getValue(),
        theme.getValue(),
        resolution,
        carries.isSelected(),
        units.getValue(),
        request);
  }
}

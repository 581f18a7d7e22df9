package clampwright.view.given;

import clampwright.edit.SketchModel;
import clampwright.joint.Part;
import clampwright.view.Headings;
import java.util.List;
import java.util.Optional;
import javafx.css.PseudoClass;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.VBox;

/** All inputs of the sketch as fields. */
public final class GivenPane extends ScrollPane {
  private static final PseudoClass CHOSEN = PseudoClass.getPseudoClass("chosen");

  private final SketchModel model;
  private final Section fastener;
  private final Section tightening;
  private final Section load;
  private final Section method;
  private final Section part;

  public GivenPane(SketchModel model) {
    this.model = model;
    getStyleClass().add("given");
    fastener = new FastenerSection(model);
    tightening = new TighteningSection(model);
    load = new LoadSection(model);
    method = new MethodSection(model);
    part = new PartSection(model);
    VBox sheet =
        new VBox(
            Headings.pane("Given"),
            fastener,
            tightening,
            load,
            method,
            new CriteriaSection(model),
            part);
    sheet.getStyleClass().add("sheet");
    setContent(sheet);
    setFitToWidth(true);
    setHbarPolicy(ScrollBarPolicy.NEVER);
    setAccessibleText("Given");
    model.selectionProperty().subscribe((Part was, Part is) -> reveal());
    reveal();
  }

  /** Marks the section with the selected part's fields, and scrolls to it if need be. */
  private void reveal() {
    Optional<Section> chosen = section(model.selection());
    for (Section section : List.of(fastener, tightening, load, method, part)) {
      section.pseudoClassStateChanged(CHOSEN, chosen.equals(Optional.of(section)));
    }
    if (getScene() != null && !isFocusWithin()) {
      chosen.ifPresent(this::scrollTo);
    }
  }

  private Optional<Section> section(Part selected) {
    return switch (selected.kind()) {
      case JOINT, NOTE -> Optional.empty();
      case HEAD, SHANK, ANCHOR -> Optional.of(fastener);
      case HEAD_CONE, NUT_CONE -> Optional.of(method);
      case LOAD -> Optional.of(load);
      case PRELOAD -> Optional.of(tightening);
      case ELEMENT -> Optional.of(part);
    };
  }

  private void scrollTo(Section section) {
    applyCss();
    layout();
    double shown = getViewportBounds().getHeight();
    double room = getContent().getBoundsInLocal().getHeight() - shown;
    if (room > 0) {
      double from = section.getBoundsInParent().getMinY();
      double to = section.getBoundsInParent().getMaxY() + 8 - shown;
      double top = Math.min(from, Math.max(to, getVvalue() * room));
      setVvalue(Math.max(0, Math.min(1, top / room)));
    }
  }
}

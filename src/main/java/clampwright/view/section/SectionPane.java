package clampwright.view.section;

import clampwright.edit.Interfaces;
import clampwright.edit.SketchModel;
import clampwright.figure.Figure;
import clampwright.figure.HitTest;
import clampwright.figure.SectionFigure;
import clampwright.figure.Sheet;
import clampwright.figure.Tag;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.paint.canvas.FigureCanvas;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.value.ObservableValue;
import javafx.scene.AccessibleAttribute;
import javafx.scene.AccessibleRole;
import javafx.scene.Scene;
import javafx.scene.layout.Region;
import javafx.stage.Window;

/**
 * The drawing of the joint, to be drawn on. Shows the sketch of its model, and previews in the
 * model what the hand does, so that every number elsewhere follows.
 *
 * <p>It paints once per pulse, however often the model changes until then.
 */
public final class SectionPane extends Region {
  /**
   * A key of the drawing.
   *
   * @param name as it is called
   * @param does what it does there
   */
  public record Key(String name, String does) {}

  /** How far from a line the pointer still means it [sheet mm]. */
  private static final double REACH = 1.4;

  /** How far beyond the ends of the stack a drag still draws [sheet mm]. */
  private static final double BESIDE = 20;

  private final SketchModel model;
  private final FigureCanvas canvas = new FigureCanvas();
  private final Region focusRing = new Region();
  private final ValueLabel value = new ValueLabel();
  private final Viewport viewport = new Viewport();
  private final ObjectProperty<Tool> tool = new SimpleObjectProperty<>(this, "tool", Tool.SELECT);
  private final ReadOnlyStringWrapper hint = new ReadOnlyStringWrapper(this, "hint", "");
  private final SectionInput input;
  private final SectionMenu menu;
  private final CardPlace card;

  private Optional<Tag> hot = Optional.empty();
  private Optional<Figure> figure = Optional.empty();

  /** Whether the sheet is to be laid out anew if the joint has outgrown it. */
  private boolean follow;

  public SectionPane(SketchModel model) {
    this.model = model;
    setId("section");
    getStyleClass().add("section-pane");
    focusRing.getStyleClass().add("focus-ring");
    focusRing.setMouseTransparent(true);
    focusRing.visibleProperty().bind(focusedProperty());
    canvas.setMouseTransparent(true);
    card = new CardPlace(this, model);
    getChildren().addAll(canvas, focusRing, value, card.node());
    setFocusTraversable(true);
    setAccessibleRole(AccessibleRole.IMAGE_VIEW);
    setAccessibleRoleDescription("drawing");
    input = new SectionInput(this, model);
    menu = new SectionMenu(this, model);
    observe();
  }

  /** Follows the model while shown, so that the model does not keep a closed pane alive. */
  private void observe() {
    ObservableValue<Boolean> shown =
        sceneProperty()
            .flatMap(Scene::windowProperty)
            .flatMap(Window::showingProperty)
            .orElse(false);
    model.sketchProperty().when(shown).subscribe((Sketch sketch) -> changed());
    model.selectionProperty().when(shown).subscribe((Part part) -> selected());
    model.shownCaseProperty().when(shown).subscribe((Number index) -> redraw());
    model.openedProperty().when(shown).subscribe((Sketch sketch) -> viewport.beginAnew());
    viewport.sheetProperty().subscribe((Sheet sheet) -> redraw());
    tool.subscribe((Tool taken) -> redraw());
  }

  /** The keys that mean something while the drawing has the focus, besides those of the menus. */
  public static List<Key> keys() {
    return SectionKeys.LIST;
  }

  /** The tool in the hand; it is laid down after each use. */
  public ObjectProperty<Tool> toolProperty() {
    return tool;
  }

  Tool tool() {
    return tool.get();
  }

  void setTool(Tool tool) {
    this.tool.set(tool);
  }

  /** What can be done now, in a sentence. */
  public ReadOnlyStringProperty hintProperty() {
    return hint.getReadOnlyProperty();
  }

  void say(String sentence) {
    hint.set(sentence);
  }

  /** Zooms about the middle of the sheet; above 1 enlarges. */
  public void zoom(double factor) {
    viewport.zoom(factor, getWidth() / 2, getHeight() / 2);
  }

  /** Brings the whole joint into sight, and keeps it there from now on. */
  public void fit() {
    viewport.fit(model.sketch());
  }

  Viewport viewport() {
    return viewport;
  }

  ValueLabel value() {
    return value;
  }

  /** Says why something cannot be done. */
  void refuse(String sentence) {
    input.refuse(sentence);
  }

  void setHot(Optional<Tag> tag) {
    if (!tag.equals(hot)) {
      hot = tag;
      redraw();
    }
  }

  /** Puts away what lies over the sheet; whether that could be done. */
  boolean clearDesk() {
    menu.hide();
    return card.close();
  }

  void goOn(Gesture gesture) {
    input.goOn(gesture);
  }

  /** Opens the card of the selected part, beside the pointer or else beside the part. */
  void openCard(Pointer at) {
    card.open(at);
  }

  /** Opens the card of the selected part, as for a part just added from a menu. */
  public void openCardOfSelection() {
    requestFocus();
    openCard();
  }

  boolean hasCard() {
    return card.isOpen();
  }

  void openCard() {
    openCard(besideSelection());
  }

  private void changed() {
    follow |= !model.isPreviewing();
    notifyAccessibleAttributeChanged(AccessibleAttribute.TEXT);
    redraw();
  }

  private void selected() {
    card.follow();
    redraw();
  }

  /** After a gesture: keeps the joint in sight. */
  void followSketch() {
    follow = true;
    redraw();
  }

  private void redraw() {
    figure = Optional.empty();
    requestLayout();
  }

  /** What is drawn; made when first asked for after a change. */
  Figure figure() {
    if (figure.isEmpty()) {
      SectionFigure.Options options =
          new SectionFigure.Options(model.selection(), hot, true, model.loadCase());
      figure =
          Optional.of(
              SectionFigure.of(model.sketch(), model.assessment(), viewport.sheet(), options));
    }
    return figure.get();
  }

  /** What has been drawn since the last change; empty until the next pulse. */
  Optional<Figure> drawn() {
    return figure;
  }

  /** What lies under the pointer. */
  Optional<Tag> hit(Pointer pointer) {
    return HitTest.at(figure(), viewport.point(pointer.x(), pointer.y()), REACH);
  }

  /** Whether a drag from here would draw: on the height of the stack, or anywhere without one. */
  boolean isBesideStack(Pointer pointer) {
    double beyond = BESIDE / viewport.sheet().scale();
    double thickness = model.sketch().joint().stackThickness();
    double z = viewport.z(pointer);
    return thickness == 0 || z >= -beyond && z <= thickness + beyond;
  }

  /**
   * Where typed digits are shown that no pointer holds: at the selected part, else in the middle.
   */
  Pointer besideSelection() {
    Part part = model.selection();
    double z =
        part.isElement()
            ? Interfaces.position(model.sketch().joint(), part.index() + 1)
            : model.sketch().joint().stackThickness() / 2;
    Sheet sheet = viewport.sheet();
    return new Pointer(
        sheet.axisX() * FigureCanvas.PIXELS_PER_MM,
        sheet.y(z) * FigureCanvas.PIXELS_PER_MM,
        false,
        false);
  }

  @Override
  protected void layoutChildren() {
    if (viewport.isOtherSize(getWidth(), getHeight())) {
      viewport.resize(model.sketch(), getWidth(), getHeight());
    } else if (follow) {
      viewport.follow(model.sketch());
    }
    follow = false;
    input.pointAgain();
    canvas.resizeRelocate(0, 0, getWidth(), getHeight());
    focusRing.resizeRelocate(0, 0, getWidth(), getHeight());
    canvas.setFigure(figure());
    card.layout();
  }

  @Override
  protected double computePrefWidth(double height) {
    return 640;
  }

  @Override
  protected double computePrefHeight(double width) {
    return 480;
  }

  @Override
  protected double computeMinWidth(double height) {
    return 200;
  }

  @Override
  protected double computeMinHeight(double width) {
    return 120;
  }

  @Override
  public Object queryAccessibleAttribute(AccessibleAttribute attribute, Object... parameters) {
    return attribute == AccessibleAttribute.TEXT
        ? Description.of(model.sketch(), model.selection())
        : super.queryAccessibleAttribute(attribute, parameters);
  }
}

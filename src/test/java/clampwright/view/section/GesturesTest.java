package clampwright.view.section;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.edit.Noting;
import clampwright.figure.Mark;
import clampwright.figure.Role;
import clampwright.figure.Sheet;
import clampwright.joint.Element;
import clampwright.joint.Feature;
import clampwright.joint.Introduction;
import clampwright.joint.Note;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.view.Sketches;
import java.util.List;
import javafx.geometry.Point2D;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.stage.Stage;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;

/** Every gesture on the section with a real pointer; each is one step that undo takes back. */
@ExtendWith(ApplicationExtension.class)
class GesturesTest {
  private static final int COVER = 1;
  private static final int SPACER = 2;
  private static final int FLANGE = 3;

  private SectionScene section;
  private Sketch before;
  private FxRobot robot;

  @Start
  void start(Stage stage) {
    section = new SectionScene(stage, Sketches.cover());
  }

  @BeforeEach
  void takeRobot(FxRobot robot) {
    this.robot = robot;
    WaitForAsyncUtils.waitForFxEvents();
    before = section.model.sketch();
  }

  /** Whatever was done, undo leads back to where it began. */
  @AfterEach
  void undoLeadsBack() {
    robot.interact(
        () -> {
          while (!section.model.undoNameProperty().get().isEmpty()) {
            section.model.undo();
          }
        });
    assertEquals(before, section.model.sketch());
  }

  @Test
  void aClickOnAnInsertionGripInsertsALayerThere() {
    robot.clickOn(grip(SPACER));
    assertEquals(List.of("Washer", "Cover", "Spacer", "Flange"), names(List.of(0, 1, 3, 4)));
    oneStep();
  }

  @Test
  void aDragFromAnInsertionGripDrawsItsThickness() {
    robot.drag(grip(SPACER), MouseButton.PRIMARY).moveBy(0, 4);
    robot.moveBy(0, section.pixels(5) - 4).drop();
    assertEquals(5, section.elements().size());
    assertEquals(5, section.element(2).thickness(), 0.6);
    oneStep();
  }

  @Test
  void anOuterEdgeIsDragged() {
    Point2D edge = section.at(11, section.middle(SPACER));
    robot.drag(edge, MouseButton.PRIMARY).moveBy(4, 0).moveBy(section.pixels(3) - 4, 0).drop();
    Outline.Round round = (Outline.Round) section.element(SPACER).outline();
    assertEquals(28, round.diameter(), 1);
    oneStep();
  }

  @Test
  void aStraightEdgeIsDraggedAlone() {
    Point2D edge = section.at(-21, section.middle(FLANGE));
    robot.drag(edge, MouseButton.PRIMARY).moveBy(4, 0).moveBy(section.pixels(5) - 4, 0).drop();
    Outline.Strip strip = (Outline.Strip) section.element(FLANGE).outline();
    assertEquals(16, strip.left(), 0.6);
    assertEquals(60, strip.right());
    oneStep();
  }

  @Test
  void aHoleEdgeIsDragged() {
    Point2D edge = section.at(5.5, section.middle(FLANGE));
    robot.drag(edge, MouseButton.PRIMARY).moveBy(4, 0).moveBy(section.pixels(1) - 4, 0).drop();
    assertEquals(13, section.element(FLANGE).hole(), 0.6);
    assertEquals(11, section.element(COVER).hole());
    oneStep();
  }

  @Test
  void theShankStepsThroughTheThreadsAndHolesFollow() {
    Mark.Path shank =
        section.pane.figure().marks().stream()
            .filter(mark -> mark.tag().feature().filter(Feature.SHANK_EDGE::equals).isPresent())
            .filter(Mark.Path.class::isInstance)
            .map(Mark.Path.class::cast)
            .findFirst()
            .orElseThrow();
    double x = shank.points().get(0).x();
    Point2D edge = section.screen(x, section.sheet().y(section.middle(FLANGE) - 4));
    double outward = x > section.sheet().axisX() ? 1 : -1;
    robot.drag(edge, MouseButton.PRIMARY).moveBy(4 * outward, 0);
    robot.moveBy(outward * (section.pixels(1) - 4), 0).drop();
    assertEquals("M12", section.model.sketch().joint().fastener().thread().designation());
    assertEquals(13.5, section.element(COVER).hole());
    oneStep();
  }

  @Test
  void aBodyIsDraggedToAnotherPlace() {
    Point2D body = section.at(14, section.middle(FLANGE));
    robot.drag(body, MouseButton.PRIMARY).moveBy(0, -5);
    robot.moveTo(section.at(14, section.top(COVER) + 1)).drop();
    assertEquals(List.of("Washer", "Flange", "Cover", "Spacer"), names(List.of(0, 1, 2, 3)));
    oneStep();
  }

  @Test
  void theWasherToolPutsAWasherUnderTheNutWithAClick() {
    robot.clickOn(section.at(14, section.middle(FLANGE)));
    robot.press(KeyCode.W).release(KeyCode.W);
    robot.clickOn(section.at(14, section.bottom(FLANGE) + 1));
    Element last = section.element(4);
    assertTrue(last.isWasher());
    // ISO 7089 size 10: 2 mm thick, 20 mm wide.
    assertEquals(2, last.thickness());
    assertEquals(new Outline.Round(20), last.outline());
    assertEquals(Tool.SELECT, section.pane.tool());
    oneStep();
  }

  @Test
  void theWasherToolDrawsAWasherUnderTheHead() {
    robot.interact(() -> section.pane.setTool(Tool.WASHER));
    robot.drag(section.at(14, -1), MouseButton.PRIMARY).moveBy(0, 4);
    robot.moveBy(0, section.pixels(3) - 4).drop();
    assertTrue(section.element(0).isWasher());
    assertTrue(section.element(1).isWasher());
    assertEquals(3, section.element(0).thickness(), 0.6);
    oneStep();
  }

  @Test
  void barePaperDraggedSidewaysMovesTheSheet() {
    Sheet sheet = section.sheet();
    robot.drag(section.screen(40, sheet.height() - 4), MouseButton.PRIMARY);
    robot.moveBy(30, 0).moveBy(20, 0).drop();
    assertEquals(50, (section.sheet().axisX() - sheet.axisX()) * 96 / 25.4, 1.5);
    assertEquals(sheet.scale(), section.sheet().scale());
  }

  @Test
  void theMiddleButtonMovesTheSheetFromAnywhere() {
    Sheet sheet = section.sheet();
    robot.drag(section.at(14, section.middle(FLANGE)), MouseButton.MIDDLE);
    robot.moveBy(0, 30).drop();
    assertEquals(30, (section.sheet().headY() - sheet.headY()) * 96 / 25.4, 1.5);
    assertEquals(before, section.model.sketch());
  }

  @Test
  void aDoubleClickOpensTheCardAndEscapeClosesIt() {
    robot.doubleClickOn(section.at(14, section.middle(FLANGE)), MouseButton.PRIMARY);
    assertTrue(section.pane.hasCard());
    robot.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
    assertFalse(section.pane.hasCard());
    assertEquals(Part.element(FLANGE), section.model.selection());
  }

  @Test
  void theArrowKeysSelectFromHeadToNut() {
    robot.clickOn(section.at(14, section.middle(COVER)));
    robot.press(KeyCode.DOWN).release(KeyCode.DOWN);
    assertEquals(Part.element(SPACER), section.model.selection());
    robot.press(KeyCode.DOWN).release(KeyCode.DOWN).press(KeyCode.DOWN).release(KeyCode.DOWN);
    assertEquals(Part.ANCHOR, section.model.selection());
  }

  @Test
  void theValueStandsAtThePointerWhileDragging() {
    Point2D face = section.at(9, section.bottom(FLANGE));
    robot.drag(face, MouseButton.PRIMARY).moveBy(0, 4);
    robot.moveBy(0, section.pixels(4) - 4);
    WaitForAsyncUtils.waitForFxEvents();
    assertTrue(section.pane.value().isVisible());
    String value = robot.lookup("#drag-value").queryLabeled().getText();
    assertTrue(value.contains("mm"), value);
    robot.drop();
    assertFalse(section.pane.value().isVisible());
    assertNotEquals(16, section.element(FLANGE).thickness());
    oneStep();
  }

  @Test
  void theLoadArrowIsDraggedOut() {
    robot
        .drag(arrow(Feature.LOAD_AT_HEAD), MouseButton.PRIMARY)
        .moveBy(0, -4)
        .moveBy(0, -26)
        .drop();
    double axial = section.model.sketch().joint().service().loads().get(0).axialMax();
    assertTrue(axial > 6_000, "load " + axial);
    oneStep();
  }

  @Test
  void theLoadIsDraggedToThePartItEntersAt() {
    robot.drag(ring(Feature.LOAD_ENTERS), MouseButton.PRIMARY).moveBy(0, 4);
    robot.moveTo(section.at(14, section.middle(SPACER))).drop();
    assertEquals(
        new Introduction.Planes(SPACER, FLANGE),
        section.model.sketch().joint().service().loads().get(0).introduction());
    oneStep();
  }

  @Test
  void thePreloadArrowIsDraggedIn() {
    robot.drag(arrow(Feature.PRELOAD_SIZE), MouseButton.PRIMARY).moveBy(0, 4).moveBy(0, 20).drop();
    Target.Force force = (Target.Force) section.model.sketch().joint().tightening().target();
    assertTrue(force.force() < 25_000, "preload " + force);
    oneStep();
  }

  @Test
  void aNoteIsDraggedAboutAndDeletedByKey() {
    robot.interact(
        () -> section.model.change(Noting.added(section.model.sketch(), Part.element(COVER))));
    WaitForAsyncUtils.waitForFxEvents();
    Note placed = section.model.sketch().notes().get(0);
    double z = section.middle(COVER) + placed.z();
    Point2D words = section.at(placed.fromAxis() + 0.6, z - 0.4);
    robot.drag(words, MouseButton.PRIMARY).moveBy(0, -8).moveBy(30, -32).drop();
    Note moved = section.model.sketch().notes().get(0);
    assertTrue(moved.fromAxis() > placed.fromAxis() && moved.z() < placed.z(), moved::toString);
    assertEquals(Part.note(0), section.model.selection());
    robot.press(KeyCode.DELETE).release(KeyCode.DELETE);
    assertTrue(section.model.sketch().notes().isEmpty());
  }

  /** The middle of an arrow. */
  private Point2D arrow(Feature feature) {
    Mark.Arrow arrow =
        section.pane.figure().marks().stream()
            .filter(Mark.Arrow.class::isInstance)
            .map(Mark.Arrow.class::cast)
            .filter(mark -> mark.tag().feature().filter(feature::equals).isPresent())
            .findFirst()
            .orElseThrow();
    double y = (arrow.from().y() + arrow.to().y()) / 2;
    return section.screen(arrow.from().x(), y);
  }

  private Point2D ring(Feature feature) {
    Mark.Disc disc =
        section.pane.figure().marks().stream()
            .filter(Mark.Disc.class::isInstance)
            .map(Mark.Disc.class::cast)
            .filter(mark -> mark.tag().feature().filter(feature::equals).isPresent())
            .findFirst()
            .orElseThrow();
    return section.screen(disc.centre().x(), disc.centre().y());
  }

  private void oneStep() {
    WaitForAsyncUtils.waitForFxEvents();
    assertNotEquals(before, section.model.sketch());
    robot.interact(section.model::undo);
    assertEquals(before, section.model.sketch());
    assertEquals("", section.model.undoNameProperty().get());
    robot.interact(section.model::redo);
    assertNotEquals(before, section.model.sketch());
  }

  private List<String> names(List<Integer> places) {
    return places.stream().map(i -> section.element(i).name()).toList();
  }

  /** The insertion grip above an element. */
  private Point2D grip(int element) {
    Mark.Disc disc =
        section.pane.figure().marks().stream()
            .filter(mark -> mark.role() == Role.INSERT_GRIP)
            .filter(mark -> mark.tag().part().equals(Part.element(element)))
            .filter(Mark.Disc.class::isInstance)
            .map(Mark.Disc.class::cast)
            .findFirst()
            .orElseThrow();
    return section.screen(disc.centre().x(), disc.centre().y());
  }
}

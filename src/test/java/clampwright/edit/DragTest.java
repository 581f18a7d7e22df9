package clampwright.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Anchor;
import clampwright.joint.AngleRule;
import clampwright.joint.Element;
import clampwright.joint.Feature;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.UnitSystem;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The arithmetic of drags, on the stack Washer 0–2, Cover 2–12 wide, Spacer 12–18 Ø 24, Flange
 * 18–34 with edges at 20 left and 30 right; holes 11, the washer's 10.5.
 */
class DragTest {
  private static final Snap MILLIMETRE = new Snap(1);
  private final Sketch start = Sketches.mixed();

  private Drag drag(int element, Feature feature, double fromAxis, double z) {
    return Drag.start(start, Part.element(element), feature, fromAxis, z).orElseThrow();
  }

  private static Element element(Dragged dragged, int index) {
    return dragged.sketch().joint().elements().get(index);
  }

  @ParameterizedTest
  @CsvSource({
    // element, feature, grabbed at fromAxis and z, dragged to fromAxis and z, value, label
    "1, FACE, 30, 12, 30, 15, 13, thickness",
    "1, FACE, 30, 12.2, 90, 15.4, 13, thickness",
    "1, FACE, 30, 12, 30, 7.6, 6, thickness",
    "1, FACE, 30, 12, 30, -50, 1, thickness",
    "2, RIGHT_EDGE, 12, 15, 14, 40, 28, outside diameter",
    "2, LEFT_EDGE, -12, 15, -14, 15, 28, outside diameter",
    "2, LEFT_EDGE, -12.3, 15, -14.3, 15, 28, outside diameter",
    "2, RIGHT_EDGE, 12, 15, -9, 15, 12, outside diameter",
    "1, RIGHT_EDGE, 40, 5, 35, 5, 70, outside diameter",
    "3, LEFT_EDGE, -20, 20, -24.4, 20, 24, 'edge distance, left'",
    "3, RIGHT_EDGE, 30, 20, 24.4, 20, 24, 'edge distance, right'",
    "3, RIGHT_EDGE, 30, 20, 1, 20, 6, 'edge distance, right'",
    "1, HOLE_EDGE, 5.5, 5, 6.5, 5, 13, hole",
    "1, HOLE_EDGE, -5.5, 5, -6.5, 5, 13, hole",
    "2, HOLE_EDGE, 5.5, 15, 40, 15, 23, hole"
  })
  void aLengthFollowsThePointer(
      int element,
      Feature feature,
      double fromX,
      double fromZ,
      double toX,
      double toZ,
      double value,
      String label) {
    Dragged dragged = drag(element, feature, fromX, fromZ).at(toX, toZ, MILLIMETRE);
    assertEquals(value, dragged.value(), 1e-12);
    assertEquals(label, dragged.label());
    assertEquals(value, measured(element(dragged, element), feature), 1e-12);
  }

  private static double measured(Element element, Feature feature) {
    Outline outline = element.outline();
    boolean strip = outline instanceof Outline.Strip;
    return switch (feature) {
      case FACE -> element.thickness();
      case HOLE_EDGE -> element.hole();
      case LEFT_EDGE -> outline.leftReach() * (strip ? 1 : 2);
      default -> outline.rightReach() * (strip ? 1 : 2);
    };
  }

  @Test
  void aThickerPartMovesTheStackBelowIt() {
    Dragged dragged = drag(1, Feature.FACE, 30, 12).at(30, 15, MILLIMETRE);
    assertEquals(15, Interfaces.position(dragged.sketch().joint(), 2));
    assertEquals(start.joint().elements().get(2), element(dragged, 2));
    assertEquals("Change thickness of Cover", dragged.step());
    assertEquals("thickness 13 mm", dragged.caption());
  }

  @Test
  void aWidePartDraggedByItsEdgeBecomesRound() {
    Dragged dragged = drag(1, Feature.LEFT_EDGE, -40, 5).at(-30, 5, MILLIMETRE);
    assertEquals(new Outline.Round(60), element(dragged, 1).outline());
  }

  @ParameterizedTest
  @CsvSource({"FACE", "RIGHT_EDGE", "LEFT_EDGE", "HOLE_EDGE", "BODY", "SHANK_EDGE", "INSERT"})
  void aDragThatStaysOrComesBackChangesNothing(Feature feature) {
    Drag drag = drag(2, feature, 11.3, 17.9);
    drag.at(40, 60, MILLIMETRE);
    assertEquals(start, drag.at(11.3, 17.9, MILLIMETRE).sketch());
  }

  @Test
  void withoutSnappingTheValueIsThePointers() {
    assertEquals(11.234, drag(1, Feature.FACE, 30, 12).at(30, 13.234, Snap.FREE).value(), 1e-12);
  }

  @ParameterizedTest
  @CsvSource({"METRIC, 12, 0.1", "METRIC, 2, 0.5", "METRIC, 1, 1", "METRIC, 0.01, 5"})
  void stepsAreWhatTheHandCanHit(UnitSystem units, double scale, double step) {
    assertEquals(step, Snap.of(units, scale).step());
  }

  @ParameterizedTest
  @CsvSource({"2, 64", "1, 32", "0.5, 16", "0.01, 8"})
  void stepsInInchesAreBinaryParts(double scale, double parts) {
    assertEquals(25.4 / parts, Snap.of(UnitSystem.INCH, scale).step());
  }

  @Test
  void anInchReaderDragsInSixteenths() {
    Sketch inch = start.withUnits(UnitSystem.INCH);
    Drag drag = Drag.start(inch, Part.element(1), Feature.FACE, 30, 12).orElseThrow();
    Dragged dragged = drag.at(30, 14.9, new Snap(25.4 / 16));
    assertEquals(12.7, dragged.value());
    assertEquals("0.5 in", dragged.text());
  }

  @ParameterizedTest
  @CsvSource({"'6,5', 6.5", "1/4 in, 6.35", "0.25in, 6.35", "16 mm, 16", "0.001, 0.001"})
  void typedDigitsAreTakenExactly(String text, double value) {
    Typed typed = drag(1, Feature.FACE, 30, 12).typed(text);
    Dragged dragged = assertInstanceOf(Typed.Value.class, typed).dragged();
    assertEquals(value, element(dragged, 1).thickness(), 1e-12);
  }

  @ParameterizedTest
  @CsvSource({
    "1, FACE, 0, The thickness must be above 0.",
    "1, FACE, -2, The thickness must be above 0.",
    "1, HOLE_EDGE, 0 mm, The hole must be above 0.",
    "1, BODY, 5, The place is a whole number from 1 to 4.",
    "1, BODY, 1.5, The place is a whole number from 1 to 4.",
    "1, SHANK_EDGE, 11, No thread of this series measures 11 mm; the nearest is M10."
  })
  void typedValuesThatCannotBeSayWhy(int element, Feature feature, String text, String problem) {
    Typed typed = drag(element, feature, 5.5, 12).typed(text);
    assertEquals(problem, assertInstanceOf(Typed.Wrong.class, typed).problem());
  }

  @Test
  void exactlyRefusesWhatTypingRefuses() {
    Drag drag = drag(1, Feature.FACE, 30, 12);
    assertThrows(IllegalArgumentException.class, () -> drag.exactly(-2));
    assertEquals(7, element(drag.exactly(7), 1).thickness());
  }

  @ParameterizedTest
  @CsvSource({
    // the Cover's mid-plane is at 7, the others' at 1, 15 and 26
    "10, Washer Cover Spacer Flange",
    "10.1, Washer Cover Spacer Flange",
    "18.1, Washer Spacer Cover Flange",
    "29.1, Washer Spacer Flange Cover",
    "99, Washer Spacer Flange Cover",
    "3.9, Cover Washer Spacer Flange"
  })
  void aBodyChangesPlacesWhenItsMiddlePassesAnother(double z, String order) {
    Dragged dragged = drag(1, Feature.BODY, 30, 10).at(30, z, MILLIMETRE);
    assertEquals(
        List.of(order.split(" ")),
        dragged.sketch().joint().elements().stream().map(Element::name).toList());
    assertEquals("Cover", element(dragged, dragged.part().index()).name());
    assertEquals("Move Cover", dragged.step());
  }

  @Test
  void aTypedPlaceCountsFromTheHead() {
    Dragged dragged = drag(1, Feature.BODY, 30, 10).exactly(4);
    assertEquals("Cover", element(dragged, 3).name());
    assertEquals("4 of 4", dragged.text());
  }

  @ParameterizedTest
  @CsvSource({"5, M10", "5.4, M10", "6, M12", "8.1, M16", "3.9, M8", "0.1, M1.6"})
  void theShankStepsThroughTheSizesOfItsSeries(double radius, String designation) {
    Dragged dragged = drag(0, Feature.SHANK_EDGE, -5, 20).at(-radius, 20, MILLIMETRE);
    assertEquals(designation, dragged.text());
    assertEquals(designation, dragged.sketch().joint().fastener().thread().designation());
  }

  @Test
  void aTypedSizeIsFoundInTheSeries() {
    Typed typed = drag(0, Feature.SHANK_EDGE, 5, 20).typed("16");
    assertEquals("M16", assertInstanceOf(Typed.Value.class, typed).dragged().text());
  }

  @Test
  void theHoleOfATappedLayerIsTheThread() {
    Sketch tapped =
        start.withJoint(
            joint -> joint.withFastener(joint.fastener().withAnchor(new Anchor.Tapped())));
    assertTrue(Drag.start(tapped, Part.element(3), Feature.HOLE_EDGE, 5.5, 20).isEmpty());
    assertTrue(Drag.start(tapped, Part.element(2), Feature.HOLE_EDGE, 5.5, 15).isPresent());
  }

  @ParameterizedTest
  @CsvSource({
    // pressed z, dragged to fromAxis and z, place, thickness, outside diameter (0 = wide)
    "12, 50, 17, 2, 5, 0",
    "11, 51, 16, 2, 5, 0",
    "-9, 50, -4, 1, 5, 0",
    "40, 50, 47, 4, 7, 0",
    "40, 50, 33, 4, 7, 0",
    "12, 20, 22, 2, 10, 40",
    "12, 60, 22, 2, 10, 120",
    "12, 53, 22, 2, 10, 0",
    "12, 2, 22, 2, 10, 13"
  })
  void aLayerIsDrawnAtTheNearestInterface(
      double pressed, double toX, double toZ, int place, double thickness, double diameter) {
    Dragged dragged = Drag.layer(start, 50, pressed).at(toX, toZ, MILLIMETRE);
    Element drawn = element(dragged, place);
    assertEquals("Layer 4", drawn.name());
    assertEquals(Part.element(place), dragged.part());
    assertEquals(thickness, drawn.thickness());
    assertEquals(diameter == 0 ? Outline.WIDE : new Outline.Round(diameter), drawn.outline());
  }

  @Test
  void digitsKeepTheEdgeThatThePointerHasDrawn() {
    Drag drag = Drag.layer(start, 50, 12);
    Drag typing = drag.after(drag.at(20, 22, MILLIMETRE));
    Element drawn = element(typing.exactly(8.5), 2);
    assertEquals(8.5, drawn.thickness());
    assertEquals(new Outline.Round(40), drawn.outline());
  }

  @Test
  void anInsertionGripDrawsWhereItStands() {
    Dragged dragged = drag(3, Feature.INSERT, 30, 18).at(30, 22, MILLIMETRE);
    assertEquals(4, element(dragged, 3).thickness());
    assertEquals("Flange", element(dragged, 4).name());
  }

  @Test
  void aWasherIsDrawnAtItsEnd() {
    Dragged dragged = Drag.washer(start, End.NUT, 20, 34).at(20, 38, MILLIMETRE);
    Element washer = element(dragged, 4);
    assertTrue(washer.isWasher());
    assertEquals(4, washer.thickness());
    // ISO 7089, M10: 10.5 × 20 × 2
    assertEquals(10.5, washer.hole());
    assertEquals(new Outline.Round(20), washer.outline());
  }

  @Test
  void anUnsolvedJointHasNoFlankToDrag() {
    Sketch empty = Sketches.empty();
    assertTrue(Drag.start(empty, Part.HEAD_CONE, Feature.FLANK, 10, 10).isEmpty());
  }

  @Test
  void vdiAnglesStartFromWhatTheyCameTo() {
    Sketch vdi =
        start.withJoint(joint -> joint.withMethod(joint.method().withAngle(AngleRule.VDI_2230)));
    Drag drag = Drag.start(vdi, Part.HEAD_CONE, Feature.FLANK, -11, 6).orElseThrow();
    assertSame(vdi, drag.at(-11, 6, MILLIMETRE).sketch());
    assertEquals(
        AngleRule.FIXED_30, drag.exactly(Math.toRadians(30)).sketch().joint().method().angle());
  }
}

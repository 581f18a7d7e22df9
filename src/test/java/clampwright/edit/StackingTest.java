package clampwright.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Anchor;
import clampwright.joint.Element;
import clampwright.joint.Outline;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.quantity.UnitSystem;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class StackingTest {
  private final Sketch start = Sketches.mixed();

  private static void check(Change change, String name, int then, String... order) {
    assertEquals(name, change.name());
    assertEquals(Part.element(then), change.then());
    assertEquals(
        List.of(order), change.sketch().joint().elements().stream().map(Element::name).toList());
  }

  @Test
  void aLayerComesInAtAnInterface() {
    check(
        Stacking.inserted(start, 2),
        "Insert Layer 4",
        2,
        "Washer",
        "Cover",
        "Layer 4",
        "Spacer",
        "Flange");
    check(Stacking.inserted(Sketches.empty(), 0), "Insert Layer 1", 0, "Layer 1");
  }

  @Test
  void aNewLayerHasTheNormalHoleAndItsNeighboursMaterial() {
    Element layer = Stacking.inserted(start, 2).sketch().joint().elements().get(2);
    // ISO 273, M10, medium series: 11
    assertEquals(11, layer.hole());
    assertEquals(Sketches.STEEL, layer.material());
    assertEquals(10, layer.thickness());
    assertEquals(Outline.WIDE, layer.outline());
  }

  @Test
  void aNameThatIsTakenIsNotGivenAgain() {
    Sketch taken = Sketches.of(Sketches.layer("Layer 2", 5));
    check(Stacking.inserted(taken, 0), "Insert Layer 3", 0, "Layer 3", "Layer 2");
  }

  @Test
  void deletingSelectsWhatTakesThePlace() {
    check(Stacking.deleted(start, 1), "Delete Cover", 1, "Washer", "Spacer", "Flange");
    check(Stacking.deleted(start, 3), "Delete Flange", 2, "Washer", "Cover", "Spacer");
    assertEquals(Part.JOINT, Stacking.deleted(Sketches.of(Sketches.layer("", 5)), 0).then());
  }

  @Test
  void aPartWithoutANameIsCalledByItsPlace() {
    assertEquals("Delete layer 1", Stacking.deleted(Sketches.of(Sketches.layer("", 5)), 0).name());
  }

  @Test
  void movingKeepsTheOthersInOrder() {
    check(Stacking.moved(start, 3, 1), "Move Flange", 1, "Washer", "Flange", "Cover", "Spacer");
    assertTrue(Stacking.canMove(start, 0, 1));
    assertFalse(Stacking.canMove(start, 0, -1));
    assertFalse(Stacking.canMove(start, 3, 1));
  }

  @Test
  void aCopyStandsBehindItsModel() {
    check(
        Stacking.duplicated(start, 1),
        "Duplicate Cover",
        2,
        "Washer",
        "Cover",
        "Cover 2",
        "Spacer",
        "Flange");
  }

  @Test
  void washersComeFromTheTable() {
    Change nut = Stacking.washerAdded(start, End.NUT);
    check(nut, "Add washer at the nut", 4, "Washer", "Cover", "Spacer", "Flange", "Washer 2");
    Element washer = nut.sketch().joint().elements().get(4);
    // ISO 7089, M10: 10.5 × 20 × 2
    assertEquals(2, washer.thickness());
    assertEquals(10.5, washer.hole());
    assertEquals(new Outline.Round(20), washer.outline());
  }

  @Test
  void washersGoAgain() {
    assertTrue(Stacking.hasWasher(start, End.HEAD));
    assertFalse(Stacking.hasWasher(start, End.NUT));
    check(
        Stacking.washerRemoved(start, End.HEAD),
        "Remove washer at the head",
        0,
        "Cover",
        "Spacer",
        "Flange");
  }

  @Test
  void aTappedHoleLeavesNoRoomForAWasher() {
    Sketch tapped =
        start.withJoint(
            joint -> joint.withFastener(joint.fastener().withAnchor(new Anchor.Tapped())));
    assertFalse(Stacking.canAddWasher(tapped, End.NUT));
    assertTrue(Stacking.canAddWasher(tapped, End.HEAD));
  }

  @ParameterizedTest
  @CsvSource({
    "1, ROUND, Round[diameter=30.0]",
    "1, STRIP, 'Strip[left=15.0, right=15.0]'",
    "2, STRIP, 'Strip[left=12.0, right=12.0]'",
    "3, ROUND, Round[diameter=50.0]",
    "3, WIDE, Wide[]",
    "3, STRIP, 'Strip[left=20.0, right=30.0]'"
  })
  void anotherOutlineStaysNearTheOldOne(int index, OutlineKind kind, String outline) {
    Change change = Stacking.outlined(start, index, kind);
    assertEquals(outline, change.sketch().joint().elements().get(index).outline().toString());
  }

  @Test
  void anInchReaderGetsRoundInches() {
    Sketch inch = start.withUnits(UnitSystem.INCH);
    double thickness = Stacking.inserted(inch, 1).sketch().joint().elements().get(1).thickness();
    assertEquals(6 * 25.4 / 16, thickness, 1e-9);
  }

  @ParameterizedTest
  @CsvSource({"-5, 1", "0, 1", "2, 1", "6.9, 1", "7.1, 2", "15.1, 3", "99, 4"})
  void thePressFindsTheNearestInterfaceBehindTheWasher(double z, int index) {
    assertEquals(index, Interfaces.nearest(start.joint(), z));
  }

  @Test
  void betweenTwoWashersIsTheirMiddle() {
    Sketch washers = Sketches.of(Sketches.washer("A"), Sketches.washer("B"));
    for (double z : new double[] {-5, 1, 3, 9}) {
      assertEquals(1, Interfaces.nearest(washers.joint(), z));
    }
    assertEquals(0, Interfaces.nearest(Sketches.empty().joint(), 3));
  }
}

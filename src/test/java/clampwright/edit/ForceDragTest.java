package clampwright.edit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Feature;
import clampwright.joint.Introduction;
import clampwright.joint.LoadCase;
import clampwright.joint.Part;
import clampwright.joint.Sketch;
import clampwright.joint.Target;
import clampwright.mechanics.AssemblyPreload;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Dragging the arrows of load and preload, and where the load enters and leaves. */
class ForceDragTest {
  private static final Snap SNAP = new Snap(0.5);
  private final Sketch start =
      Sketches.of(
          Sketches.layer("Upper", 20), Sketches.layer("Middle", 10), Sketches.layer("Lower", 20));

  private static LoadCase load(Sketch sketch, int index) {
    return sketch.joint().service().loads().get(index);
  }

  private static double preload(Sketch sketch) {
    return AssemblyPreload.of(sketch.joint(), sketch.joint().tightening().target()).orElseThrow();
  }

  /** Ten diameters are what breaks the bolt; 1 mm of an M10 8.8 about 464 N, in steps of 100 N. */
  @ParameterizedTest
  @CsvSource({"LOAD_AT_HEAD, -10, 14600", "LOAD_AT_HEAD, 10, 5400", "LOAD_AT_NUT, 10, 14600"})
  void theLoadGrowsOutwards(Feature feature, double by, double force) {
    Drag drag = Drag.load(start, 0, feature, 20, 0).orElseThrow();
    assertEquals(force, load(drag.at(20, by, SNAP).sketch(), 0).axialMax());
  }

  @Test
  void whereItWasTakenHoldOfNothingChanges() {
    Drag drag = Drag.load(start, 0, Feature.LOAD_AT_HEAD, 20, 3).orElseThrow();
    assertEquals(start, drag.at(20, 3, SNAP).sketch());
  }

  @Test
  void onlyItsLoadCaseChangesAndItsLeastStaysBelow() {
    LoadCase coming = LoadCase.steady("Comes and goes", 0, 1).withAxial(4_000, 9_000);
    Sketch two =
        start.withJoint(
            joint -> joint.withService(joint.service().withLoads(List.of(load(start, 0), coming))));
    Drag drag = Drag.load(two, 1, Feature.LOAD_AT_HEAD, 20, 0).orElseThrow();
    Sketch less = drag.exactly(2_000).sketch();
    assertEquals(load(start, 0), load(less, 0));
    assertEquals(2_000, load(less, 1).axialMax());
    assertEquals(2_000, load(less, 1).axialMin());
    assertEquals(4_000, load(drag.exactly(12_000).sketch(), 1).axialMin());
  }

  @Test
  void thePreloadKeepsTheKindOfItsTarget() {
    Sketch torque =
        start.withJoint(
            joint ->
                joint.withTightening(
                    joint.tightening().withTarget(new Target.FrictionTorque(40_000, 0.12, 0.12))));
    Drag drag = Drag.start(torque, Part.PRELOAD, Feature.PRELOAD_SIZE, 0, -8).orElseThrow();
    Sketch more = drag.exactly(30_000).sketch();
    assertTrue(more.joint().tightening().target() instanceof Target.FrictionTorque);
    assertEquals(30_000, preload(more), 1e-6);
  }

  @Test
  void aNegativePreloadIsRefused() {
    Drag drag = Drag.start(start, Part.PRELOAD, Feature.PRELOAD_SIZE, 0, -8).orElseThrow();
    assertEquals("The preload must be 0 or more.", drag.problem(-1).orElseThrow());
    assertEquals(0, preload(drag.at(0, 500, SNAP).sketch()));
  }

  /** From a typed n the other end goes to the last part; the ends never pass each other. */
  @Test
  void theLoadMovesFromPartToPart() {
    Drag enters = Drag.load(start, 0, Feature.LOAD_ENTERS, 20, -1).orElseThrow();
    Sketch middle = enters.at(20, 25, SNAP).sketch();
    assertEquals(new Introduction.Planes(1, 2), load(middle, 0).introduction());
    Drag leaves = Drag.load(middle, 0, Feature.LOAD_LEAVES, 20, 40).orElseThrow();
    assertEquals(
        new Introduction.Planes(1, 1), load(leaves.at(20, 5, SNAP).sketch(), 0).introduction());
    assertEquals("Middle", leaves.at(20, 5, SNAP).text());
    assertTrue(leaves.problem(4).isPresent());
  }

  /** A load stays with its parts when the stack changes. */
  @Test
  void theLoadFollowsItsParts() {
    Drag enters = Drag.load(start, 0, Feature.LOAD_ENTERS, 20, -1).orElseThrow();
    Sketch middle = enters.at(20, 25, SNAP).sketch();
    Sketch inserted = Stacking.inserted(middle, 0).sketch();
    assertEquals(new Introduction.Planes(2, 3), load(inserted, 0).introduction());
    Sketch moved = Stacking.moved(middle, 1, 0).sketch();
    assertEquals(new Introduction.Planes(0, 2), load(moved, 0).introduction());
    Sketch deleted = Stacking.deleted(middle, 2).sketch();
    assertEquals(new Introduction.Planes(1, 1), load(deleted, 0).introduction());
  }
}

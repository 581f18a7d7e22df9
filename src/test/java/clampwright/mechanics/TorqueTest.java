package clampwright.mechanics;

import static org.junit.jupiter.api.Assertions.assertEquals;

import clampwright.joint.ScrewThread;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TorqueTest {

  /**
   * Assembly preload and torque at 90 % of yield, class 8.8 (R_p0.2 640 MPa), μ 0.12 in thread and
   * under the head (VDI 2230-1 tables A1/A3; values from memory, recomputed). D_b from the hexagon
   * head's face and a medium hole.
   */
  @ParameterizedTest
  @CsvSource({"M8, 8, 1.25, 11.6, 9, 18.6, 24.6", "M12, 12, 1.75, 16.6, 13.5, 43.0, 84"})
  void vdiAssemblyTables(
      String name, double d, double p, double face, double hole, double force, double torque) {
    ScrewThread thread = new ScrewThread(name, ScrewThread.Form.METRIC, d, p);
    double preload = Torsion.assemblyPreload(thread, 0.12, 0.9, 640);
    assertEquals(force, preload / 1000, 0.01 * force);
    double arm = Torque.wrenchArm(thread, 0.12, 0.12, (face + hole) / 2);
    assertEquals(torque, preload * arm / 1e3, 0.02 * torque);
  }

  /** Areas for 1 d of engagement, 6H/6g (Bickford, 4th ed., table, seen; recomputed). */
  @ParameterizedTest
  @CsvSource({
    "M6, 6, 1,    5.153, 5.212, 5.794, 5.500, 51.875, 73.145",
    "M8, 8, 1.25, 6.912, 7.042, 7.760, 7.348, 97.290, 134.63",
  })
  void strippingAreas(
      String name,
      double d,
      double p,
      double nutMinor,
      double boltPitch,
      double boltMajor,
      double nutPitch,
      double external,
      double internal) {
    ScrewThread thread = new ScrewThread(name, ScrewThread.Form.METRIC, d, p);
    ThreadLimits printed = new ThreadLimits(boltMajor, boltPitch, nutMinor, nutPitch);
    StrippingAreas exact = StrippingAreas.of(printed, p, d);
    assertEquals(external, exact.external(), 5e-5 * external);
    assertEquals(internal, exact.internal(), 5e-5 * internal);
    // Our limits of size are not rounded to the micrometre as the printed ones are.
    StrippingAreas areas = StrippingAreas.of(thread, d);
    assertEquals(external, areas.external(), 5e-4 * external);
    assertEquals(internal, areas.internal(), 5e-4 * internal);
  }

  /** Limits of size 6g/6H (ISO 965-1; as printed beside the areas above, seen). */
  @ParameterizedTest
  @CsvSource({
    "M6, 6, 1, 5.153, 5.212, 5.794, 5.500",
    "M8, 8, 1.25, 6.912, 7.042, 7.760, 7.348",
  })
  void metricLimits(
      String name,
      double d,
      double p,
      double nutMinor,
      double boltPitch,
      double boltMajor,
      double nutPitch) {
    ThreadLimits limits = ThreadLimits.of(new ScrewThread(name, ScrewThread.Form.METRIC, d, p));
    assertEquals(nutMinor, limits.nutMinorMax(), 6e-4);
    assertEquals(boltPitch, limits.boltPitchMin(), 6e-4);
    assertEquals(boltMajor, limits.boltMajorMin(), 6e-4);
    assertEquals(nutPitch, limits.nutPitchMax(), 6e-4);
  }

  /** Limits of size 2A/2B (ASME B1.1 tables, from memory). */
  @ParameterizedTest
  @CsvSource({
    "1/4-20 UNC, 0.25, 20, 0.2408, 0.2127, 0.2070, 0.2224",
    "1/2-13 UNC, 0.5, 13, 0.4876, 0.4435, 0.4340, 0.4565",
  })
  void unifiedLimits(
      String name,
      double d,
      double perInch,
      double boltMajor,
      double boltPitch,
      double nutMinor,
      double nutPitch) {
    ThreadLimits limits =
        ThreadLimits.of(new ScrewThread(name, ScrewThread.Form.UNIFIED, d * 25.4, 25.4 / perInch));
    assertEquals(boltMajor, limits.boltMajorMin() / 25.4, 2e-4);
    assertEquals(boltPitch, limits.boltPitchMin() / 25.4, 2e-4);
    assertEquals(nutMinor, limits.nutMinorMax() / 25.4, 5e-4);
    assertEquals(nutPitch, limits.nutPitchMax() / 25.4, 2e-4);
  }
}

package clampwright.catalog;

import clampwright.joint.Anchor;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Material;
import clampwright.joint.ScrewThread;
import clampwright.joint.Strength;
import java.util.List;
import java.util.Optional;

/** The tables, read once. */
public final class Catalogue {
  private static final Catalogue STANDARD = new Catalogue();

  private Catalogue() {}

  public static Catalogue standard() {
    return STANDARD;
  }

  /** How much room a clearance hole leaves. */
  public enum Fit {
    CLOSE,
    NORMAL,
    LOOSE
  }

  /** All threads by series (ISO coarse, ISO fine, UNC, UNF), small to large within each. */
  public List<Entry<ScrewThread>> threads() {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /** Heads that fit this thread. */
  public List<Entry<Head>> heads(ScrewThread thread) {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /** Nuts that fit this thread. */
  public List<Entry<Anchor.Nut>> nuts(ScrewThread thread) {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /** Washers that fit this thread. */
  public List<Entry<Washer>> washers(ScrewThread thread) {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /** Clearance hole diameter [mm]; empty where the table has none. */
  public Optional<Entry<Double>> clearanceHole(ScrewThread thread, Fit fit) {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  public List<Entry<Material>> materials() {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /** The material of this name, by its label. */
  public Optional<Entry<Material>> material(String label) {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /** Strength classes that hold for this thread size. */
  public List<Entry<Strength>> strengths(ScrewThread thread) {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /** Where a value came from, for the tooltip of a field; empty for a typed one. */
  public Optional<String> originOf(Object value) {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /**
   * The fastener with another thread: head, nut and strength follow it in kind where the tables
   * have them, else in proportion to the diameter. Typed lengths stay.
   */
  public Fastener resized(Fastener fastener, ScrewThread thread) {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /** The next thread of the same series, larger (+1) or smaller (−1); the same at the end. */
  public ScrewThread stepped(ScrewThread thread, int steps) {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }

  /** A usual fastener to start with: M10, hexagon head, nut, class 8.8, steel. */
  public Fastener usualFastener() {
    throw new UnsupportedOperationException("comes with the catalogue commit");
  }
}

package clampwright.store;

import clampwright.joint.Anchor;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.Material;
import clampwright.joint.ScrewThread;
import clampwright.joint.Strength;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads the bolt and what it is screwed into. */
final class BoltReader {
  private static final ScrewThread THREAD =
      new ScrewThread("", ScrewThread.Form.METRIC, Double.MAX_VALUE, Double.MIN_VALUE);

  /** Sound values, in which one at a time is replaced to try it. */
  private static final Fastener SOUND =
      new Fastener(
          THREAD,
          new Head(Head.Style.HEXAGON, "", 1, 1, 1, 1),
          new Anchor.Tapped(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          OptionalDouble.empty(),
          0,
          new Strength("", "", OptionalDouble.empty(), OptionalDouble.empty(), 1),
          MaterialReader.SOUND);

  private BoltReader() {}

  static Optional<Fastener> read(JsonObjectReader bolt) {
    Optional<ScrewThread> thread = bolt.object("thread", "thread", "bolt", BoltReader::thread);
    Optional<Head> head = bolt.object("head", "head", "bolt head", BoltReader::head);
    Optional<Anchor> anchor = bolt.object("anchor", "anchor", "nut", BoltReader::anchor);
    OptionalDouble length =
        bolt.optional("length", "length", value -> SOUND.withLength(OptionalDouble.of(value)));
    OptionalDouble shankLength =
        bolt.optional(
            "shankLength",
            "shank length",
            value -> SOUND.withShankLength(OptionalDouble.of(value)));
    OptionalDouble shankDiameter =
        bolt.optional(
            "shankDiameter",
            "shank diameter",
            value -> SOUND.withShankDiameter(OptionalDouble.of(value)));
    double bore = bolt.number("bore", "bore", 0, SOUND::withBore);
    Optional<Strength> strength =
        bolt.object("strength", "strength", "bolt strength", BoltReader::strength);
    Optional<Material> material =
        bolt.object("material", "material", "bolt material", MaterialReader::read);
    return bolt.build(
        () ->
            new Fastener(
                thread.orElseThrow(),
                head.orElseThrow(),
                anchor.orElseThrow(),
                length,
                shankLength,
                shankDiameter,
                bore,
                strength.orElseThrow(),
                material.orElseThrow()));
  }

  private static Optional<ScrewThread> thread(JsonObjectReader thread) {
    String designation = thread.text("designation", "thread designation");
    ScrewThread.Form form = thread.choice("form", "thread form", Words.FORMS);
    double diameter =
        thread.number(
            "diameter",
            "thread diameter",
            value -> new ScrewThread("", form, value, Double.MIN_VALUE));
    double pitch =
        thread.number(
            "pitch", "thread pitch", value -> new ScrewThread("", form, Double.MAX_VALUE, value));
    return thread.build(() -> new ScrewThread(designation, form, diameter, pitch));
  }

  private static Optional<Head> head(JsonObjectReader head) {
    Head.Style style = head.choice("style", "style", Words.STYLES);
    String standard = head.text("standard", "standard");
    double bearing =
        head.number(
            "bearingDiameter",
            "bearing face diameter",
            value -> new Head(style, "", value, 1, 1, 1));
    double height = head.number("height", "height", value -> new Head(style, "", 1, value, 1, 1));
    double width = head.number("width", "width", value -> new Head(style, "", 1, 1, value, 1));
    double rim =
        head.number("rim", "flange diameter", width, value -> new Head(style, "", 1, 1, 1, value));
    return head.build(() -> new Head(style, standard, bearing, height, width, rim));
  }

  private static Optional<Anchor> anchor(JsonObjectReader anchor) {
    boolean nut = anchor.choice("kind", "kind", Words.ANCHORS);
    if (!nut || !anchor.isSound()) {
      return anchor.build(Anchor.Tapped::new);
    }
    String standard = anchor.text("standard", "standard");
    double bearing =
        anchor.number(
            "bearingDiameter", "bearing face diameter", value -> new Anchor.Nut("", value, 1, 1));
    double height = anchor.number("height", "height", value -> new Anchor.Nut("", 1, value, 1));
    double width = anchor.number("width", "width", value -> new Anchor.Nut("", 1, 1, value));
    return anchor.build(() -> new Anchor.Nut(standard, bearing, height, width));
  }

  private static Optional<Strength> strength(JsonObjectReader strength) {
    OptionalDouble none = OptionalDouble.empty();
    String standard = strength.text("standard", "standard");
    String grade = strength.text("grade", "grade");
    OptionalDouble proof =
        strength.optional(
            "proof",
            "proof strength",
            value -> new Strength("", "", OptionalDouble.of(value), none, 1));
    OptionalDouble yield =
        strength.optional(
            "yield",
            "yield strength",
            value -> new Strength("", "", none, OptionalDouble.of(value), 1));
    double tensile =
        strength.number(
            "tensile", "tensile strength", value -> new Strength("", "", none, none, value));
    return strength.build(() -> new Strength(standard, grade, proof, yield, tensile));
  }
}

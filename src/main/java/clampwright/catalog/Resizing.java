package clampwright.catalog;

import clampwright.joint.Anchor;
import clampwright.joint.Fastener;
import clampwright.joint.Head;
import clampwright.joint.ScrewThread;
import clampwright.joint.Strength;
import java.util.List;
import java.util.Objects;
import java.util.OptionalDouble;

/** A fastener carried over to another thread. */
record Resizing(Catalogue catalogue, Fastener fastener, ScrewThread thread) {

  Fastener resized() {
    Anchor anchor = fastener.anchor() instanceof Anchor.Nut nut ? nut(nut) : fastener.anchor();
    return new Fastener(
        thread,
        head(),
        anchor,
        fastener.length(),
        fastener.shankLength(),
        shankDiameter(),
        fastener.bore() * ratio(),
        strength(),
        fastener.material());
  }

  private double ratio() {
    return thread.diameter() / fastener.thread().diameter();
  }

  private Head head() {
    Head old = fastener.head();
    List<Head> heads = catalogue.heads(thread).stream().map(Entry::value).toList();
    return heads.stream()
        .filter(head -> Heads.sameStandard(head, old))
        .findFirst()
        .or(() -> heads.stream().filter(head -> head.style() == old.style()).findFirst())
        .orElseGet(() -> scaled(old));
  }

  private Head scaled(Head old) {
    double ratio = ratio();
    return new Head(
        old.style(),
        "own size",
        old.bearingDiameter() * ratio,
        old.height() * ratio,
        old.width() * ratio,
        old.rim() * ratio);
  }

  private Anchor nut(Anchor.Nut old) {
    double ratio = ratio();
    return catalogue.nuts(thread).stream()
        .map(Entry::value)
        .findFirst()
        .orElseGet(
            () ->
                new Anchor.Nut(
                    "own size",
                    old.bearingDiameter() * ratio,
                    old.height() * ratio,
                    old.width() * ratio));
  }

  private OptionalDouble shankDiameter() {
    OptionalDouble old = fastener.shankDiameter();
    return old.isPresent() ? OptionalDouble.of(old.getAsDouble() * ratio()) : old;
  }

  /** The same grade as it holds for the new size; the old one where the tables have none. */
  private Strength strength() {
    Strength old = fastener.strength();
    return catalogue.strengths(thread).stream()
        .map(Entry::value)
        .filter(
            strength ->
                Objects.equals(strength.standard(), old.standard())
                    && Objects.equals(strength.grade(), old.grade()))
        .findFirst()
        .orElse(old);
  }
}

package clampwright.mechanics;

import clampwright.joint.Anchor;
import clampwright.joint.Fastener;
import clampwright.joint.Joint;
import clampwright.joint.Part;
import clampwright.mechanics.Notice.Kind;
import java.util.ArrayList;
import java.util.List;

/** Gathers the assumptions and cautions that a solved joint calls for. */
final class Notices {
  private static final double ROUNDING = 1e-9;

  private Notices() {}

  static List<Notice> of(
      Joint joint,
      List<ElementFinding> findings,
      BoltStiffness bolt,
      Preload preload,
      List<LoadSharing> cases) {
    List<Notice> notices = new ArrayList<>();
    for (int i = 0; i < findings.size(); i++) {
      addElement(notices, joint.fastener(), findings, bolt, i);
    }
    if (bolt.engagement() < fullEngagement(joint.fastener()) * (1 - ROUNDING)) {
      notices.add(new Notice(Part.ANCHOR, Kind.SHORT_ENGAGEMENT));
    }
    if (bolt.shankLength() > bolt.grip() * (1 + ROUNDING)) {
      notices.add(new Notice(Part.SHANK, Kind.SHANK_LONGER_THAN_GRIP));
    }
    if (cases.stream().anyMatch(Notices::isParted)) {
      notices.add(new Notice(Part.LOAD, Kind.PARTED));
    }
    addPreload(notices, joint, preload, cases);
    return notices;
  }

  private static boolean isParted(LoadSharing sharing) {
    return sharing.axialMax() > 0 && sharing.axialMax() >= sharing.partingLoad();
  }

  private static void addPreload(
      List<Notice> notices, Joint joint, Preload preload, List<LoadSharing> cases) {
    if (preload.embedment() > 0 && joint.tightening().relaxation() > 0) {
      notices.add(new Notice(Part.SHANK, Kind.SETTLING_CHARGED_TWICE));
    }
    boolean loose = cases.stream().anyMatch(sharing -> sharing.preload().min() <= 0);
    if (preload.nominal() > 0 && loose) {
      notices.add(new Notice(Part.SHANK, Kind.LOOSE));
    }
    if (!joint.service().temperatures().isEmpty() && preload.mismatches().isEmpty()) {
      notices.add(new Notice(Part.JOINT, Kind.EXPANSION_UNKNOWN));
    }
  }

  private static void addElement(
      List<Notice> notices,
      Fastener fastener,
      List<ElementFinding> findings,
      BoltStiffness bolt,
      int i) {
    ElementFinding finding = findings.get(i);
    if (finding.edgeClipped() && findings.size() > 1) {
      notices.add(new Notice(Part.element(i), Kind.CONE_NOT_REDUCED_BEHIND_STRIP));
    }
    boolean shankPasses = bolt.shankLength() > finding.from();
    if (shankPasses && fastener.plainDiameter() > finding.hole() * (1 + ROUNDING)) {
      notices.add(new Notice(Part.element(i), Kind.SHANK_WIDER_THAN_HOLE));
    }
  }

  /** The nut's height, or one diameter of tapped thread (common practice, no source) [mm]. */
  private static double fullEngagement(Fastener fastener) {
    return fastener.anchor() instanceof Anchor.Nut nut
        ? nut.height()
        : fastener.thread().diameter();
  }
}

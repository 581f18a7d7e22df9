package clampwright.figure.working;

import clampwright.joint.Part;
import clampwright.mechanics.Side;

/** Finds the working that belongs to a part or a readout. */
record PartWorking(Found found) {

  Working of(Part part) {
    return switch (part.kind()) {
      case JOINT, NOTE -> of(Headline.MEMBERS);
      case SHANK -> of(Headline.BOLT);
      case LOAD -> of(Headline.BOLT_LOAD);
      case PRELOAD -> of(Headline.PRELOAD);
      case HEAD, HEAD_CONE -> new FaceWorking(found, Side.HEAD).working();
      case ANCHOR, NUT_CONE -> new FaceWorking(found, Side.NUT).working();
      case ELEMENT ->
          found.finding(part.index()).wholeWasher()
              ? new WasherWorking(found, part.index()).working()
              : new ElementWorking(found, part.index()).working();
    };
  }

  Working of(Headline headline) {
    return switch (headline) {
      case MEMBERS -> new MembersWorking(found).working();
      case BOLT -> new BoltWorking(found).working();
      case PRELOAD -> new PreloadWorking(found).working();
      case LOAD_FACTOR -> new SharingWorking(found).loadFactor();
      case PARTING_LOAD -> new SharingWorking(found).partingLoad();
      case BOLT_LOAD -> new SharingWorking(found).boltLoad();
      case CLAMP_LOAD -> new SharingWorking(found).clampLoad();
    };
  }
}

package clampwright.store;

import java.nio.charset.StandardCharsets;

/** Why no sketch can be taken out of a picture; the message is a sentence for the reader. */
final class PictureTrouble extends Exception {
  private static final String DAMAGED = "The sketch inside this picture is damaged: ";

  private PictureTrouble(String sentence) {
    super(sentence);
  }

  /** There is a sketch, but not as it was put there. */
  static PictureTrouble damaged(String how) {
    return new PictureTrouble(DAMAGED + how + ".");
  }

  /**
   * The picture is broken before a sketch could be read.
   *
   * @param mark that is found in every picture with a sketch: by it, a damaged sketch is told from
   *     a damaged picture that may never have held one
   */
  static PictureTrouble broken(byte[] picture, String mark, String how) {
    return new String(picture, StandardCharsets.ISO_8859_1).contains(mark)
        ? damaged(how)
        : new PictureTrouble("This picture is damaged: " + how + "; no sketch was found in it.");
  }

  static PictureTrouble tooLarge() {
    return new PictureTrouble("The sketch inside this picture is too large (over 20 MB).");
  }

  static PictureTrouble several() {
    return new PictureTrouble("This picture holds more than one sketch.");
  }

  /** What is wrong with a text in a picture, in the words for one in a file. */
  static String inPicture(String problem) {
    return problem.startsWith(SketchJson.NO_SKETCH)
        ? DAMAGED + problem.substring(SketchJson.NO_SKETCH.length())
        : problem;
  }
}

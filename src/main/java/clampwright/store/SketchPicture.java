package clampwright.store;

import clampwright.joint.Sketch;
import java.util.List;
import java.util.Optional;

/** A picture that carries the sketch it shows, so that opening the picture brings it back. */
public final class SketchPicture {
  private SketchPicture() {}

  /**
   * The same picture with a sketch inside: nothing that is seen changes.
   *
   * @param picture as painted, without a sketch inside yet
   * @throws IllegalArgumentException when the picture is not of the format or is broken
   */
  public static byte[] with(PictureFormat format, byte[] picture, Sketch sketch) {
    if (!PictureFormat.of(picture).equals(Optional.of(format))) {
      throw new IllegalArgumentException("this is no " + format + " picture");
    }
    String text = SketchJson.of(sketch);
    return switch (format) {
      case PNG -> TextInPng.with(picture, text);
      case SVG -> TextInSvg.with(picture, text);
      case PDF -> TextInPdf.with(picture, text);
    };
  }

  /** Reads the sketch inside a picture; whatever it is, the answer is a sketch or the problems. */
  public static Stored read(byte[] picture) {
    Optional<PictureFormat> format = PictureFormat.of(picture);
    if (format.isEmpty()) {
      return refused("This is not a PNG, SVG or PDF picture.");
    }
    try {
      Optional<Carried> carried = carried(format.get(), picture);
      return carried.isPresent() ? sketch(carried.get()) : refused("This picture holds no sketch.");
    } catch (PictureTrouble trouble) {
      return refused(trouble.getMessage());
    }
  }

  private static Optional<Carried> carried(PictureFormat format, byte[] picture)
      throws PictureTrouble {
    return switch (format) {
      case PNG -> TextInPng.read(picture);
      case SVG -> SvgReading.read(picture);
      case PDF -> TextInPdf.read(picture);
    };
  }

  private static Stored sketch(Carried carried) throws PictureTrouble {
    if (!carried.isSound()) {
      throw PictureTrouble.damaged("its text does not fit its check sum");
    }
    Stored stored = SketchJson.read(carried.text());
    if (stored instanceof Stored.Opened opened) {
      return new Stored.Opened(opened.sketch(), opened.remarks(), true);
    }
    List<String> problems = ((Stored.Refused) stored).problems();
    return new Stored.Refused(problems.stream().map(PictureTrouble::inPicture).toList());
  }

  private static Stored refused(String problem) {
    return new Stored.Refused(List.of(problem));
  }
}

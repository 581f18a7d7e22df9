package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Joints;
import clampwright.joint.Sketch;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** A picture gives back the very sketch that was put into it. */
class SketchPictureTest {
  private static final Sketch SKETCH =
      Texts.opened(Texts.SHORTEST).sketch().withName("Träger ]]> & 2″ \uFFFE \uD83D\uDD29");

  @TempDir private Path folder;

  private static Stored inPicture(Sketch sketch) {
    return new Stored.Opened(sketch, List.of(), true);
  }

  private static byte[] with(PictureFormat format, Sketch sketch) {
    return SketchPicture.with(format, Pictures.of(format), sketch);
  }

  private static void checkRefused(String problem, byte[] picture) {
    assertEquals(new Stored.Refused(List.of(problem)), SketchPicture.read(picture));
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void everySampleComesBack(PictureFormat format) {
    for (Samples.Sample sample : Samples.all()) {
      Sketch sketch = ((Stored.Opened) Samples.open(sample)).sketch();
      assertEquals(inPicture(sketch), SketchPicture.read(with(format, sketch)), sample.file());
    }
  }

  @Property(tries = 150, edgeCases = EdgeCasesMode.NONE)
  void anySketchComesBack(@ForAll("sketches") Sketch sketch, @ForAll PictureFormat format) {
    assertEquals(inPicture(sketch), SketchPicture.read(with(format, sketch)));
  }

  @Provide
  Arbitrary<Sketch> sketches() {
    return Joints.sketches();
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void aFormatIsKnownByItsBytes(PictureFormat format) {
    assertEquals(Optional.of(format), PictureFormat.of(Pictures.of(format)));
    assertEquals(Optional.of(format), PictureFormat.of(with(format, SKETCH)));
  }

  @Test
  void whatIsNoPictureIsKnownAsNone() {
    for (String text :
        List.of(
            "",
            "<",
            "<!-- <svg> -->",
            "<html><svg/></html>",
            "{\"name\": \"%PDF-<svg>\"}",
            "PNG")) {
      assertEquals(Optional.empty(), PictureFormat.of(Pictures.bytes(text)), text);
      checkRefused("This is not a PNG, SVG or PDF picture.", Pictures.bytes(text));
    }
    assertEquals(Optional.empty(), PictureFormat.of(Pictures.bytes(SketchJson.of(SKETCH))));
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void aPictureWithoutASketchSaysSo(PictureFormat format) {
    checkRefused("This picture holds no sketch.", Pictures.of(format));
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void aSketchGoesIntoAPictureOfItsFormatOnly(PictureFormat format) {
    byte[] text = Pictures.bytes("no picture");
    assertThrows(IllegalArgumentException.class, () -> SketchPicture.with(format, text, SKETCH));
  }

  /** Whatever the file is called. */
  @ParameterizedTest
  @CsvSource({"PNG, a.png", "SVG, a.joint.json", "PDF, a"})
  void aPictureOpensAsAFile(PictureFormat format, String name) throws IOException {
    Path file = folder.resolve(name);
    Files.write(file, with(format, SKETCH));
    assertEquals(inPicture(SKETCH), SketchFile.read(file));
  }

  /** A text that is larger than a sketch may be in a file of its own opens from a picture file. */
  @Test
  void aPictureMayBeLargerThanASketch() throws IOException {
    byte[] picture = with(PictureFormat.SVG, SKETCH);
    byte[] large = Arrays.copyOf(picture, SketchFile.LARGEST + 10);
    Arrays.fill(large, picture.length, large.length, (byte) ' ');
    Path file = folder.resolve("large.svg");
    Files.write(file, large);
    assertEquals(inPicture(SKETCH), SketchFile.read(file));
  }

  @Test
  void aHugePictureIsNotRead() throws IOException {
    Path file = folder.resolve("huge.png");
    Files.write(file, Pictures.of(PictureFormat.PNG));
    try (RandomAccessFile huge = new RandomAccessFile(file.toFile(), "rw")) {
      huge.setLength(SketchFile.LARGEST_PICTURE + 1);
    }
    assertEquals(
        new Stored.Refused(List.of("This picture is too large to be opened (over 100 MB).")),
        SketchFile.read(file));
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void remarksOnASketchArePassedOn(PictureFormat format) {
    String text = SketchJson.of(SKETCH).replaceFirst("\\{", "{ \"colour\": \"red\",");
    Stored.Opened opened = (Stored.Opened) SketchPicture.read(Texts.carried(format, text));
    assertEquals(SKETCH, opened.sketch());
    assertEquals(List.of("sketch: unknown key 'colour' was ignored"), opened.remarks());
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void problemsOfASketchAreToldAsForAFile(PictureFormat format) {
    String text = Texts.with("\"thickness\": 20", "\"thickness\": -20");
    List<String> problems = Texts.problems(text);
    assertEquals(new Stored.Refused(problems), SketchPicture.read(Texts.carried(format, text)));
    assertTrue(problems.get(0).contains("thickness"), problems.toString());
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void brokenJsonIsADamagedSketch(PictureFormat format) {
    checkRefused(
        "The sketch inside this picture is damaged: its text ends too early, near line 1, column"
            + " 2.",
        Texts.carried(format, "{"));
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void aTextOfAnySizeIsNotRead(PictureFormat format) {
    checkRefused(
        "The sketch inside this picture is too large (over 20 MB).",
        Texts.carried(format, "x".repeat(Packing.LARGEST + 1)));
  }
}

package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Sketch;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** A damaged picture gives the sketch that was put into it or a sentence, never another sketch. */
class DamagedPictureTest {
  private static final Sketch SKETCH = Texts.opened(Texts.SHORTEST).sketch();
  private static final int TRIES = 1000;
  private static final Pattern SENTENCE =
      Pattern.compile(
          "The sketch inside this picture is damaged: [^.]+\\."
              + "|This picture is damaged: [^.]+; no sketch was found in it\\."
              + "|This picture holds no sketch\\."
              + "|This is not a PNG, SVG or PDF picture\\.");

  private static byte[] with(PictureFormat format) {
    return SketchPicture.with(format, Pictures.of(format), SKETCH);
  }

  /** Whether a picture still gives its sketch. */
  private static boolean opens(byte[] picture) {
    Stored stored = SketchPicture.read(picture);
    if (stored instanceof Stored.Opened opened) {
      assertEquals(SKETCH, opened.sketch());
      return true;
    }
    List<String> problems = ((Stored.Refused) stored).problems();
    assertEquals(1, problems.size(), problems.toString());
    assertTrue(SENTENCE.matcher(problems.get(0)).matches(), problems.toString());
    return false;
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void flippedBits(PictureFormat format) {
    Random random = new Random(20_240_229);
    byte[] whole = with(format);
    int opened = 0;
    for (int i = 0; i < TRIES; i++) {
      byte[] flipped = whole.clone();
      flipped[random.nextInt(whole.length)] ^= (byte) (1 << random.nextInt(8));
      opened += opens(flipped) ? 1 : 0;
    }
    assertTrue(opened > 0 && opened < TRIES, opened + " opened");
  }

  @ParameterizedTest
  @EnumSource(PictureFormat.class)
  void cutOffAnywhere(PictureFormat format) {
    Random random = new Random(20_240_301);
    byte[] whole = with(format);
    int opened = 0;
    for (int i = 0; i < TRIES; i++) {
      opened += opens(Arrays.copyOf(whole, random.nextInt(whole.length))) ? 1 : 0;
    }
    assertTrue(opened > 0 && opened < TRIES, opened + " opened");
  }

  /** A text that was changed by hand is no longer the one that was put in. */
  @Test
  void aChangedNumberIsFoundOut() {
    String svg = new String(with(PictureFormat.SVG), StandardCharsets.UTF_8);
    checkRefused(
        "The sketch inside this picture is damaged: its text does not fit its check sum.",
        svg.replace("\"thickness\": 20", "\"thickness\": 21"));
    checkRefused(
        "The sketch inside this picture is damaged: its check sum is missing.",
        svg.replaceFirst(" sha256=\"\\w+\"", ""));
    checkRefused(
        "The sketch inside this picture is damaged: its text is mixed with something else.",
        svg.replaceFirst("\"thickness\"", "<b/>"));
    checkRefused(
        "The sketch inside this picture is damaged: its XML is not well-formed.",
        svg.substring(0, svg.indexOf("thickness")));
  }

  private static void checkRefused(String problem, String picture) {
    checkRefused(problem, Pictures.bytes(picture));
  }

  private static void checkRefused(String problem, byte[] picture) {
    assertEquals(new Stored.Refused(List.of(problem)), SketchPicture.read(picture));
  }

  /** Layout of white space changes no sketch. */
  @Test
  void anIndentedTextIsTheSame() {
    String svg = new String(with(PictureFormat.SVG), StandardCharsets.UTF_8);
    assertTrue(opens(Pictures.bytes(svg.replace("\">{", "\">\n      {").replace("\n", "\r\n"))));
  }

  @Test
  void aDamagedChunkIsFoundOut() {
    byte[] png = with(PictureFormat.PNG);
    int keyword = at(png, "clampwright-sketch\0");
    byte[] flipped = png.clone();
    flipped[keyword + 40] ^= 1;
    String damaged = "The sketch inside this picture is damaged: ";
    checkRefused(damaged + "its bytes are not those that were written.", flipped);
    checkRefused(damaged + "the picture ends too early.", Arrays.copyOf(png, keyword + 40));
    byte[] otherType = png.clone();
    otherType[keyword - 1] ^= 1;
    checkRefused(damaged + "its bytes are not those that were written.", otherType);
    checkRefused(
        "This picture is damaged: the picture ends too early; no sketch was found in it.",
        Arrays.copyOf(png, keyword - 8));
  }

  /** A chunk whose own check sum is right, but whose packed text is broken. */
  @Test
  void aBrokenPackingIsFoundOut() {
    byte[] broken = Pictures.bytes("clampwright-sketch\0\1\0\0\0nonsense");
    checkRefused(
        "The sketch inside this picture is damaged: its text cannot be unpacked.",
        pngWith(PngChunk.bytes("iTXt", broken)));
    byte[] headless = Pictures.bytes("clampwright-sketch\0\1\0de");
    checkRefused(
        "The sketch inside this picture is damaged: its chunk has no text.",
        pngWith(PngChunk.bytes("iTXt", headless)));
  }

  /** The format allows a text that is not packed, and says nothing of check sums. */
  @Test
  void aPlainTextIsReadToo() {
    Carried carried = Carried.of(SketchJson.of(SKETCH));
    byte[] text =
        PngChunk.bytes(
            "iTXt", Pictures.bytes("clampwright-sketch\0\0\0en\0Skizze\0" + carried.text()));
    byte[] sum =
        PngChunk.bytes("tEXt", Pictures.bytes("clampwright-sketch-sha256\0" + carried.checksum()));
    assertTrue(opens(pngWith(text, sum)));
    checkRefused(
        "The sketch inside this picture is damaged: its check sum is missing.", pngWith(text));
  }

  private static byte[] pngWith(byte[]... chunks) {
    byte[] png = Pictures.of(PictureFormat.PNG);
    int place = at(png, "IDAT") - 4;
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    out.write(png, 0, place);
    for (byte[] chunk : chunks) {
      out.writeBytes(chunk);
    }
    out.write(png, place, png.length - place);
    return out.toByteArray();
  }

  private static int at(byte[] picture, String text) {
    int place = new String(picture, StandardCharsets.ISO_8859_1).indexOf(text);
    assertTrue(place > 0, text);
    return place;
  }

  @Test
  void aDamagedPdfIsFoundOut() {
    byte[] pdf = with(PictureFormat.PDF);
    String damaged = "The sketch inside this picture is damaged: ";
    byte[] key = pdf.clone();
    key[at(pdf, "XXClampwright")] ^= 1;
    checkRefused(damaged + "its check sum is missing.", key);
    byte[] filter = pdf.clone();
    filter[at(pdf, "FlateDecode/") + 1] ^= 1;
    checkRefused(damaged + "it is packed in a way that is not known.", filter);
    int stream = at(pdf, "stream\n");
    checkRefused(damaged + "the picture ends too early.", Arrays.copyOf(pdf, stream));
    checkRefused(damaged + "its text cannot be unpacked.", Arrays.copyOf(pdf, stream + 40));
    checkRefused(
        "This picture is damaged: the picture ends too early; no sketch was found in it.",
        Arrays.copyOf(pdf, 12));
  }

  /** Neither the entities of other programs nor bombs made of them are looked into. */
  @Test
  void entitiesAreNotLookedInto() {
    checkRefused(
        "This picture holds no sketch.",
        "<!DOCTYPE svg [<!ENTITY a 'x'><!ENTITY b '&a;&a;'>]>\n<svg note='&b;'>&b;</svg>");
    checkRefused(
        "This picture holds no sketch.",
        "<!DOCTYPE svg [<!ENTITY a SYSTEM 'file:///nowhere'>]>\n<svg>&a;</svg>");
  }
}

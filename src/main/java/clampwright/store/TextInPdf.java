package clampwright.store;

import com.lowagie.text.pdf.PdfDictionary;
import com.lowagie.text.pdf.PdfFileSpecification;
import com.lowagie.text.pdf.PdfIndirectReference;
import com.lowagie.text.pdf.PdfName;
import com.lowagie.text.pdf.PdfNumber;
import com.lowagie.text.pdf.PdfReader;
import com.lowagie.text.pdf.PdfStamper;
import com.lowagie.text.pdf.PdfStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A text inside a PDF picture: as an attached file, its check sum in the dictionary of that file's
 * stream.
 */
final class TextInPdf {
  private static final String FILE = "sketch" + SketchFile.EXTENSION;

  /** A private key, as ISO 32000-1, annex E allows it. */
  private static final String SUM_KEY = "XXClampwrightSHA256";

  /** The sum is a name, since programs that write a PDF anew keep names as they are. */
  private static final Pattern SUM = Pattern.compile("/" + SUM_KEY + "\\s*/([0-9a-f]{64})");

  private static final String END = "%%EOF";

  private TextInPdf() {}

  /**
   * The same picture with a text.
   *
   * @throws IllegalArgumentException when a picture cannot be read as a PDF
   */
  static byte[] with(byte[] picture, String text) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (PdfReader reader = new PdfReader(picture);
        PdfStamper stamper = new PdfStamper(reader, out)) {
      stamper.setUpdateDocInfo(false);
      stamper.setUpdateMetadata(false);
      stamper.addFileAttachment("Joint sketch", attachment(stamper, text));
    } catch (IOException e) {
      throw new IllegalArgumentException("a PDF picture can be read", e);
    }
    return out.toByteArray();
  }

  private static PdfFileSpecification attachment(PdfStamper stamper, String text)
      throws IOException {
    byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
    PdfStream stream = new PdfStream(bytes);
    stream.put(PdfName.TYPE, PdfName.EMBEDDEDFILE);
    stream.put(PdfName.SUBTYPE, new PdfName("application/json"));
    PdfDictionary parameters = new PdfDictionary();
    parameters.put(PdfName.SIZE, new PdfNumber(bytes.length));
    stream.put(PdfName.PARAMS, parameters);
    stream.put(new PdfName(SUM_KEY), new PdfName(Carried.of(text).checksum()));
    stream.flateCompress();
    PdfIndirectReference place = stamper.getWriter().addToBody(stream).getIndirectReference();
    PdfDictionary embedded = new PdfDictionary();
    embedded.put(PdfName.F, place);
    PdfFileSpecification file = PdfFileSpecification.fileExtern(stamper.getWriter(), FILE);
    file.put(PdfName.EF, embedded);
    return file;
  }

  /**
   * The text in a picture; empty for a whole picture without one. The stream that holds it is found
   * by its check sum, not by way of the document's structure: a stream lies open in any PDF, and to
   * follow a broken structure can take any time and memory.
   */
  static Optional<Carried> read(byte[] picture) throws PictureTrouble {
    String document = new String(picture, StandardCharsets.ISO_8859_1);
    Matcher sum = SUM.matcher(document);
    Optional<Carried> found = Optional.empty();
    while (sum.find()) {
      if (found.isPresent() && !found.get().checksum().equals(sum.group(1))) {
        throw PictureTrouble.several();
      }
      if (found.isEmpty()) {
        found = Optional.of(new Carried(text(picture, document, sum), sum.group(1)));
      }
    }
    if (found.isEmpty()) {
      checkNone(picture, document);
    }
    return found;
  }

  private static void checkNone(byte[] picture, String document) throws PictureTrouble {
    if (!document.stripTrailing().endsWith(END)) {
      throw PictureTrouble.broken(picture, FILE, "the picture ends too early");
    }
    if (document.contains(FILE)) {
      throw PictureTrouble.damaged("its check sum is missing");
    }
  }

  private static String text(byte[] picture, String document, Matcher sum) throws PictureTrouble {
    int keyword = document.indexOf("stream", sum.end());
    if (keyword < 0) {
      throw PictureTrouble.damaged("the picture ends too early");
    }
    int start = afterLineEnd(document, keyword + "stream".length());
    int object = document.lastIndexOf(" obj", sum.start());
    String dictionary = document.substring(Math.max(object, 0), keyword);
    if (dictionary.contains("/FlateDecode")) {
      return Packing.unpacked(picture, start, picture.length);
    }
    if (dictionary.contains("/Filter")) {
      throw PictureTrouble.damaged("it is packed in a way that is not known");
    }
    int end = document.indexOf("endstream", start);
    return Packing.plain(picture, start, end < 0 ? picture.length : end);
  }

  private static int afterLineEnd(String document, int from) {
    int start = document.startsWith("\r", from) ? from + 1 : from;
    return document.startsWith("\n", start) ? start + 1 : start;
  }
}

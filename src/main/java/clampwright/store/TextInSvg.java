package clampwright.store;

import java.io.ByteArrayOutputStream;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import javax.xml.namespace.QName;
import javax.xml.stream.XMLOutputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamWriter;

/**
 * A text inside an SVG picture: in an element of a namespace of its own, within a metadata element
 * that is the first child of the root. The rest of the document stays as it is, byte for byte.
 */
final class TextInSvg {
  static final QName METADATA = new QName("http://www.w3.org/2000/svg", "metadata");
  static final QName SKETCH = new QName("urn:clampwright:sketch", "sketch");
  static final String SUM = "sha256";

  private static final XMLOutputFactory FACTORY = XMLOutputFactory.newDefaultFactory();

  private TextInSvg() {}

  /**
   * The same picture with a text.
   *
   * @throws IllegalArgumentException when a picture has no root
   */
  static byte[] with(byte[] picture, String text) {
    // All marks of XML are ASCII, so that any encoding that holds ASCII may be read as Latin-1.
    String document = new String(picture, StandardCharsets.ISO_8859_1);
    int root = root(document);
    int end = tagEnd(document, root);
    boolean closed = document.charAt(end - 1) == '/';
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    out.write(picture, 0, closed ? end - 1 : end);
    out.writeBytes(ascii(">" + metadata(Carried.of(escaped(text)))));
    if (closed) {
      out.writeBytes(ascii("</" + name(document, root) + ">"));
    }
    out.write(picture, end + 1, picture.length - end - 1);
    return out.toByteArray();
  }

  /** Where the root's start tag starts: behind declarations and comments. */
  private static int root(String document) {
    int start = document.indexOf('<');
    while (start >= 0) {
      if (document.startsWith("<!--", start)) {
        start = document.indexOf("-->", start);
      } else if (document.startsWith("<?", start)) {
        start = document.indexOf("?>", start);
      } else if (!document.startsWith("<!", start)) {
        return start;
      }
      start = start < 0 ? start : document.indexOf('<', start + 1);
    }
    throw new IllegalArgumentException("an SVG picture has a root");
  }

  /** Where a start tag ends, which is no bracket between quotes. */
  private static int tagEnd(String document, int start) {
    char quote = 0;
    for (int i = start; i < document.length(); i++) {
      char mark = document.charAt(i);
      if (quote != 0) {
        quote = mark == quote ? 0 : quote;
      } else if (mark == '"' || mark == '\'') {
        quote = mark;
      } else if (mark == '>') {
        return i;
      }
    }
    throw new IllegalArgumentException("the root of an SVG picture has a start tag");
  }

  private static String name(String document, int start) {
    return document.substring(start + 1).split("[\\s/>]", 2)[0];
  }

  private static String metadata(Carried carried) {
    StringWriter out = new StringWriter();
    try {
      XMLStreamWriter xml = FACTORY.createXMLStreamWriter(out);
      xml.writeStartElement("", METADATA.getLocalPart(), METADATA.getNamespaceURI());
      xml.writeDefaultNamespace(METADATA.getNamespaceURI());
      xml.writeStartElement("", SKETCH.getLocalPart(), SKETCH.getNamespaceURI());
      xml.writeDefaultNamespace(SKETCH.getNamespaceURI());
      xml.writeAttribute(SUM, carried.checksum());
      xml.writeCharacters(carried.text());
      xml.writeEndElement();
      xml.writeEndElement();
      xml.close();
    } catch (XMLStreamException e) {
      throw new IllegalStateException("text in memory can be written", e);
    }
    return out.toString();
  }

  /**
   * JSON with every character beyond ASCII as its escape: XML does not allow some of them, and a
   * picture may come to be stored in another encoding.
   */
  private static String escaped(String json) {
    StringBuilder escaped = new StringBuilder(json.length());
    for (char each : json.toCharArray()) {
      escaped.append(each < 0x7F ? each : String.format(Locale.ROOT, "\\u%04x", (int) each));
    }
    return escaped.toString();
  }

  private static byte[] ascii(String text) {
    return text.getBytes(StandardCharsets.US_ASCII);
  }
}

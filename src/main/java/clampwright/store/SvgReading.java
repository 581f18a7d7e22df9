package clampwright.store;

import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;

/** Looks through an SVG picture for the text inside it. */
final class SvgReading {
  /** Of the sketch: root, metadata, sketch. */
  private static final int DEPTH = 3;

  private static final String BYTE_ORDER_MARK = "\uFEFF";
  private static final XMLInputFactory FACTORY = factory();

  private final XMLStreamReader reader;
  private int depth;
  private boolean inMetadata;
  private boolean hasDocumentType;

  private SvgReading(XMLStreamReader reader) {
    this.reader = reader;
  }

  /** Nothing that a picture names outside itself is fetched, and no entity of its own grows. */
  private static XMLInputFactory factory() {
    XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
    factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
    factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
    return factory;
  }

  /** The text in a picture; empty for a picture without one. */
  static Optional<Carried> read(byte[] picture) throws PictureTrouble {
    // Whatever the encoding, the text itself is ASCII.
    String text = new String(picture, StandardCharsets.UTF_8);
    String document = text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text;
    SvgReading reading;
    try {
      reading = new SvgReading(FACTORY.createXMLStreamReader(new StringReader(document)));
    } catch (XMLStreamException e) {
      throw broken(picture);
    }
    try {
      return reading.find();
    } catch (XMLStreamException e) {
      // Pictures of other programs may use entities that their document type declares.
      if (reading.hasDocumentType) {
        return Optional.empty();
      }
      throw broken(picture);
    }
  }

  private static PictureTrouble broken(byte[] picture) {
    return PictureTrouble.broken(
        picture, TextInSvg.SKETCH.getNamespaceURI(), "its XML is not well-formed");
  }

  private Optional<Carried> find() throws XMLStreamException, PictureTrouble {
    while (reader.hasNext()) {
      switch (next()) {
        case XMLStreamConstants.START_ELEMENT -> {
          if (isSketch()) {
            return Optional.of(sketch());
          }
        }
        case XMLStreamConstants.END_ELEMENT -> depth--;
        case XMLStreamConstants.DTD -> hasDocumentType = true;
        default -> {
          // Text and comments of the picture.
        }
      }
    }
    return Optional.empty();
  }

  private boolean isSketch() {
    depth++;
    if (depth == DEPTH - 1) {
      inMetadata = reader.getName().equals(TextInSvg.METADATA);
    }
    return depth == DEPTH && inMetadata && reader.getName().equals(TextInSvg.SKETCH);
  }

  private Carried sketch() throws XMLStreamException, PictureTrouble {
    String sum = reader.getAttributeValue(null, TextInSvg.SUM);
    if (sum == null) {
      throw PictureTrouble.damaged("its check sum is missing");
    }
    StringBuilder text = new StringBuilder();
    while (next() != XMLStreamConstants.END_ELEMENT) {
      if (!reader.hasText()) {
        throw PictureTrouble.damaged("its text is mixed with something else");
      }
      text.append(reader.getText());
      if (text.length() > Packing.LARGEST) {
        throw PictureTrouble.tooLarge();
      }
    }
    return new Carried(text.toString(), sum);
  }

  /** The JDK's reader answers some broken documents with unchecked exceptions. */
  private int next() throws XMLStreamException {
    try {
      return reader.next();
    } catch (RuntimeException e) {
      throw new XMLStreamException(e);
    }
  }
}

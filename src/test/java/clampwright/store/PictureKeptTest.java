package clampwright.store;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.joint.Sketch;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.multipdf.PDFMergerUtility;
import org.apache.pdfbox.pdfwriter.compress.CompressParameters;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDEmbeddedFilesNameTreeNode;
import org.apache.pdfbox.pdmodel.common.filespecification.PDComplexFileSpecification;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.xml.sax.SAXException;

/** A picture with a sketch inside is the same picture to other programs. */
class PictureKeptTest {
  private static final Sketch SKETCH =
      Texts.opened(Texts.SHORTEST).sketch().withName("Träger ]]> & 2″");

  private static byte[] with(PictureFormat format) {
    return SketchPicture.with(format, Pictures.of(format), SKETCH);
  }

  private static int[] pixels(byte[] png) throws IOException {
    BufferedImage image = ImageIO.read(new ByteArrayInputStream(png));
    return image.getRGB(0, 0, image.getWidth(), image.getHeight(), null, 0, image.getWidth());
  }

  private static List<String> chunks(byte[] png) {
    List<String> types = new ArrayList<>();
    int start = PngChunk.FIRST;
    while (start < png.length) {
      PngChunk chunk = PngChunk.at(png, start).orElseThrow();
      assertTrue(chunk.isSound(), chunk.type());
      types.add(chunk.type());
      start = chunk.end();
    }
    return types;
  }

  @Test
  void aPngKeepsItsPixelsAndChunks() throws IOException {
    assertArrayEquals(pixels(Pictures.of(PictureFormat.PNG)), pixels(with(PictureFormat.PNG)));
    assertEquals(List.of("IHDR", "IDAT", "IEND"), chunks(Pictures.of(PictureFormat.PNG)));
    assertEquals(List.of("IHDR", "iTXt", "tEXt", "IDAT", "IEND"), chunks(with(PictureFormat.PNG)));
  }

  private static Document parsed(byte[] svg)
      throws ParserConfigurationException, SAXException, IOException {
    DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
    factory.setNamespaceAware(true);
    return factory.newDocumentBuilder().parse(new ByteArrayInputStream(svg));
  }

  private static void checkSvgKept(String svg)
      throws ParserConfigurationException, SAXException, IOException {
    byte[] carrying = SketchPicture.with(PictureFormat.SVG, Pictures.bytes(svg), SKETCH);
    Document document = parsed(carrying);
    Node metadata = document.getDocumentElement().getFirstChild();
    assertEquals("http://www.w3.org/2000/svg", metadata.getNamespaceURI());
    assertEquals("metadata", metadata.getLocalName());
    Element sketch = (Element) metadata.getFirstChild();
    assertEquals("urn:clampwright:sketch", sketch.getNamespaceURI());
    assertEquals(Texts.opened(SketchJson.of(SKETCH)), Texts.opened(sketch.getTextContent()));
    document.getDocumentElement().removeChild(metadata);
    assertTrue(document.isEqualNode(parsed(Pictures.bytes(svg))), svg);
    assertEquals(new Stored.Opened(SKETCH, List.of(), true), SketchPicture.read(carrying));
  }

  @Test
  void anSvgKeepsEverythingElse() throws ParserConfigurationException, SAXException, IOException {
    checkSvgKept(Pictures.SVG);
    checkSvgKept("<svg/>");
    checkSvgKept("\uFEFF<?xml version='1.0'?><svg a='>' />");
    checkSvgKept("<s:svg xmlns:s='http://www.w3.org/2000/svg'><s:g/></s:svg>");
    checkSvgKept("<s:svg xmlns:s='http://www.w3.org/2000/svg'/>");
    checkSvgKept("<!DOCTYPE svg [<!ENTITY a 'x'>]><svg><metadata><x xmlns='y'/></metadata></svg>");
  }

  @Test
  void anSvgKeepsItsBytes() {
    String svg = new String(with(PictureFormat.SVG), StandardCharsets.UTF_8);
    int start = svg.indexOf("<metadata");
    int end = svg.indexOf("</metadata>") + "</metadata>".length();
    assertEquals(Pictures.SVG, svg.substring(0, start) + svg.substring(end));
  }

  @Test
  void aPdfKeepsItsPagesAndListsTheSketch() throws IOException {
    try (PDDocument before = Loader.loadPDF(Pictures.of(PictureFormat.PDF));
        PDDocument after = Loader.loadPDF(with(PictureFormat.PDF))) {
      assertEquals(2, after.getNumberOfPages());
      PDFTextStripper words = new PDFTextStripper();
      assertEquals(words.getText(before), words.getText(after));
      assertEquals(
          before.getDocumentInformation().getTitle(), after.getDocumentInformation().getTitle());
      PDEmbeddedFilesNameTreeNode tree = after.getDocumentCatalog().getNames().getEmbeddedFiles();
      Map<String, PDComplexFileSpecification> files = tree.getNames();
      assertEquals(1, files.size());
      PDComplexFileSpecification file = files.values().iterator().next();
      assertEquals("sketch.joint.json", file.getFilename());
      assertEquals("application/json", file.getEmbeddedFile().getSubtype());
      byte[] text = file.getEmbeddedFile().toByteArray();
      assertEquals(text.length, file.getEmbeddedFile().getSize());
      assertEquals(SketchJson.of(SKETCH), new String(text, StandardCharsets.UTF_8));
    }
  }

  /** Another program packs the document's structure away, which leaves the streams open. */
  @Test
  void aPdfWrittenAnewKeepsTheSketch() throws IOException {
    for (CompressParameters packing :
        List.of(CompressParameters.DEFAULT_COMPRESSION, CompressParameters.NO_COMPRESSION)) {
      ByteArrayOutputStream out = new ByteArrayOutputStream();
      try (PDDocument document = Loader.loadPDF(with(PictureFormat.PDF))) {
        document.save(out, packing);
      }
      assertEquals(
          new Stored.Opened(SKETCH, List.of(), true), SketchPicture.read(out.toByteArray()));
    }
  }

  @Test
  void aPdfOfSeveralPicturesSaysSo() throws IOException {
    byte[] one = with(PictureFormat.PDF);
    byte[] other =
        SketchPicture.with(
            PictureFormat.PDF, Pictures.of(PictureFormat.PDF), SKETCH.withName("Other"));
    assertEquals(new Stored.Opened(SKETCH, List.of(), true), SketchPicture.read(merged(one, one)));
    assertEquals(
        new Stored.Refused(List.of("This picture holds more than one sketch.")),
        SketchPicture.read(merged(one, other)));
  }

  private static byte[] merged(byte[]... pictures) throws IOException {
    PDFMergerUtility merger = new PDFMergerUtility();
    for (byte[] picture : pictures) {
      merger.addSource(new RandomAccessReadBuffer(picture));
    }
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    merger.setDestinationStream(out);
    merger.mergeDocuments(null);
    return out.toByteArray();
  }

  /** A stream that another program unpacked. */
  @Test
  void anUnpackedAttachmentIsReadToo() throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (PDDocument document = Loader.loadPDF(with(PictureFormat.PDF))) {
      PDComplexFileSpecification file =
          document.getDocumentCatalog().getNames().getEmbeddedFiles().getNames().values().stream()
              .findFirst()
              .orElseThrow();
      byte[] text = file.getEmbeddedFile().toByteArray();
      file.getEmbeddedFile().getCOSObject().removeItem(COSName.FILTER);
      try (OutputStream plain = file.getEmbeddedFile().getCOSObject().createOutputStream()) {
        plain.write(text);
      }
      document.save(out, CompressParameters.NO_COMPRESSION);
    }
    assertTrue(out.toString(StandardCharsets.UTF_8).contains("\"bearingDiameter\": 14.63"));
    assertEquals(new Stored.Opened(SKETCH, List.of(), true), SketchPicture.read(out.toByteArray()));
  }
}

package clampwright.paint.print;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import clampwright.figure.Figure;
import clampwright.figure.Mark;
import clampwright.figure.PictureFigure;
import clampwright.figure.Preset;
import clampwright.figure.Role;
import clampwright.figure.Show;
import clampwright.joint.Sketch;
import clampwright.mechanics.Assessment;
import clampwright.paint.Palette;
import clampwright.store.Samples;
import clampwright.store.Stored;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.StringReader;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import javax.imageio.ImageReader;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.stream.ImageInputStream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

/** The same marks in every kind of picture. */
class PicturesTest {
  private static final double MM_PER_INCH = 25.4;

  static Stream<Sketch> samples() {
    return Samples.all().stream().map(sample -> ((Stored.Opened) Samples.open(sample)).sketch());
  }

  private static Figure figure(Sketch sketch, Preset preset) {
    return PictureFigure.of(
        sketch,
        Assessment.of(sketch.joint()),
        new PictureFigure.Request(preset, EnumSet.allOf(Show.class), "A caption", 0));
  }

  private static List<String> texts(Figure figure) {
    List<String> texts = new ArrayList<>();
    for (Mark mark : figure.marks()) {
      if (mark instanceof Mark.Text text && !text.text().isEmpty()) {
        texts.add(text.text());
      } else if (mark instanceof Mark.Pill pill) {
        texts.add(pill.letter());
        texts.add(pill.text());
      }
    }
    return texts;
  }

  /** Every mark once, under its role, in painting order within the role. */
  @ParameterizedTest
  @MethodSource("samples")
  void anSvgHasEveryMarkUnderItsRole(Sketch sketch) throws Exception {
    Figure figure = figure(sketch, Preset.SHEET);
    Document document = parsed(svg(figure));
    Map<Role, Integer> expected = new EnumMap<>(Role.class);
    for (Mark mark : figure.marks()) {
      boolean empty = mark instanceof Mark.Text text && text.text().isEmpty();
      expected.merge(mark.role(), empty ? 0 : 1, Integer::sum);
    }
    Map<Role, Integer> found = new EnumMap<>(Role.class);
    NodeList all = document.getElementsByTagName("*");
    for (int i = 0; i < all.getLength(); i++) {
      String role = ((Element) all.item(i)).getAttribute("data-role");
      if (!role.isEmpty()) {
        found.merge(Role.valueOf(role), 1, Integer::sum);
      }
    }
    assertEquals(expected, found);
  }

  @ParameterizedTest
  @MethodSource("samples")
  void anSvgHasItsSizeTitleAndText(Sketch sketch) throws Exception {
    Figure figure = figure(sketch, Preset.COLUMN);
    Document document = parsed(svg(figure));
    Element root = document.getDocumentElement();
    assertEquals("85mm", root.getAttribute("width"));
    assertEquals("0 0 85 155", root.getAttribute("viewBox"));
    assertEquals(sketch.name(), document.getElementsByTagName("title").item(0).getTextContent());
    List<String> found = new ArrayList<>();
    NodeList texts = document.getElementsByTagName("text");
    for (int i = 0; i < texts.getLength(); i++) {
      found.add(texts.item(i).getTextContent());
    }
    assertEquals(texts(figure), found);
  }

  private static String svg(Figure figure) {
    return SvgPicture.of(figure, Palette.WHITE, "A description", part -> part.kind().name());
  }

  private static Document parsed(String svg) throws Exception {
    return DocumentBuilderFactory.newInstance()
        .newDocumentBuilder()
        .parse(new InputSource(new StringReader(svg)));
  }

  /** Words of the figure can be selected, the typeface is embedded, the page has the size asked. */
  @ParameterizedTest
  @MethodSource("samples")
  void aPdfHasItsPageAndItsText(Sketch sketch) throws IOException {
    Figure figure = figure(sketch, Preset.SHEET);
    try (PDDocument pdf = Loader.loadPDF(PdfPicture.of(figure, Palette.WHITE))) {
      assertEquals(1, pdf.getNumberOfPages());
      assertEquals(297, pdf.getPage(0).getMediaBox().getWidth() * MM_PER_INCH / 72, 0.01);
      assertEquals(210, pdf.getPage(0).getMediaBox().getHeight() * MM_PER_INCH / 72, 0.01);
      assertEquals(sketch.name(), pdf.getDocumentInformation().getTitle());
      String text = new PDFTextStripper().getText(pdf).replaceAll("[\\s\\u2009]+", "");
      for (String word : texts(figure)) {
        assertTrue(text.contains(word.replaceAll("[\\s\\u2009]+", "")), word + " in " + text);
      }
      for (var name : pdf.getPage(0).getResources().getFontNames()) {
        assertTrue(pdf.getPage(0).getResources().getFont(name).isEmbedded());
      }
    }
  }

  @ParameterizedTest
  @EnumSource(Preset.class)
  void aPngHasItsPixelsAndItsResolution(Preset preset) throws IOException {
    Figure figure = figure(samples().findFirst().orElseThrow(), preset);
    byte[] png = PngPicture.of(figure, Palette.WHITE, 150);
    try (ImageInputStream in = ImageIO.createImageInputStream(new ByteArrayInputStream(png))) {
      ImageReader reader = ImageIO.getImageReaders(in).next();
      reader.setInput(in);
      assertEquals(Math.round(preset.width() / MM_PER_INCH * 150), reader.getWidth(0));
      assertEquals(
          Math.round(preset.height(EnumSet.allOf(Show.class)) / MM_PER_INCH * 150),
          reader.getHeight(0));
      assertEquals(150 / 0.0254, perMetre(reader.getImageMetadata(0)), 1);
      reader.dispose();
    }
  }

  private static double perMetre(IIOMetadata metadata) {
    Element root = (Element) metadata.getAsTree("javax_imageio_png_1.0");
    Element size = (Element) root.getElementsByTagName("pHYs").item(0);
    assertEquals("meter", size.getAttribute("unitSpecifier"));
    return Double.parseDouble(size.getAttribute("pixelsPerUnitXAxis"));
  }

  @Test
  void aPictureTooLargeIsRefused() {
    Figure figure = figure(samples().findFirst().orElseThrow(), Preset.SHEET);
    assertThrows(IllegalArgumentException.class, () -> PngPicture.of(figure, Palette.WHITE, 2400));
  }

  /** Nothing but black, white and the greys of smoothed edges and bands. */
  @Test
  void inBlackAndWhiteThereIsNoColour() {
    Figure figure = figure(samples().findFirst().orElseThrow(), Preset.PAGE);
    BufferedImage image = PngPicture.image(figure, Palette.BLACK_AND_WHITE, 100);
    int dark = 0;
    for (int y = 0; y < image.getHeight(); y++) {
      for (int x = 0; x < image.getWidth(); x++) {
        int rgb = image.getRGB(x, y);
        assertEquals(rgb & 0xFF, rgb >> 8 & 0xFF);
        assertEquals(rgb & 0xFF, rgb >> 16 & 0xFF);
        dark += (rgb & 0xFF) < 64 ? 1 : 0;
      }
    }
    assertNotEquals(0, dark);
  }
}

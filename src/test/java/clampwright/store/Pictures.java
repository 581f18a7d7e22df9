package clampwright.store;

import com.lowagie.text.Document;
import com.lowagie.text.Paragraph;
import com.lowagie.text.pdf.PdfWriter;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import javax.imageio.ImageIO;

/** Small pictures for tests, made by other means than the program's own. */
final class Pictures {
  static final String SVG =
      """
      <?xml version="1.0" encoding="UTF-8"?>
      <!-- Plotted > for <svg> tests -->
      <svg xmlns="http://www.w3.org/2000/svg" viewBox='0 0 40 30' data-note="a > b
      &#10;c">
        <title>Träger − 2″</title>
        <style><![CDATA[ g > path { stroke: #000 } ]]></style>
        <g id="plates"><path d="M0 0H40V30&#x5A;"/><!-- hatch --></g>
        <text x="1">a &lt; b &amp; c</text>
      </svg>
      <!-- </svg> -->
      """;

  private Pictures() {}

  /** A plain picture of a format. */
  static byte[] of(PictureFormat format) {
    return switch (format) {
      case PNG -> png();
      case SVG -> bytes(SVG);
      case PDF -> pdf();
    };
  }

  static byte[] bytes(String text) {
    return text.getBytes(StandardCharsets.UTF_8);
  }

  private static byte[] png() {
    BufferedImage image = new BufferedImage(40, 30, BufferedImage.TYPE_INT_ARGB);
    Graphics2D graphics = image.createGraphics();
    graphics.setColor(Color.ORANGE);
    graphics.fillOval(4, 4, 30, 20);
    graphics.dispose();
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try {
      ImageIO.write(image, "png", out);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toByteArray();
  }

  private static byte[] pdf() {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (Document document = new Document()) {
      PdfWriter.getInstance(document, out);
      document.open();
      document.addTitle("Two sheets");
      document.add(new Paragraph("One"));
      document.newPage();
      document.add(new Paragraph("Two"));
    }
    return out.toByteArray();
  }
}

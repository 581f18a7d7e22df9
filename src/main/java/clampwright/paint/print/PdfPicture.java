package clampwright.paint.print;

import clampwright.figure.Figure;
import clampwright.paint.Palette;
import com.lowagie.text.Document;
import com.lowagie.text.DocumentException;
import com.lowagie.text.Rectangle;
import com.lowagie.text.pdf.BaseFont;
import com.lowagie.text.pdf.FontMapper;
import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfWriter;
import java.awt.Font;
import java.awt.Graphics2D;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;

/**
 * A figure as a PDF page of its size: vectors, the typeface embedded, text that can be selected.
 */
public final class PdfPicture {
  private static final float POINTS_PER_MM = 72 / 25.4f;

  private PdfPicture() {}

  /** The page. */
  public static byte[] of(Figure figure, Palette palette) {
    float width = (float) figure.width() * POINTS_PER_MM;
    float height = (float) figure.height() * POINTS_PER_MM;
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    Document document = new Document(new Rectangle(width, height), 0, 0, 0, 0);
    PdfWriter writer = writer(document, bytes);
    document.addTitle(figure.title());
    document.addCreator("Clampwright");
    document.open();
    PdfContentByte content = writer.getDirectContent();
    Graphics2D graphics = content.createGraphics(width, height, new Liberation());
    graphics.scale(POINTS_PER_MM, POINTS_PER_MM);
    new GraphicsPainter(graphics, palette).paint(figure);
    graphics.dispose();
    document.close();
    return bytes.toByteArray();
  }

  private static PdfWriter writer(Document document, ByteArrayOutputStream bytes) {
    try {
      return PdfWriter.getInstance(document, bytes);
    } catch (DocumentException impossible) {
      throw new IllegalStateException("a PDF cannot be begun", impossible);
    }
  }

  /** Finds the embedded font for a Java2D font by its weight. */
  private static final class Liberation implements FontMapper {
    private final BaseFont regular = embedded(PrintFonts.REGULAR);
    private final BaseFont bold = embedded(PrintFonts.BOLD);

    private static BaseFont embedded(String file) {
      try {
        return BaseFont.createFont(
            file.substring(file.lastIndexOf('/') + 1),
            BaseFont.IDENTITY_H,
            BaseFont.EMBEDDED,
            true,
            PrintFonts.bytes(file),
            null);
      } catch (IOException e) {
        throw new UncheckedIOException(e);
      } catch (DocumentException e) {
        throw new IllegalStateException("the typeface " + file + " cannot be embedded", e);
      }
    }

    @Override
    public BaseFont awtToPdf(Font font) {
      return font.getFontName().contains("Bold") ? bold : regular;
    }

    @Override
    public Font pdfToAwt(BaseFont font, int size) {
      throw new UnsupportedOperationException("fonts are only written");
    }
  }
}

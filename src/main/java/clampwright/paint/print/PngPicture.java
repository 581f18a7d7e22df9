package clampwright.paint.print;

import clampwright.figure.Figure;
import clampwright.paint.Palette;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Iterator;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageTypeSpecifier;
import javax.imageio.ImageWriteParam;
import javax.imageio.ImageWriter;
import javax.imageio.metadata.IIOInvalidTreeException;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.ImageOutputStream;

/** A figure as a PNG picture, with its resolution recorded. */
public final class PngPicture {
  private static final double MM_PER_INCH = 25.4;
  private static final String NATIVE = "javax_imageio_png_1.0";

  /** Beyond this a picture would not fit in memory. */
  private static final long MOST_PIXELS = 200_000_000;

  private PngPicture() {}

  /**
   * The picture.
   *
   * @param dpi dots per inch, which together with the figure's size gives the pixels
   * @throws IllegalArgumentException when that is less than one pixel or more than 200 million
   */
  public static byte[] of(Figure figure, Palette palette, double dpi) {
    BufferedImage image = image(figure, palette, dpi);
    try {
      return encoded(image, dpi);
    } catch (IOException impossible) {
      throw new UncheckedIOException(impossible);
    }
  }

  /**
   * The picture's pixels.
   *
   * @param width [px]
   * @param height [px]
   * @param argb row by row, 0xAARRGGBB
   */
  public record Pixels(int width, int height, int[] argb) {}

  /** The picture as pixels, for a screen. */
  public static Pixels pixels(Figure figure, Palette palette, double dpi) {
    BufferedImage image = image(figure, palette, dpi);
    int width = image.getWidth();
    int height = image.getHeight();
    int[] argb = image.getRGB(0, 0, width, height, null, 0, width);
    for (int i = 0; i < argb.length; i++) {
      argb[i] |= 0xFF000000;
    }
    return new Pixels(width, height, argb);
  }

  /** The picture as an image. */
  static BufferedImage image(Figure figure, Palette palette, double dpi) {
    double scale = dpi / MM_PER_INCH;
    long width = Math.round(figure.width() * scale);
    long height = Math.round(figure.height() * scale);
    if (width < 1 || height < 1 || width * height > MOST_PIXELS) {
      throw new IllegalArgumentException(
          "a picture of " + width + " × " + height + " pixels cannot be made");
    }
    BufferedImage image = new BufferedImage((int) width, (int) height, BufferedImage.TYPE_INT_RGB);
    Graphics2D graphics = image.createGraphics();
    graphics.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    graphics.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    graphics.setRenderingHint(
        RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    graphics.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    graphics.scale(scale, scale);
    new GraphicsPainter(graphics, palette).paint(figure);
    graphics.dispose();
    return image;
  }

  private static byte[] encoded(BufferedImage image, double dpi) throws IOException {
    Iterator<ImageWriter> writers = ImageIO.getImageWritersByFormatName("png");
    ImageWriter writer = writers.next();
    try {
      ImageWriteParam parameters = writer.getDefaultWriteParam();
      IIOMetadata metadata =
          writer.getDefaultImageMetadata(
              ImageTypeSpecifier.createFromRenderedImage(image), parameters);
      record(metadata, dpi);
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      try (ImageOutputStream out = ImageIO.createImageOutputStream(bytes)) {
        writer.setOutput(out);
        writer.write(null, new IIOImage(image, null, metadata), parameters);
      }
      return bytes.toByteArray();
    } finally {
      writer.dispose();
    }
  }

  private static void record(IIOMetadata metadata, double dpi) throws IIOInvalidTreeException {
    String perMetre = Long.toString(Math.round(dpi * 1000 / MM_PER_INCH));
    IIOMetadataNode size = new IIOMetadataNode("pHYs");
    size.setAttribute("pixelsPerUnitXAxis", perMetre);
    size.setAttribute("pixelsPerUnitYAxis", perMetre);
    size.setAttribute("unitSpecifier", "meter");
    IIOMetadataNode root = new IIOMetadataNode(NATIVE);
    root.appendChild(size);
    metadata.mergeTree(NATIVE, root);
  }
}

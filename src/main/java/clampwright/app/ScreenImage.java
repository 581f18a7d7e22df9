package clampwright.app;

import javafx.scene.image.Image;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;

/** A painted picture as an image of the screen, for a preview and for the clipboard. */
final class ScreenImage {
  private ScreenImage() {}

  static Image of(int width, int height, int[] argb) {
    WritableImage image = new WritableImage(width, height);
    image
        .getPixelWriter()
        .setPixels(0, 0, width, height, PixelFormat.getIntArgbInstance(), argb, 0, width);
    return image;
  }
}

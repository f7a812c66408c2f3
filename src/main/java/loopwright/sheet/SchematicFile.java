package loopwright.sheet;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import javax.imageio.ImageIO;
import loopwright.file.AtomicFile;

/** The kinds of file that a schematic is written to, black on white. */
public enum SchematicFile {
  /** Lines and letters. */
  SVG,
  /** Pixels, two a point. */
  PNG;

  private static final int PIXELS = 2;

  /** The kind that a file's name says. */
  public static Optional<SchematicFile> of(Path target) {
    String name = target.toString().toLowerCase(Locale.ROOT);
    if (name.endsWith(".svg")) {
      return Optional.of(SVG);
    }
    return name.endsWith(".png") ? Optional.of(PNG) : Optional.empty();
  }

  /**
   * Writes a schematic.
   *
   * @param overlay to lay over it; empty for none
   * @throws loopwright.file.FileException when the file cannot be written
   */
  public void write(SchematicDrawing drawing, Optional<SchematicOverlay> overlay, Path target) {
    AtomicFile.write(target, bytes(drawing, overlay));
  }

  /** The bytes of the file. */
  public byte[] bytes(SchematicDrawing drawing, Optional<SchematicOverlay> overlay) {
    int width = (int) Math.ceil(drawing.width());
    int height = (int) Math.ceil(drawing.height());
    if (this == SVG) {
      return VectorPicture.svg(
          width, height, graphics -> drawing.paint(graphics, SchematicInk.PAPER, overlay));
    }
    BufferedImage image =
        new BufferedImage(PIXELS * width, PIXELS * height, BufferedImage.TYPE_INT_RGB);
    Graphics2D g2 = image.createGraphics();
    g2.setColor(Color.WHITE);
    g2.fillRect(0, 0, image.getWidth(), image.getHeight());
    g2.scale(PIXELS, PIXELS);
    g2.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g2.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    drawing.paint(g2, SchematicInk.PAPER, overlay);
    g2.dispose();
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try {
      ImageIO.write(image, "png", bytes);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return bytes.toByteArray();
  }
}

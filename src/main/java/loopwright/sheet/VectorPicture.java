package loopwright.sheet;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStreamWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.function.Consumer;
import org.apache.batik.dom.GenericDOMImplementation;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;

/** Turns whatever paints on a {@code Graphics2D} into a file of lines and letters. */
public final class VectorPicture {
  private static final String SVG = "http://www.w3.org/2000/svg";

  private VectorPicture() {}

  /**
   * An SVG file in UTF-8; text stays text, so that it can be searched and edited.
   *
   * @param width in pixels
   * @param height in pixels
   * @param painter paints the picture within that size
   */
  public static byte[] svg(int width, int height, Consumer<Graphics2D> painter) {
    Document document =
        GenericDOMImplementation.getDOMImplementation().createDocument(SVG, "svg", null);
    SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
    context.setComment("");
    SVGGraphics2D graphics = new SVGGraphics2D(context, false);
    graphics.setSVGCanvasSize(new Dimension(width, height));
    painter.accept(graphics);
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (Writer writer = new OutputStreamWriter(bytes, StandardCharsets.UTF_8)) {
      graphics.stream(writer, true);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return bytes.toByteArray();
  }
}

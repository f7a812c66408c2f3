package loopwright.sheet;

import java.awt.Dimension;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import org.apache.batik.dom.GenericDOMImplementation;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.batik.svggen.SVGIDGenerator;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** Pictures as SVG elements that stand inside another document. */
final class SvgPicture {
  private static final String SVG = "http://www.w3.org/2000/svg";

  /** Shared, so that no two pictures of a document use one name. */
  private final SVGIDGenerator names = new SVGIDGenerator();

  /** The element, without the head of a file of its own. */
  String of(Piece.Picture picture) {
    Document document =
        GenericDOMImplementation.getDOMImplementation().createDocument(SVG, "svg", null);
    SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
    context.setIDGenerator(names);
    context.setComment("");
    SVGGraphics2D graphics = new SVGGraphics2D(context, false);
    int width = (int) Math.ceil(picture.width());
    int height = (int) Math.ceil(picture.height());
    graphics.setSVGCanvasSize(new Dimension(width, height));
    graphics.setFont(SheetFonts.REGULAR.deriveFont(8f));
    picture.painter().accept(graphics);
    Element root = graphics.getRoot();
    root.setAttributeNS(null, "viewBox", "0 0 " + width + " " + height);
    root.setAttributeNS(null, "width", width + "pt");
    root.setAttributeNS(null, "height", height + "pt");
    root.setAttributeNS(null, "role", "img");
    root.setAttributeNS(null, "aria-label", picture.says());
    return text(graphics, root);
  }

  private static String text(SVGGraphics2D graphics, Element root) {
    StringWriter writer = new StringWriter();
    try {
      graphics.stream(root, writer, false, false);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    String file = writer.toString();
    return file.substring(file.indexOf("<svg")).strip();
  }
}

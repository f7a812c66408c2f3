package loopwright.sheet;

import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2DFontTextDrawer;
import java.awt.Font;
import java.io.IOException;
import java.io.UncheckedIOException;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.util.Matrix;

/** A page that is drawn on in points from its upper left corner, downward, in black. */
final class PdfPage implements AutoCloseable {
  private final PDDocument document;
  private final PdfType type;
  private final double height;
  private final PDPageContentStream stream;

  /** A new page at the end of a document. */
  PdfPage(PDDocument document, PdfType type, Paper paper) {
    this.document = document;
    this.type = type;
    this.height = paper.height();
    PDPage page = new PDPage(new PDRectangle((float) paper.width(), (float) paper.height()));
    document.addPage(page);
    try {
      this.stream = new PDPageContentStream(document, page);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Something that PDFBox may fail to write. */
  private interface Stroke {
    void make() throws IOException;
  }

  private static void make(Stroke stroke) {
    try {
      stroke.make();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Writes a text; y is that of its base line. */
  void text(double x, double y, double size, boolean bold, String text) {
    String printable = type.printable(text);
    if (printable.isBlank()) {
      return;
    }
    make(
        () -> {
          stream.beginText();
          stream.setFont(type.font(bold), (float) size);
          stream.newLineAtOffset((float) x, (float) (height - y));
          stream.showText(printable);
          stream.endText();
        });
  }

  /** Draws a straight line. */
  void line(double x, double y, double toX, double toY, double thickness) {
    make(
        () -> {
          stream.setLineWidth((float) thickness);
          stream.moveTo((float) x, (float) (height - y));
          stream.lineTo((float) toX, (float) (height - toY));
          stream.stroke();
        });
  }

  /** Draws a picture, its natural size times the scale, from its upper left corner. */
  void picture(Piece.Picture picture, double x, double y, double scale) {
    make(
        () -> {
          PdfBoxGraphics2D graphics =
              new PdfBoxGraphics2D(document, (float) picture.width(), (float) picture.height());
          graphics.setFontTextDrawer(new OwnType());
          graphics.setFont(SheetFonts.REGULAR.deriveFont(8f));
          picture.painter().accept(graphics);
          graphics.dispose();
          stream.saveGraphicsState();
          stream.transform(
              new Matrix(
                  (float) scale,
                  0,
                  0,
                  (float) scale,
                  (float) x,
                  (float) (height - y - scale * picture.height())));
          stream.drawForm(graphics.getXFormObject());
          stream.restoreGraphicsState();
        });
  }

  @Override
  public void close() {
    make(stream::close);
  }

  /** Text in pictures stays text, in the sheet's own typeface. */
  private final class OwnType extends PdfBoxGraphics2DFontTextDrawer {
    @Override
    protected PDFont mapFont(Font font, IFontTextDrawerEnv env) {
      return type.font(font.isBold() || font.getFontName().equals(SheetFonts.BOLD.getFontName()));
    }
  }
}

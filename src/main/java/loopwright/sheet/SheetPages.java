package loopwright.sheet;

import java.awt.image.BufferedImage;
import java.awt.print.PrinterException;
import java.awt.print.PrinterJob;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.printing.PDFPageable;
import org.apache.pdfbox.rendering.ImageType;
import org.apache.pdfbox.rendering.PDFRenderer;

/** The pages of a sheet, to be looked at or printed. */
public final class SheetPages {
  private static final float POINTS = 72;

  private final byte[] pdf;

  /** Those of a sheet on paper. */
  public SheetPages(BenchSheet sheet, Paper paper) {
    this.pdf = SheetFile.PDF.bytes(sheet, paper);
  }

  /**
   * A picture of each page.
   *
   * @param dotsPerInch how fine
   */
  public List<BufferedImage> pictures(double dotsPerInch) {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      PDFRenderer renderer = new PDFRenderer(document);
      List<BufferedImage> pictures = new ArrayList<>();
      for (int page = 0; page < document.getNumberOfPages(); page++) {
        pictures.add(renderer.renderImage(page, (float) dotsPerInch / POINTS, ImageType.RGB));
      }
      return pictures;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /**
   * Prints them, if a person who is asked for the printer wants that.
   *
   * @return whether they went to the printer
   * @throws PrinterException when it does not take them
   */
  public boolean print() throws PrinterException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      PrinterJob job = PrinterJob.getPrinterJob();
      job.setJobName("Bench sheet");
      job.setPageable(new PDFPageable(document));
      if (!job.printDialog()) {
        return false;
      }
      job.print();
      return true;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}

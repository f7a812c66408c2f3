package loopwright.sheet;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;
import org.apache.pdfbox.text.PDFTextStripper;
import org.apache.pdfbox.text.TextPosition;

/** What a reader finds in a PDF file. */
final class PdfText {
  private final String text;
  private final int pages;
  private final PDDocumentInformation information;
  private final List<Place> places = new ArrayList<>();

  /** Where a sign stands: its left and right edge, and its base line from the top, points. */
  record Place(String sign, int page, double left, double right, double base) {}

  PdfText(byte[] file) throws IOException {
    try (PDDocument document = Loader.loadPDF(file)) {
      PDFTextStripper stripper =
          new PDFTextStripper() {
            @Override
            protected void processTextPosition(TextPosition sign) {
              places.add(
                  new Place(
                      sign.getUnicode(),
                      getCurrentPageNo(),
                      sign.getXDirAdj(),
                      sign.getXDirAdj() + sign.getWidthDirAdj(),
                      sign.getYDirAdj()));
              super.processTextPosition(sign);
            }
          };
      stripper.setSortByPosition(true);
      text = stripper.getText(document);
      pages = document.getNumberOfPages();
      information = document.getDocumentInformation();
    }
  }

  /** All text, a blank for every white space. */
  String plain() {
    return text.replaceAll("\\s+", " ");
  }

  int pages() {
    return pages;
  }

  PDDocumentInformation information() {
    return information;
  }

  List<Place> places() {
    return List.copyOf(places);
  }
}

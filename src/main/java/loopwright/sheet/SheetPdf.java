package loopwright.sheet;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.ZoneOffset;
import java.util.GregorianCalendar;
import java.util.List;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;

/** The sheet as a PDF file. Equal sheets give equal bytes. */
final class SheetPdf {
  static final double MARGIN = 36;

  /** Sizes of the type, the largest with which {@link #PAGES} are enough is taken. */
  private static final double[] SIZES = {9, 8.5, 8, 7.5, 7};

  private static final int PAGES = 2;
  private static final double TITLE = 15;
  private static final double SUBTITLE = 8;
  private static final double FOOT = 7;
  private static final double FOOT_ROOM = 12;
  private static final int MOST_TITLE = 3;

  private final BenchSheet sheet;
  private final Paper paper;
  private final PDDocument document;
  private final PdfType type;

  private SheetPdf(BenchSheet sheet, Paper paper, PDDocument document) {
    this.sheet = sheet;
    this.paper = paper;
    this.document = document;
    this.type = new PdfType(document);
  }

  /** The bytes of the file. */
  static byte[] of(BenchSheet sheet, Paper paper) {
    try (PDDocument document = new PDDocument()) {
      SheetPdf pdf = new SheetPdf(sheet, paper, document);
      pdf.draw();
      return pdf.bytes();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private void draw() {
    Chunk head = head();
    double room = paper.height() - 2 * MARGIN - FOOT_ROOM;
    List<List<Chunk>> pages = pages(room, head);
    pages.get(0).add(0, head);
    for (int i = 0; i < pages.size(); i++) {
      try (PdfPage page = new PdfPage(document, type, paper)) {
        Chunk.draw(pages.get(i), page, MARGIN, MARGIN);
        foot(page, "page " + (i + 1) + " of " + pages.size());
      }
    }
  }

  /** In the largest type that fits; the figures that need no reading give way to a third page. */
  private List<List<Chunk>> pages(double room, Chunk head) {
    List<List<Chunk>> pages = List.of();
    for (boolean further : new boolean[] {true, false}) {
      List<Piece> pieces = SheetPieces.of(sheet, further);
      for (double size : SIZES) {
        List<Chunk> chunks = new Chunks(type, size, room).of(pieces, width());
        pages = Pagination.of(chunks, room - head.height(), room);
        if (pages.size() <= PAGES) {
          return pages;
        }
      }
    }
    return pages;
  }

  private double width() {
    return paper.width() - 2 * MARGIN;
  }

  /** Title and what stands under it. */
  private Chunk head() {
    List<String> titles = type.fewLines(sheet.title(), TITLE, true, width(), MOST_TITLE);
    List<String> says = type.lines(SheetPieces.subtitle(sheet), SUBTITLE, false, width());
    double titleHeight = 1.25 * TITLE * titles.size();
    return Chunk.of(
        titleHeight + 1.3 * SUBTITLE * says.size(),
        (page, x, y) -> {
          for (int i = 0; i < titles.size(); i++) {
            page.text(x, y + TITLE + 1.25 * TITLE * i, TITLE, true, titles.get(i));
          }
          for (int i = 0; i < says.size(); i++) {
            double base = y + titleHeight + SUBTITLE + 1.3 * SUBTITLE * i;
            page.text(x, base, SUBTITLE, false, says.get(i));
          }
        });
  }

  private void foot(PdfPage page, String number) {
    double base = paper.height() - MARGIN;
    page.text(MARGIN, base, FOOT, false, SheetPieces.foot(sheet));
    double x = paper.width() - MARGIN - type.width(number, FOOT, false);
    page.text(x, base, FOOT, false, number);
  }

  private byte[] bytes() throws IOException {
    PDDocumentInformation says = new PDDocumentInformation();
    says.setTitle(sheet.title());
    sheet.author().ifPresent(says::setAuthor);
    says.setSubject(SheetPieces.subtitle(sheet));
    says.setKeywords("checksum " + sheet.checksum());
    says.setCreator("Loopwright");
    GregorianCalendar date = GregorianCalendar.from(sheet.date().atStartOfDay(ZoneOffset.UTC));
    says.setCreationDate(date);
    says.setModificationDate(date);
    document.setDocumentInformation(says);
    document.getDocumentCatalog().setLanguage("en");
    // The file's identity hangs on what it says, so that equal sheets are equal files.
    document.setDocumentId(Long.parseUnsignedLong(sheet.checksum().substring(0, 16), 16));
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    document.save(bytes);
    return bytes.toByteArray();
  }
}

package loopwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/** Cuts the pieces of a sheet into chunks for paper. */
final class Chunks {
  /** From base line to base line, in sizes of the type. */
  private static final double LEADING = 1.28;

  private static final double HEADING = 1.2;
  private static final double GUTTER = 14;
  private static final double THIN = 0.4;

  /** Space below a paragraph, in sizes of the type. */
  private static final double PARAGRAPH = 0.25;

  private final PdfType type;
  private final double size;
  private final double room;

  /**
   * @param type the typeface
   * @param size of running text, points
   * @param room height of a page between its margins, points
   */
  Chunks(PdfType type, double size, double room) {
    this.type = type;
    this.size = size;
    this.room = room;
  }

  /** All pieces below one another. */
  List<Chunk> of(List<Piece> pieces, double width) {
    List<Chunk> chunks = new ArrayList<>();
    pieces.forEach(piece -> chunks.addAll(of(piece, width)));
    return chunks;
  }

  private List<Chunk> of(Piece piece, double width) {
    if (piece instanceof Piece.Heading heading) {
      return List.of(heading(heading, width));
    }
    if (piece instanceof Piece.Subheading heading) {
      return paragraph("", heading.text(), 0, true, width).stream()
          .map(Chunk::keepingNext)
          .toList();
    }
    if (piece instanceof Piece.Words words) {
      return paragraph("", words.text(), 0, false, width);
    }
    if (piece instanceof Piece.Steps steps) {
      return IntStream.range(0, steps.steps().size())
          .boxed()
          .flatMap(
              i -> paragraph(i + 1 + ".", steps.steps().get(i), 2 * size, false, width).stream())
          .toList();
    }
    if (piece instanceof Piece.Points points) {
      return points.points().stream()
          .flatMap(point -> paragraph("\u2013", point, 1.1 * size, false, width).stream())
          .toList();
    }
    if (piece instanceof Piece.Grid grid) {
      return new GridChunks(type, 0.94 * size, LEADING, width).of(grid);
    }
    return piece instanceof Piece.Pictures pictures
        ? pictures(pictures.pictures(), width)
        : beside((Piece.Beside) piece, width);
  }

  private Chunk heading(Piece.Heading heading, double width) {
    double large = HEADING * size;
    double height = 2.2 * large;
    return Chunk.of(
            height,
            (page, x, y) -> {
              page.text(x, y + 1.5 * large, large, true, heading.text());
              page.line(x, y + 1.8 * large, x + width, y + 1.8 * large, THIN);
            })
        .keepingNext();
  }

  /** The lines of a paragraph, the first behind a mark where it has one. */
  private List<Chunk> paragraph(
      String mark, String text, double indent, boolean bold, double width) {
    List<String> lines = type.lines(text, size, bold, width - indent);
    double leading = LEADING * size;
    List<Chunk> chunks = new ArrayList<>();
    for (int i = 0; i < lines.size(); i++) {
      String line = lines.get(i);
      String before = i == 0 ? mark : "";
      boolean last = i == lines.size() - 1;
      chunks.add(
          Chunk.of(
              leading + (last ? PARAGRAPH * size : 0),
              (page, x, y) -> {
                page.text(x, y + size, size, bold, before);
                page.text(x + indent, y + size, size, bold, line);
              }));
    }
    return chunks;
  }

  /** Rows of pictures; one that is wider than the page is made to fit. */
  private static List<Chunk> pictures(List<Piece.Picture> pictures, double width) {
    List<Chunk> rows = new ArrayList<>();
    List<Piece.Picture> row = new ArrayList<>();
    double used = 0;
    for (Piece.Picture picture : pictures) {
      if (!row.isEmpty() && used + picture.width() > width) {
        rows.add(row(row, width));
        row = new ArrayList<>();
        used = 0;
      }
      row.add(picture);
      used += picture.width();
    }
    if (!row.isEmpty()) {
      rows.add(row(row, width));
    }
    return rows;
  }

  private static Chunk row(List<Piece.Picture> pictures, double width) {
    List<Piece.Picture> row = List.copyOf(pictures);
    double natural = row.stream().mapToDouble(Piece.Picture::width).sum();
    double scale = Math.min(1, width / natural);
    double height = row.stream().mapToDouble(Piece.Picture::height).max().orElse(0);
    return Chunk.of(
        scale * height,
        (page, x, y) -> {
          double at =
              row.size() == 1 && natural > width / 2 ? x + (width - scale * natural) / 2 : x;
          for (Piece.Picture picture : row) {
            page.picture(picture, at, y, scale);
            at += scale * picture.width();
          }
        });
  }

  /** One chunk, or, where a page does not hold that, the pieces below one another. */
  private List<Chunk> beside(Piece.Beside beside, double width) {
    double leftWidth = beside.share() * (width - GUTTER);
    double rightWidth = width - GUTTER - leftWidth;
    List<Chunk> left = of(beside.left(), leftWidth);
    List<Chunk> right = of(beside.right(), rightWidth);
    double height = Math.max(Chunk.height(left), Chunk.height(right));
    if (height > room) {
      List<Chunk> stacked = new ArrayList<>(of(beside.left(), width));
      stacked.addAll(of(beside.right(), width));
      return stacked;
    }
    return List.of(
        Chunk.of(
            height,
            (page, x, y) -> {
              Chunk.draw(left, page, x, y);
              Chunk.draw(right, page, x + leftWidth + GUTTER, y);
            }));
  }
}

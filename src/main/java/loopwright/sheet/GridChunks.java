package loopwright.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/** A table on paper: a head, which is repeated on every page, and rows between thin rules. */
final class GridChunks {
  private static final double THIN = 0.3;
  private static final double BOX = 56;
  private static final double GAP = 6;

  /** Only a name made to annoy needs more. */
  private static final int MOST_LINES = 12;

  private final PdfType type;
  private final double size;
  private final double leading;
  private final double width;

  /**
   * @param type the typeface
   * @param size of the cells, points
   * @param leading from base line to base line, sizes
   * @param width of the table, points
   */
  GridChunks(PdfType type, double size, double leading, double width) {
    this.type = type;
    this.size = size;
    this.leading = leading * size;
    this.width = width;
  }

  List<Chunk> of(Piece.Grid grid) {
    double[] widths = widths(grid);
    List<String> titles = grid.columns().stream().map(Piece.Column::title).toList();
    Chunk head = row(grid, widths, titles, true).keepingNext();
    List<Chunk> chunks = new ArrayList<>();
    chunks.add(head);
    grid.rows().forEach(cells -> chunks.add(row(grid, widths, cells, false).under(head)));
    chunks.add(Chunk.space(0.5 * size));
    return chunks;
  }

  /** Text and numbers take what they need, boxes what a hand needs, wrapped cells the rest. */
  private double[] widths(Piece.Grid grid) {
    int count = grid.columns().size();
    double[] widths = new double[count];
    double[] wanted = new double[count];
    double left = width;
    double wantedAll = 0;
    for (int i = 0; i < count; i++) {
      double natural = natural(grid, i) + GAP;
      switch (grid.columns().get(i).fit()) {
        case BOX -> widths[i] = BOX;
        case WRAPPED -> wanted[i] = natural;
        default -> widths[i] = natural;
      }
      left -= widths[i];
      wantedAll += wanted[i];
    }
    for (int i = 0; i < count; i++) {
      if (wanted[i] > 0) {
        // Long columns yield more, but not all: the square root keeps short ones readable.
        widths[i] = left >= wantedAll ? wanted[i] : left * Math.sqrt(wanted[i]) / roots(wanted);
      }
    }
    if (left > wantedAll && wantedAll > 0) {
      widths[lastWrapped(grid)] += left - wantedAll;
    }
    return widths;
  }

  private static double roots(double[] wanted) {
    return IntStream.range(0, wanted.length).mapToDouble(i -> Math.sqrt(wanted[i])).sum();
  }

  private static int lastWrapped(Piece.Grid grid) {
    return IntStream.range(0, grid.columns().size())
        .filter(i -> grid.columns().get(i).fit() == Piece.Fit.WRAPPED)
        .max()
        .orElseThrow();
  }

  private double natural(Piece.Grid grid, int column) {
    double cells =
        grid.rows().stream()
            .mapToDouble(cell -> type.width(cell.get(column), size, false))
            .max()
            .orElse(0);
    return Math.max(cells, type.width(grid.columns().get(column).title(), size, true));
  }

  private Chunk row(Piece.Grid grid, double[] widths, List<String> cells, boolean head) {
    List<List<String>> lines =
        IntStream.range(0, widths.length)
            .mapToObj(
                i -> type.fewLines(cells.get(i), size, head, widths[i] - GAP + 0.01, MOST_LINES))
            .toList();
    int most = lines.stream().mapToInt(List::size).max().orElse(1);
    boolean written = !head && grid.columns().stream().anyMatch(c -> c.fit() == Piece.Fit.BOX);
    double height = Math.max(most * leading + 0.35 * size, written ? 1.9 * size : 0);
    double ruled = IntStream.range(0, widths.length).mapToDouble(i -> widths[i]).sum();
    return Chunk.of(
        height,
        (page, x, y) -> {
          double at = x;
          for (int i = 0; i < widths.length; i++) {
            Piece.Fit fit = grid.columns().get(i).fit();
            if (fit == Piece.Fit.BOX && !head) {
              page.line(at + 1, y, at + 1, y + height, THIN);
              page.line(at + widths[i] - GAP, y, at + widths[i] - GAP, y + height, THIN);
            }
            cell(page, at + (fit == Piece.Fit.BOX ? 4 : 0), y, lines.get(i), fit, widths[i], head);
            at += widths[i];
          }
          page.line(x, y + height, x + ruled, y + height, head ? 2 * THIN : THIN);
        });
  }

  private void cell(
      PdfPage page, double x, double y, List<String> lines, Piece.Fit fit, double w, boolean head) {
    for (int i = 0; i < lines.size(); i++) {
      double shift = fit == Piece.Fit.NUMBER ? w - GAP - type.width(lines.get(i), size, head) : 0;
      page.text(x + shift, y + 1.1 * size + i * leading, size, head, lines.get(i));
    }
  }
}

package loopwright.command;

import java.util.ArrayList;
import java.util.List;

/** Columns of text: the first column to the left, all others to the right. */
final class TextTable {
  private static final String GAP = "  ";

  private final List<String[]> rows = new ArrayList<>();

  /**
   * Adds a row.
   *
   * @param cells as many as in every other row
   */
  TextTable row(String... cells) {
    if (!rows.isEmpty() && rows.get(0).length != cells.length) {
      throw new IllegalArgumentException("every row needs " + rows.get(0).length + " cells");
    }
    rows.add(cells);
    return this;
  }

  /** The rows, each column as wide as its widest cell. */
  List<String> lines() {
    List<String> lines = new ArrayList<>();
    for (String[] cells : rows) {
      StringBuilder line = new StringBuilder();
      for (int column = 0; column < cells.length; column++) {
        String padding = " ".repeat(width(column) - cells[column].length());
        line.append(column == 0 ? "" : GAP);
        line.append(column == 0 ? cells[column] + padding : padding + cells[column]);
      }
      lines.add(line.toString().stripTrailing());
    }
    return lines;
  }

  private int width(int column) {
    return rows.stream().mapToInt(cells -> cells[column].length()).max().orElse(0);
  }
}

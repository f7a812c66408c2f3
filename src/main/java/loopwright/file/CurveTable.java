package loopwright.file;

import java.util.List;
import java.util.stream.Collectors;

/**
 * Columns of numbers that a curve or several are made of, as comma-separated text (RFC 4180).
 *
 * @param columns from left to right; they need not be of one length
 */
public record CurveTable(List<Column> columns) {
  /**
   * A column.
   *
   * @param head what its numbers are, with their unit
   * @param values not to be changed; one that is not finite leaves its cell empty
   */
  public record Column(String head, double[] values) {}

  /** Keeps its own copy. */
  public CurveTable {
    columns = List.copyOf(columns);
  }

  /** The text: a line of heads, then a line for each row, every number to its last digit. */
  public String text() {
    StringBuilder text = new StringBuilder();
    text.append(
        columns.stream().map(column -> quoted(column.head())).collect(Collectors.joining(",")));
    text.append("\r\n");
    int rows = columns.stream().mapToInt(column -> column.values().length).max().orElse(0);
    for (int row = 0; row < rows; row++) {
      int at = row;
      text.append(
          columns.stream().map(column -> cell(column, at)).collect(Collectors.joining(",")));
      text.append("\r\n");
    }
    return text.toString();
  }

  private static String cell(Column column, int row) {
    double[] values = column.values();
    return row < values.length && Double.isFinite(values[row]) ? Double.toString(values[row]) : "";
  }

  private static String quoted(String head) {
    return head.matches("[^\",\\r\\n]*") ? head : '"' + head.replace("\"", "\"\"") + '"';
  }
}

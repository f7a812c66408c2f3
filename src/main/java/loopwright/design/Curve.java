package loopwright.design;

import java.util.List;
import java.util.Optional;
import loopwright.quantity.Quantity;

/**
 * An imported table.
 *
 * @param name unique
 * @param hookup name of the hookup that was measured
 * @param columns its columns, all of one length
 * @param source name of the file it came from
 * @param checksum SHA-256 of that file, hexadecimal
 */
public record Curve(
    String name,
    Optional<String> hookup,
    List<Column> columns,
    Optional<String> source,
    Optional<String> checksum) {
  /** Keeps its own copy of the columns. */
  public Curve {
    columns = List.copyOf(columns);
  }

  /**
   * One column.
   *
   * @param meaning what it holds: time, frequency, a node name, gain, phase
   * @param unit symbol of its unit
   * @param values in that unit
   */
  public record Column(String meaning, String unit, List<Quantity> values) {
    /** Keeps its own copy of the values. */
    public Column {
      values = List.copyOf(values);
    }
  }
}

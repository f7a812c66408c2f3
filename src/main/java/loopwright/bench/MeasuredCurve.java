package loopwright.bench;

import java.util.List;
import java.util.Optional;
import loopwright.design.Curve;
import loopwright.quantity.Quantity;
import loopwright.quantity.Unit;

/**
 * A table that an instrument recorded, in plain units.
 *
 * @param columns all of one length
 */
public record MeasuredCurve(List<Column> columns) {
  /** Meaning of a column of times. */
  public static final String TIME = "time";

  /** Meaning of a column of frequencies. */
  public static final String FREQUENCY = "frequency";

  /** Meaning of a column of gains: a ratio, or in dB. */
  public static final String GAIN = "gain";

  /** Meaning of a column of phases. */
  public static final String PHASE = "phase";

  /** The node that drives the hookup. */
  public static final String GENERATOR = "generator";

  /**
   * A column.
   *
   * @param meaning {@link #TIME}, {@link #FREQUENCY}, {@link #GAIN}, {@link #PHASE}, or the name of
   *     the node that was measured
   * @param unit of its values
   * @param values not to be changed
   */
  public record Column(String meaning, Unit unit, double[] values) {}

  /** Keeps its own copy. */
  public MeasuredCurve {
    columns = List.copyOf(columns);
  }

  /** A curve that a design keeps. */
  public static MeasuredCurve of(Curve curve) {
    return new MeasuredCurve(
        curve.columns().stream()
            .map(
                column ->
                    new Column(
                        column.meaning(),
                        Unit.fromSymbol(column.unit()).orElse(Unit.ONE),
                        column.values().stream().mapToDouble(Quantity::value).toArray()))
            .toList());
  }

  /** The column of a meaning. */
  public Optional<Column> column(String meaning) {
    return columns.stream().filter(column -> column.meaning().equals(meaning)).findFirst();
  }

  /** The values of a column in volts; empty where there is none. */
  Optional<double[]> volts(String node) {
    return column(node).filter(column -> column.unit() == Unit.VOLT).map(Column::values);
  }

  /** Names of the nodes that were measured, from left to right. */
  public List<String> nodes() {
    return columns.stream()
        .map(Column::meaning)
        .filter(meaning -> !List.of(TIME, FREQUENCY, GAIN, PHASE).contains(meaning))
        .toList();
  }
}

package loopwright.design;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/** What belongs to the bench: instruments by name, readings, imported curves, and the record. */
public record Bench(
    Map<String, Instrument> instruments,
    List<Reading> readings,
    List<Curve> curves,
    Optional<BuildRecord> record) {
  /** Keeps its own copies of the collections. */
  public Bench {
    instruments = Copies.ordered(instruments);
    readings = List.copyOf(readings);
    curves = List.copyOf(curves);
  }
}

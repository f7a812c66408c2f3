package loopwright.bench;

import java.util.List;

/**
 * Readings beside predictions.
 *
 * @param readings one verdict for each reading, in the order of the file
 * @param set all of them together
 * @param implied what closed-loop readings say of the amplifier itself, in sentences
 * @param suspects what at the bench may explain a reading that does not agree, in sentences
 */
public record Comparison(
    List<ReadingVerdict> readings, SetVerdict set, List<String> implied, List<String> suspects) {
  /** Keeps its own copies. */
  public Comparison {
    readings = List.copyOf(readings);
    implied = List.copyOf(implied);
    suspects = List.copyOf(suspects);
  }
}

package loopwright.bench;

import java.util.List;
import java.util.Optional;

/**
 * What explains the readings.
 *
 * @param explanations the most probable first
 * @param next what to read next; empty where nothing would tell more
 * @param says what the search rests on
 */
public record Explanations(
    List<Explanation> explanations, Optional<NextReading> next, String says) {
  /** Keeps its own copy. */
  public Explanations {
    explanations = List.copyOf(explanations);
  }
}
